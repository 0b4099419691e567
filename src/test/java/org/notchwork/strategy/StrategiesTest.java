package org.notchwork.strategy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.catalogue.Strategies;
import org.notchwork.check.CertificateCheck;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.quantum.FourierSampling;

class StrategiesTest {

    private static final int WIDTH = 6;

    private final SeedTree seeds = new SeedTree(new Seed("instances for the strategies"));

    @Test
    void everyAnswerIsProvedByItsCertificate() {
        for (String name : Strategies.names()) {
            for (int trial = 0; trial < 40; trial++) {
                Instance instance = instance(trial);
                Attempt attempt = attempt(name, instance, new Meter(1000), trial);
                Attempt.Answered answered = assertInstanceOf(Attempt.Answered.class, attempt);
                assertEquals(instance.hidden(), answered.answer(), name);
                assertEquals(
                        Optional.empty(),
                        CertificateCheck.check(instance.function(), answered.answer(), answered.certificate()),
                        name);
            }
        }
    }

    @Test
    void oneCallTooFewCensorsAndNeverThrows() {
        for (String name : Strategies.names()) {
            for (int trial = 0; trial < 20; trial++) {
                Instance instance = instance(trial);
                Meter free = new Meter(1000);
                attempt(name, instance, free, trial);
                long needed = free.counts().total();
                for (long limit = 1; limit <= needed; limit++) {
                    Meter meter = new Meter(limit);
                    Attempt attempt = attempt(name, instance, meter, trial);
                    assertEquals(limit < needed, attempt instanceof Attempt.Censored, name + " " + limit);
                    assertTrue(meter.counts().total() <= limit);
                }
            }
        }
    }

    @Test
    void aCallBeyondTheLimitIsAFault() {
        Oracle oracle = new Oracle(instance(0).function(), new Meter(1));
        oracle.query(0);
        assertThrows(IllegalStateException.class, () -> oracle.query(1));
    }

    @Test
    void randomDrawsAskNoPointTwice() {
        BitFunction injective = recording(new HashSet<>());
        Set<Long> asked = new HashSet<>();
        Meter meter = new Meter(1000);
        Attempt attempt = ((ClassicalStrategy)
                        Strategies.strategy("random-draws").orElseThrow())
                .attempt(new Oracle(recording(asked), meter), stream(3));
        assertInstanceOf(Attempt.Censored.class, attempt);
        assertEquals(1 << WIDTH, asked.size());
        assertEquals(1 << WIDTH, meter.counts().classical());
        assertEquals(WIDTH, injective.width());
    }

    @Test
    void aFunctionWithoutAPeriodIsNeverGivenAWrongConfirmation() {
        Meter meter = new Meter(1000);
        BitFunction injective = recording(new HashSet<>());
        Attempt attempt = new FourierSampling()
                .attempt(
                        new FibreEngine().open(new Unitary(injective, meter)), new Oracle(injective, meter), stream(4));
        Attempt.Answered answered = assertInstanceOf(Attempt.Answered.class, attempt);
        assertTrue(CertificateCheck.check(injective, answered.answer(), answered.certificate())
                .isPresent());
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 17, 40, 63})
    void widePermutationInstancesAreSolvedByFourierSampling(int width) {
        Instance instance = new XorPeriod(Labelling.PERMUTATION).draw(width, stream(width));
        Meter meter = new Meter(1000);
        AnnihilatorEngine engine = new AnnihilatorEngine();
        Attempt attempt = new FourierSampling()
                .attempt(
                        engine.open(new Unitary(instance.function(), meter), instance.hidden()),
                        new Oracle(instance.function(), meter),
                        stream(100 + width));
        assertEquals(
                instance.hidden(),
                assertInstanceOf(Attempt.Answered.class, attempt).answer());
        assertEquals(2, meter.counts().confirming());
    }

    private Attempt attempt(String name, Instance instance, Meter meter, int trial) {
        Strategy strategy = Strategies.strategy(name).orElseThrow();
        Oracle oracle = new Oracle(instance.function(), meter);
        RandomStream stream = stream(1000 + trial);
        return strategy instanceof ClassicalStrategy classical
                ? classical.attempt(oracle, stream)
                : ((QuantumStrategy) strategy)
                        .attempt(new FibreEngine().open(new Unitary(instance.function(), meter)), oracle, stream);
    }

    private Instance instance(int trial) {
        return new XorPeriod(trial % 2 == 0 ? Labelling.TABLE : Labelling.PERMUTATION).draw(WIDTH, stream(trial));
    }

    private RandomStream stream(long trial) {
        return seeds.stream(new Address("strategies", WIDTH, trial, "test"));
    }

    /** The identity, which has no period, and a note of where it was asked. */
    private static BitFunction recording(Set<Long> asked) {
        return new BitFunction() {
            @Override
            public int width() {
                return WIDTH;
            }

            @Override
            public int valueWidth() {
                return WIDTH;
            }

            @Override
            public long at(long x) {
                asked.add(x);
                return x;
            }
        };
    }
}
