package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Promise;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.Usage;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Given;
import org.notchwork.support.Hidden;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Check values, section E. */
class CycleWalkTest {

    private static final Promise PERIOD = Promise.period(Promise.Labels.RANDOM);

    private static Instance instance(int width, long number) {
        return new XorPeriod(Labelling.TABLE).draw(width, Streams.numbered("walk " + width, number));
    }

    /** Tail λ and cycle μ of the walk x → f(x) ⊕ c, by noting where each point was met. */
    private record Shape(long tail, long cycle) {

        static Shape of(BitFunction function, long constant, long start) {
            Map<Long, Long> met = new HashMap<>();
            long x = start;
            for (long i = 0; ; i++) {
                Long earlier = met.putIfAbsent(x, i);
                if (earlier != null) {
                    return new Shape(earlier, i - earlier);
                }
                x = function.at(x) ^ constant;
            }
        }

        /** 2^k − 1 + 2μ + 2λ, 2^k the least power of two that is at least max(λ + 1, μ). */
        long cost() {
            long power = 1;
            while (power < Math.max(tail + 1, cycle)) {
                power *= 2;
            }
            return power - 1 + 2 * cycle + 2 * tail;
        }
    }

    /** The same draws as the strategy's: a start; after a walk that starts on its cycle, a constant and a start. */
    private static long cost(BitFunction function, RandomStream stream) {
        int width = function.width();
        long start = stream.bits(width);
        Shape shape = Shape.of(function, 0, start);
        long cost = shape.cost();
        while (shape.tail() == 0) {
            long constant = stream.bits(width);
            start = stream.bits(width);
            shape = Shape.of(function, constant, start);
            cost += shape.cost();
        }
        return cost;
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 6, 8, 11})
    void everyWalkFindsThePeriodAndCostsWhatItsShapeSays(int width) {
        for (long number = 0; number < 300; number++) {
            Instance instance = instance(width, number);
            Facing facing = Facing.classical(
                            new CycleWalk(), instance, PERIOD, Streams.numbered("start " + width, number))
                    .assertProved();
            assertEquals(
                    cost(instance.function(), Streams.numbered("start " + width, number)),
                    facing.counts().total());
            assertEquals(new Usage(0, 7), facing.attempt().usage());
        }
    }

    /** Labels that are not random: f(x) = min(x, x ⊕ s) and an affine function come round at once, and are solved all the same. */
    @Test
    void structuredFunctionsAreSolvedAsWell() {
        long[] least = new long[64];
        long[] linear = new long[64];
        for (int x = 0; x < 64; x++) {
            least[x] = Math.min(x, x ^ 37);
            // Maps 1 ↦ 0 and bit i to bit i − 1: the period is 1.
            linear[x] = ((long) x >>> 1) ^ 9;
        }
        for (long number = 0; number < 200; number++) {
            RandomStream stream = Streams.numbered("structured", number);
            Facing.classical(new CycleWalk(), new Instance(Given.of(6, 6, least), Hidden.period(6, 37)), PERIOD, stream)
                    .assertProved();
            Facing.classical(new CycleWalk(), new Instance(Given.of(6, 6, linear), Hidden.period(6, 1)), PERIOD, stream)
                    .assertProved();
        }
    }

    /** Fresh start and fresh constant after a failure: simulated elsewhere, with a standard error. */
    @ParameterizedTest
    @ValueSource(ints = {8, 10})
    void theMeanWithRestartsIsTheOneSimulatedElsewhere(int width) throws Exception {
        for (JsonNode row : CheckValues.section("E").required("simulation")) {
            if (row.required("n").asInt() == width) {
                Sample sample = new Sample();
                for (long number = 0; number < 4000; number++) {
                    sample.add(Facing.classical(
                                    new CycleWalk(),
                                    instance(width, number),
                                    PERIOD,
                                    Streams.numbered("mean " + width, number))
                            .counts()
                            .queries());
                }
                JsonNode total = row.required("brent_total");
                sample.assertMean(
                        Double.parseDouble(total.get(0).asString()),
                        Double.parseDouble(total.get(1).asString()),
                        5);
                return;
            }
        }
        throw new AssertionError("no row of width " + width);
    }

    /** Without two points of one value every walk starts on its cycle, and the limit ends it. */
    @Test
    void aPermutationKeepsItWalkingToTheLimit() {
        long[] values = new long[32];
        for (int x = 0; x < 32; x++) {
            values[x] = (x * 5L + 3) & 31;
        }
        Instance instance = new Instance(Given.of(5, 5, values), Hidden.period(5, 1));
        Facing facing = Facing.classical(new CycleWalk(), instance, PERIOD, 777, Streams.named("permutation"));
        assertInstanceOf(Attempt.Censored.class, facing.attempt());
        assertEquals(777, facing.counts().total());
    }

    @Test
    void everyLimitBelowTheNeedCensors() {
        for (long number = 0; number < 20; number++) {
            Instance instance = instance(5, number);
            long need = Facing.classical(new CycleWalk(), instance, PERIOD, Streams.numbered("limit", number))
                    .counts()
                    .total();
            for (long limit = 1; limit < need; limit++) {
                Facing cut =
                        Facing.classical(new CycleWalk(), instance, PERIOD, limit, Streams.numbered("limit", number));
                assertInstanceOf(Attempt.Censored.class, cut.attempt());
                assertEquals(limit, cut.counts().total());
            }
            assertTrue(Facing.classical(new CycleWalk(), instance, PERIOD, need, Streams.numbered("limit", number))
                    .isSolved());
        }
    }
}
