package org.notchwork.problem.period;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.notchwork.bits.Word;
import org.notchwork.law.RandomDrawsLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

class XorPeriodTest {

    private final SeedTree seeds = new SeedTree(new Seed("instances of hidden periods"));

    @ParameterizedTest
    @EnumSource(Labelling.class)
    void theFunctionHasExactlyTheHiddenPeriodOnItsWholeDomain(Labelling labelling) {
        for (int width = 2; width <= 9; width++) {
            for (int trial = 0; trial < 20; trial++) {
                Instance instance = new XorPeriod(labelling).draw(width, stream(width, trial));
                long s = ((Answer.Period) instance.hidden()).s().bits();
                Set<Long> values = new HashSet<>();
                for (long x = 0; x < 1L << width; x++) {
                    assertEquals(instance.function().at(x), instance.function().at(x ^ s));
                    values.add(instance.function().at(x));
                }
                assertEquals(1 << (width - 1), values.size());
            }
        }
    }

    /** Chi-squared with 6 degrees of freedom: 27.86 is its 0.9999 quantile (tables of the distribution). */
    @Test
    void thePeriodIsUniformOverTheNonZeroWords() {
        long[] counts = new long[8];
        for (int trial = 0; trial < 7000; trial++) {
            Instance instance = new XorPeriod(Labelling.TABLE).draw(3, stream(3, trial));
            counts[(int) ((Answer.Period) instance.hidden()).s().bits()]++;
        }
        assertEquals(0, counts[0]);
        double statistic = Arrays.stream(counts, 1, 8)
                .mapToDouble(c -> (c - 1000.0) * (c - 1000.0) / 1000.0)
                .sum();
        assertTrue(statistic < 27.86, () -> Arrays.toString(counts));
    }

    /**
     * Both kinds of instance look the same to a scan for small values: the position of the least label is uniform
     * over the cosets. Chi-squared with 15 degrees of freedom: 44.26 is its 0.9999 quantile.
     */
    @ParameterizedTest
    @EnumSource(Labelling.class)
    void labelsAreEvenlySpread(Labelling labelling) {
        long[] byCoset = new long[16];
        long[] byValue = new long[32];
        Answer hidden = new Answer.Period(Word.of(5, 16));
        for (int trial = 0; trial < 16_000; trial++) {
            Instance instance = new XorPeriod(labelling).drawHiding(hidden, 5, stream(5, trial));
            int least = 0;
            for (int x = 1; x < 16; x++) {
                least = instance.function().at(x) < instance.function().at(least) ? x : least;
            }
            byCoset[least]++;
            byValue[(int) instance.function().at(3)]++;
        }
        double cosets = Arrays.stream(byCoset)
                .mapToDouble(c -> (c - 1000.0) * (c - 1000.0) / 1000.0)
                .sum();
        double values = Arrays.stream(byValue)
                .mapToDouble(c -> (c - 500.0) * (c - 500.0) / 500.0)
                .sum();
        assertTrue(cosets < 44.26, () -> labelling + Arrays.toString(byCoset));
        // 31 degrees of freedom: 0.9999 quantile 69.11.
        assertTrue(values < 69.11, () -> labelling + Arrays.toString(byValue));
    }

    /** The number of random draws to a collision has the law's mean for both kinds, within five standard errors. */
    @ParameterizedTest
    @EnumSource(Labelling.class)
    void firstCollisionsComeAsTheLawSays(Labelling labelling) {
        RandomDrawsLaw law = new RandomDrawsLaw();
        for (int width : List.of(4, 6, 8, 11)) {
            int trials = 4000;
            double sum = 0;
            for (int trial = 0; trial < trials; trial++) {
                Instance instance = new XorPeriod(labelling).draw(width, stream(width, 50_000L + trial));
                Set<Long> seen = new HashSet<>();
                int queries = 1;
                // The points 0, 1, 2, … are random enough where the labels are: the period is not.
                int[] order = stream(width, 90_000L + trial).distinct(1 << width, 1 << width);
                while (seen.add(instance.function().at(order[queries - 1]))) {
                    queries++;
                }
                sum += queries;
            }
            double mean = law.mean(width).value().doubleValue();
            double error = Math.sqrt(law.variance(width).orElseThrow().doubleValue() / trials);
            assertEquals(mean, sum / trials, 5 * error, labelling + " width " + width);
        }
    }

    @Test
    void allAnswersOfAWidthAreTheNonZeroWords() {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        assertEquals(255, new HashSet<>(problem.answers(8)).size());
        assertThrows(IllegalArgumentException.class, () -> problem.answers(13));
        assertThrows(IllegalArgumentException.class, () -> problem.draw(21, stream(21, 0)));
    }

    private RandomStream stream(int width, long trial) {
        return seeds.stream(new Address("period", width, trial, "test"));
    }
}
