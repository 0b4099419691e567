package org.notchwork.strategy.quantum;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.Attempt;

class FourierSamplingTest {

    private final SeedTree seeds = new SeedTree(new Seed("instances for the sampler"));

    @Test
    void aFunctionWithoutAPeriodIsNeverGivenAConfirmationThatHolds() {
        for (int trial = 0; trial < 20; trial++) {
            BitFunction injective = new Identity(6);
            Meter meter = new Meter(1000);
            Attempt attempt = new FourierSampling()
                    .attempt(
                            new FibreEngine().open(new Unitary(injective, meter)),
                            new Oracle(injective, Promise.period(Promise.Labels.RANDOM), meter),
                            stream(6, trial));
            Attempt.Answered answered = assertInstanceOf(Attempt.Answered.class, attempt);
            assertTrue(CertificateCheck.check(injective, answered.answer(), answered.certificate())
                    .isPresent());
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 17, 40, 63})
    void instancesOfEveryWidthAreSolvedWithTwoConfirmingQueries(int width) {
        Instance instance = new XorPeriod(Labelling.PERMUTATION).draw(width, stream(width, 0));
        Meter meter = new Meter(1000);
        Attempt attempt = new FourierSampling()
                .attempt(
                        new AnnihilatorEngine().open(new Unitary(instance.function(), meter), instance.hidden()),
                        new Oracle(instance.function(), Promise.period(Promise.Labels.RANDOM), meter),
                        stream(width, 1));
        assertEquals(
                instance.hidden(),
                assertInstanceOf(Attempt.Answered.class, attempt).answer());
        assertEquals(2, meter.counts().confirming());
        assertEquals(0, meter.counts().classical());
    }

    private RandomStream stream(int width, long trial) {
        return seeds.stream(new Address("sampler", width, trial, "test"));
    }

    /** A function without a period. */
    private record Identity(int width) implements BitFunction {

        @Override
        public int valueWidth() {
            return width;
        }

        @Override
        public long at(long x) {
            return x;
        }
    }
}
