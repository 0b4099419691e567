package org.notchwork.engine;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.statevector.StateVectorEngine;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

class EnginesTest {

    private final SeedTree seeds = new SeedTree(new Seed("instances for the engines"));
    private final List<BlindEngine> blind = List.of(new StateVectorEngine(), new FibreEngine());

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8})
    void allEnginesGiveOneAndTheSameDistribution(int width) {
        for (int trial = 0; trial < 10; trial++) {
            Instance instance = new XorPeriod(Labelling.TABLE).draw(width, stream(width, trial));
            Outcomes told = new AnnihilatorEngine()
                    .open(unitary(instance.function()), instance.hidden())
                    .outcomes();
            for (BlindEngine engine : blind) {
                assertEquals(
                        0,
                        told.differences(
                                engine.open(unitary(instance.function())).outcomes()));
            }
        }
    }

    /** Every amplitude by the plain matrix of the circuit: H on the inputs, U_f, H on the inputs, at most 3 inputs. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    void blindEnginesAgreeWithTheMatrixOfTheCircuit(int width) {
        int size = 1 << width;
        for (int trial = 0; trial < 30; trial++) {
            RandomStream stream = stream(width, 1000L + trial);
            long[] values =
                    LongStream.generate(() -> stream.bits(width)).limit(size).toArray();
            long[] weights = new long[size];
            for (int y = 0; y < size; y++) {
                for (int z = 0; z < size; z++) {
                    long amplitude = 0;
                    for (int x = 0; x < size; x++) {
                        amplitude += values[x] == z ? 1 - 2 * (Integer.bitCount(x & y) & 1) : 0;
                    }
                    weights[y] += amplitude * amplitude;
                }
            }
            assertWeights(weights, table(width, values));
        }
    }

    /** Weights of functions without any promise: worked examples, derived by direct amplitude sums. */
    static Stream<Arguments> examples() {
        return Stream.of(
                Arguments.of(2, "0 0 0 1", "10 2 2 2"),
                Arguments.of(2, "3 1 1 3", "8 0 0 8"),
                Arguments.of(3, "0 1 2 3 3 2 1 1", "18 2 2 10 2 10 18 2"),
                Arguments.of(3, "5 2 0 0 6 2 6 4", "14 10 10 6 10 6 6 2"),
                Arguments.of(3, "1 1 1 1 1 1 1 1", "64 0 0 0 0 0 0 0"),
                Arguments.of(3, "0 1 2 3 4 5 6 7", "8 8 8 8 8 8 8 8"),
                Arguments.of(4, "2 6 6 2 1 15 15 1 14 4 4 14 3 3 3 3", "40 0 0 24 40 0 0 24 40 0 0 24 40 0 0 24"));
    }

    @ParameterizedTest
    @MethodSource("examples")
    void blindEnginesServeFunctionsWithoutAPromise(int width, String values, String weights) {
        assertWeights(longs(weights), table(width, longs(values)));
    }

    /** Chi-squared with 15 degrees of freedom: 44.26 is its 0.9999 quantile (tables of the distribution). */
    @Test
    void samplesFollowTheDistributionOfEveryEngine() {
        Instance instance = new XorPeriod(Labelling.PERMUTATION).draw(5, stream(5, 77));
        for (Engine engine : Engines.all()) {
            Unitary unitary = new Unitary(instance.function(), new Meter(1L << 40));
            Simulation simulation = engine instanceof SightedEngine sighted
                    ? sighted.open(unitary, instance.hidden())
                    : ((BlindEngine) engine).open(unitary);
            Outcomes outcomes = simulation.outcomes();
            long[] counts = new long[32];
            RandomStream stream = stream(5, engine.name().hashCode() & 0xffff);
            for (int i = 0; i < 16_000; i++) {
                counts[(int) simulation.fourierSample(stream)]++;
            }
            double statistic = 0;
            for (int y = 0; y < 32; y++) {
                if (outcomes.weight(y) == 0) {
                    assertEquals(0, counts[y], engine.name());
                } else {
                    statistic += (counts[y] - 1000.0) * (counts[y] - 1000.0) / 1000.0;
                }
            }
            assertTrue(statistic < 44.26, engine.name() + " " + Arrays.toString(counts));
        }
    }

    @Test
    void largeFibresAreSampledByTheTransform() {
        BitFunction constant = table(4, new long[16]);
        Simulation simulation = new FibreEngine().open(unitary(constant));
        for (int i = 0; i < 3; i++) {
            assertEquals(0, simulation.fourierSample(stream(4, 5L + i)));
        }
    }

    @Test
    void everyRunOfTheCircuitCountsOneUse() {
        Instance instance = new XorPeriod(Labelling.TABLE).draw(4, stream(4, 3));
        for (BlindEngine engine : blind) {
            Meter meter = new Meter(10);
            Simulation simulation = engine.open(new Unitary(instance.function(), meter));
            simulation.outcomes();
            assertEquals(0, meter.counts().quantum());
            simulation.fourierSample(stream(4, 9));
            simulation.fourierSample(stream(4, 9));
            assertEquals(2, meter.counts().quantum());
            assertEquals(2, meter.counts().total());
        }
    }

    @Test
    void anEngineRefusesAWidthBeyondItsReachAndNamesOneThatCan() {
        XorPeriod problem = new XorPeriod(Labelling.PERMUTATION);
        assertTrue(new StateVectorEngine().refusal(problem, 13).isEmpty());
        assertTrue(new StateVectorEngine().refusal(problem, 14).orElseThrow().contains("fibre"));
        assertTrue(new FibreEngine().refusal(problem, 26).isEmpty());
        assertTrue(new FibreEngine().refusal(problem, 27).orElseThrow().contains("annihilator"));
        assertTrue(new AnnihilatorEngine().refusal(problem, 63).isEmpty());
        assertThrows(
                IllegalArgumentException.class,
                () -> new FibreEngine()
                        .open(unitary(table(13, new long[1 << 13])))
                        .outcomes());
    }

    private void assertWeights(long[] expected, BitFunction function) {
        for (BlindEngine engine : blind) {
            Outcomes outcomes = engine.open(unitary(function)).outcomes();
            long[] found = new long[outcomes.size()];
            for (int y = 0; y < found.length; y++) {
                found[y] = outcomes.weight(y);
            }
            assertArrayEquals(expected, found, engine.name());
        }
    }

    private static BitFunction table(int width, long[] values) {
        return new BitFunction() {
            @Override
            public int width() {
                return width;
            }

            @Override
            public int valueWidth() {
                return width;
            }

            @Override
            public long at(long x) {
                return values[(int) x];
            }
        };
    }

    private static Unitary unitary(BitFunction function) {
        return new Unitary(function, new Meter(1000));
    }

    private RandomStream stream(int width, long trial) {
        return seeds.stream(new Address("engines", width, trial, "test"));
    }

    private static long[] longs(String text) {
        return Arrays.stream(text.split(" ", -1)).mapToLong(Long::parseLong).toArray();
    }
}
