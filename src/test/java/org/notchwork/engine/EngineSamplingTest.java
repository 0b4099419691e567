package org.notchwork.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.statevector.StateVectorEngine;
import org.notchwork.engine.weights.WeightsEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Given;
import org.notchwork.support.Streams;

class EngineSamplingTest {

    private static final int SAMPLES = 20_000;

    static Stream<Engine> engines() {
        return Engines.all().stream()
                .filter(e -> e.refusal(new XorPeriod(Labelling.TABLE), 4, Circuit.FOURIER)
                        .isEmpty());
    }

    static Stream<BlindEngine> blindEngines() {
        return Stream.of(new StateVectorEngine(), new FibreEngine(), new WeightsEngine());
    }

    private static Simulation open(Engine engine, Instance instance, Meter meter) {
        Unitary unitary = new Unitary(instance.function(), meter);
        return engine instanceof SightedEngine sighted
                ? sighted.open(unitary, instance.hidden())
                : ((BlindEngine) engine).open(unitary);
    }

    private static void assertSamplesFollowOutcomes(Simulation simulation, RandomStream stream) {
        Outcomes outcomes = simulation.outcomes();
        long[] counts = new long[outcomes.size()];
        double[] weights = new double[outcomes.size()];
        for (int y = 0; y < weights.length; y++) {
            weights[y] = outcomes.weight(y);
        }
        for (int i = 0; i < SAMPLES; i++) {
            counts[(int) simulation.fourierSample(stream)]++;
        }
        ChiSquared.of(counts, weights).assertFits();
    }

    @ParameterizedTest
    @MethodSource("engines")
    void samplesFollowTheOutcomesOnAnInstance(Engine engine) {
        for (int width = 2; width <= 6; width++) {
            Instance instance = new XorPeriod(Labelling.TABLE).draw(width, Streams.numbered("instance", width));
            assertSamplesFollowOutcomes(
                    open(engine, instance, new Meter(SAMPLES)), Streams.numbered(engine.name(), width));
        }
    }

    @ParameterizedTest
    @MethodSource("blindEngines")
    void samplesFollowTheOutcomesOnFunctionsWithFibresOfAllSizes(BlindEngine engine) {
        long[] uneven = new long[64];
        for (int x = 0; x < uneven.length; x++) {
            uneven[x] = x % 5 == 0 ? x % 7 : x < 50 ? 8 : 9;
        }
        BitFunction function = Given.of(6, 4, uneven);
        assertSamplesFollowOutcomes(
                engine.open(new Unitary(function, new Meter(SAMPLES))), Streams.named("uneven " + engine.name()));
    }

    @ParameterizedTest
    @MethodSource("engines")
    void aSampleIsOneUseAndOutcomesAreNone(Engine engine) {
        Instance instance = new XorPeriod(Labelling.TABLE).draw(5, Streams.named("uses"));
        Meter meter = new Meter(3);
        Simulation simulation = open(engine, instance, meter);
        RandomStream stream = Streams.named("uses");
        assertTrue(simulation.outcomes().total() > 0);
        assertEquals(Counts.NONE, meter.counts());
        for (int uses = 1; uses <= 3; uses++) {
            simulation.fourierSample(stream);
            assertEquals(new Counts(0, uses, 0, 0), meter.counts());
        }
        assertThrows(IllegalStateException.class, () -> simulation.fourierSample(stream));
    }

    @ParameterizedTest
    @CsvSource({"statevector, 13", "fibre, 26", "annihilator, 63"})
    void anEngineReachesItsWidthAndNamesAnotherBeyond(String name, int width) {
        Engine engine = Engines.engine(name).orElseThrow();
        XorPeriod problem = new XorPeriod(Labelling.PERMUTATION);
        assertTrue(engine.refusal(problem, width, Circuit.FOURIER).isEmpty());
        String refusal = engine.refusal(problem, width + 1, Circuit.FOURIER).orElseThrow();
        assertTrue(refusal.contains("reaches"), refusal);
    }

    @Test
    void onlyTheAnnihilatorIsSighted() {
        for (Engine engine : Engines.all()) {
            assertEquals(engine instanceof AnnihilatorEngine ? Sight.SIGHTED : Sight.BLIND, engine.sight());
        }
    }

    @Test
    void theAnnihilatorSamplesOrthogonalWordsAtWidth63() {
        Instance instance = new XorPeriod(Labelling.PERMUTATION).draw(63, Streams.named("wide"));
        long s = ((Answer.Period) instance.hidden()).s().bits();
        Simulation simulation = open(new AnnihilatorEngine(), instance, new Meter(1000));
        RandomStream stream = Streams.named("wide samples");
        long seen = 0;
        for (int i = 0; i < 1000; i++) {
            long y = simulation.fourierSample(stream);
            assertEquals(0, Long.bitCount(y & s) % 2);
            seen |= y;
        }
        assertEquals(Long.MAX_VALUE, seen);
    }

    @Test
    void theAnnihilatorRefusesAPeriodOfAnotherWidth() {
        Unitary unitary = new Unitary(Given.of(2, 2, 0, 0, 1, 1), new Meter(1));
        Answer hidden = new Answer.Period(Word.of(3, 1));
        assertThrows(IllegalArgumentException.class, () -> new AnnihilatorEngine().open(unitary, hidden));
    }

    @Test
    void aMeasurementFindsTheWordByItsShareOfTheTotal() {
        long[] weights = {0, 3, 0, 0, 5, 1, 0};
        Measurement measurement = new Measurement(weights);
        RandomStream drawn = Streams.named("measurement");
        RandomStream targets = Streams.named("measurement");
        for (int i = 0; i < 1000; i++) {
            long target = targets.below(9);
            assertEquals(target < 3 ? 1 : target < 8 ? 4 : 5, measurement.draw(drawn));
        }
    }

    @Test
    void distributionsAreComparedAsFractions() {
        Outcomes half = new Outcomes(new long[] {1, 1, 0, 0});
        assertEquals(0, half.differences(new Outcomes(new long[] {7, 7, 0, 0})));
        assertEquals(2, half.differences(new Outcomes(new long[] {1, 0, 1, 0})));
        assertEquals(3, half.differences(new Outcomes(new long[] {3, 1, 1, 0})));
        assertThrows(IllegalArgumentException.class, () -> half.differences(new Outcomes(new long[] {1, 1})));
        assertThrows(IllegalArgumentException.class, () -> new Outcomes(new long[] {0, 0}));
        assertThrows(IllegalArgumentException.class, () -> new Outcomes(new long[] {2, -1}));
        assertEquals(2, half.total());
    }

    /** A rule of the format: up to |F|² = n · 2^n words are drawn until one is kept; 4² ≤ 3 · 2³. */
    @Test
    void aFibreOfFourAmongEightPointsIsSampledByRejection() {
        Simulation simulation =
                new FibreEngine().open(new Unitary(Given.of(3, 1, 0, 0, 0, 0, 1, 1, 1, 1), new Meter(50)));
        RandomStream drawn = Streams.named("rejection");
        RandomStream words = Streams.named("rejection");
        for (int i = 0; i < 50; i++) {
            words.bits(3);
            long y;
            do {
                y = words.bits(3);
                // Both fibres are {v, …, v + 3}: the amplitude is ±4 on y = 0 and 4 and 0 elsewhere.
            } while (words.below(16) >= (y % 4 == 0 ? 16 : 0));
            assertEquals(y, simulation.fourierSample(drawn));
        }
        assertEquals(words.nextLong(), drawn.nextLong());
    }

    /** One point more, and 5² &gt; 3 · 2³: one draw below the sum of all squares, which is 8 · 5. */
    @Test
    void aFibreOfFiveAmongEightPointsIsSampledByTheTransform() {
        Simulation simulation =
                new FibreEngine().open(new Unitary(Given.of(3, 2, 0, 0, 0, 0, 0, 1, 2, 3), new Meter(50)));
        // Squares of the sums over {0, …, 4} of (−1)^(x·y), by hand: 5 1 1 1 3 −1 −1 −1.
        Measurement squares = new Measurement(new long[] {25, 1, 1, 1, 9, 1, 1, 1});
        RandomStream drawn = Streams.named("transform");
        RandomStream words = Streams.named("transform");
        for (int i = 0; i < 50; i++) {
            long y = simulation.fourierSample(drawn);
            if (words.bits(3) < 5) {
                assertEquals(squares.draw(words), y);
            } else {
                // A fibre of one point: every word is kept at once, and a bound of 1 draws nothing.
                assertEquals(words.bits(3), y);
            }
        }
        assertEquals(words.nextLong(), drawn.nextLong());
    }
}
