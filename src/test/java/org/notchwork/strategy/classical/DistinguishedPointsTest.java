package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Promise;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.Usage;
import org.notchwork.support.Facing;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;

class DistinguishedPointsTest {

    private static final Promise PERIOD = Promise.period(Promise.Labels.RANDOM);

    private static Instance instance(int width, long number) {
        return new XorPeriod(Labelling.TABLE).draw(width, Streams.numbered("distinguished " + width, number));
    }

    @ParameterizedTest
    @CsvSource({"4, 0, 1", "4, 1, 4", "6, 2, 8", "8, 3, 16", "10, 2, 64", "12, 4, 1000"})
    void everyAnswerIsRightInTheMemoryThatWasGiven(int width, int bits, int trails) {
        DistinguishedPoints strategy = new DistinguishedPoints(bits, trails);
        for (long number = 0; number < 150; number++) {
            Facing facing = Facing.classical(
                            strategy, instance(width, number), PERIOD, Streams.numbered("trail " + width, number))
                    .assertProved();
            assertEquals(new Usage(0, 3L * trails), facing.attempt().usage());
            assertEquals(0, facing.counts().confirming());
        }
        assertEquals(24L * trails, strategy.memoryBytes(width, 1L << 40));
    }

    /**
     * No fewer queries than different points that must be met: the mean of the first collision, √(π/2) 2^(n/2), less 5 standard
     * errors; and with memory for all trails about 2^bits · 3 more at the end and the way back.
     */
    @Test
    void theMeanIsThatOfTheFirstCollisionAndTheWayBack() {
        int width = 14;
        Sample sample = new Sample();
        for (long number = 0; number < 400; number++) {
            sample.add(Facing.classical(
                            new DistinguishedPoints(3, 1 << 14),
                            instance(width, number),
                            PERIOD,
                            Streams.numbered("mean", number))
                    .counts()
                    .queries());
        }
        double first = Math.sqrt(Math.PI / 2) * (1 << (width / 2));
        assertTrue(sample.mean() > first - 5 * sample.error(), "mean " + sample.mean());
        assertTrue(sample.mean() < 1.15 * first + 4 * 8 + 5 * sample.error(), "mean " + sample.mean());
    }

    @Test
    void everyLimitBelowTheNeedCensors() {
        DistinguishedPoints strategy = new DistinguishedPoints(1, 4);
        for (long number = 0; number < 20; number++) {
            Instance instance = instance(5, number);
            long need = Facing.classical(strategy, instance, PERIOD, Streams.numbered("limit", number))
                    .counts()
                    .total();
            for (long limit = 1; limit < need; limit++) {
                Facing cut = Facing.classical(strategy, instance, PERIOD, limit, Streams.numbered("limit", number));
                assertInstanceOf(Attempt.Censored.class, cut.attempt());
                assertTrue(cut.counts().total() <= limit);
            }
            assertTrue(Facing.classical(strategy, instance, PERIOD, need, Streams.numbered("limit", number))
                    .isSolved());
        }
    }

    @Test
    void widthsWithoutSuchPointsAreRefused() {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        assertTrue(new DistinguishedPoints(5, 1).refusal(problem, 6).isEmpty());
        assertTrue(new DistinguishedPoints(6, 1).refusal(problem, 6).isPresent());
    }
}
