package org.notchwork.strategy.quantum;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.affine.AffinePeriod;
import org.notchwork.problem.cipher.EvenMansour;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.support.CheckValues;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Facing;
import org.notchwork.support.Hidden;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Check values, section G. */
class ZeroErrorFourierTest {

    private static final XorPeriod PROBLEM = new XorPeriod(Labelling.TABLE);

    static Stream<Engine> engines() {
        return Engines.all().stream().filter(e -> takes(e, PROBLEM));
    }

    private static boolean takes(Engine engine, Problem problem) {
        return engine.refusal(problem, 5, Circuit.AMPLIFIED).isEmpty();
    }

    @Test
    void threeBlindEnginesAndTheSightedOneTakeTheCircuit() {
        assertEquals(
                List.of("statevector", "fibre", "weights", "annihilator"),
                engines().map(Engine::name).toList());
    }

    @ParameterizedTest
    @MethodSource("engines")
    void everySecretIsFoundForCertainInAtMostThreeCallsABit(Engine engine) {
        for (int width = 2; width <= 5; width++) {
            for (Answer hidden : Hidden.periods(width)) {
                for (int repeat = 0; repeat < 6; repeat++) {
                    long number = Hidden.bits(hidden) * 10 + repeat;
                    Instance instance = PROBLEM.drawHiding(hidden, width, Streams.numbered("zero " + width, number));
                    Facing facing = Facing.quantum(
                                    new ZeroErrorFourier(),
                                    engine,
                                    instance,
                                    PROBLEM.promise(),
                                    Streams.numbered("error " + width, number))
                            .assertProved();
                    Counts counts = facing.counts();
                    assertTrue(counts.queries() <= 3L * (width - 1), counts.toString());
                    assertEquals(2 * counts.inverse(), counts.quantum());
                    assertEquals(counts.inverse(), facing.attempt().usage().equations());
                    assertEquals(2, counts.confirming());
                    assertEquals(0, counts.classical());
                }
            }
        }
    }

    /** Labels that are as far from random as can be: the circuit does not mind. */
    @Test
    void affineFunctionsAreSolvedForCertainAsWell() {
        AffinePeriod problem = new AffinePeriod();
        for (int width = 2; width <= 6; width++) {
            for (long number = 0; number < 40; number++) {
                Instance instance = problem.draw(width, Streams.numbered("affine " + width, number));
                Facing facing = Facing.quantum(
                                new ZeroErrorFourier(),
                                new FibreEngine(),
                                instance,
                                problem.promise(),
                                Streams.numbered("affine zero " + width, number))
                        .assertProved();
                assertTrue(facing.counts().queries() <= 3L * (width - 1));
            }
        }
    }

    private static long rounds(Engine engine, int width, long number) {
        Instance instance = PROBLEM.draw(width, Streams.numbered("rounds " + width, number));
        return Facing.quantum(
                        new ZeroErrorFourier(),
                        engine,
                        instance,
                        PROBLEM.promise(),
                        Streams.numbered(engine.name() + width, number))
                .assertProved()
                .attempt()
                .usage()
                .equations();
    }

    /** The mean of the table, and P(rounds > r) = 2^r (2^(n−r) − 1)/(2^n − 1) for r up to n − 2. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 6, 8})
    void roundsFollowTheLaw(int width) throws Exception {
        double all = (1 << width) - 1;
        for (Engine engine : List.of(new FibreEngine(), new AnnihilatorEngine())) {
            Sample sample = new Sample();
            long[] counts = new long[width];
            for (long number = 0; number < 4000; number++) {
                long rounds = rounds(engine, width, number);
                sample.add(rounds);
                counts[(int) rounds]++;
            }
            double[] weights = new double[width];
            for (int r = 1; r < width; r++) {
                double beyondLess = (1 << (r - 1)) * ((1 << (width - r + 1)) - 1) / all;
                double beyond = r == width - 1 ? 0 : (1 << r) * ((1 << (width - r)) - 1) / all;
                weights[r] = beyondLess - beyond;
            }
            if (width > 2) {
                ChiSquared.of(counts, weights).assertFits();
            }
            for (JsonNode row : CheckValues.section("G").required("table")) {
                if (row.required("n").asInt() == width) {
                    sample.assertMean(
                            Double.parseDouble(row.required("mean_rounds_dec").asString()), 5);
                }
            }
        }
    }

    @Test
    void aPromiseThatHoldsNearlyIsRefused() {
        assertTrue(new ZeroErrorFourier().refusal(new EvenMansour(), 6).isPresent());
        assertTrue(new ZeroErrorFourier().refusal(PROBLEM, 6).isEmpty());
        assertTrue(new ZeroErrorFourier()
                .refusal(new AffinePeriod(), 64)
                .orElseThrow()
                .contains("63 bits"));
    }
}
