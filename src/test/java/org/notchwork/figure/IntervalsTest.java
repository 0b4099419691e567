package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.exact.Decimals;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/** Intervals of means and ratios, and the figures they come from, against published values. */
class IntervalsTest {

    /** NIST/SEMATECH e-Handbook, section 1.3.5.2, data set ZARR13: 9.258242 to 9.264679, from rounded mean and s. */
    @Test
    void theIntervalOfAMeanAgreesWithTheHandbook() {
        Interval interval = MeanInterval.of(new BigDecimal("9.261460"), new BigDecimal("0.022789"), 195);
        assertEquals("9.258241", Decimals.text(interval.low()));
        assertEquals("9.264679", Decimals.text(interval.high()));
    }

    /** Student's sleep differences (1908): mean 1.58, 95 % interval 0.7001142 to 2.4598858 (scipy). */
    @Test
    void theIntervalOfTheSleepDifferencesIsTheKnownOne() {
        CountTally tally = new CountTally();
        for (long tenths : new long[] {12, 24, 13, 13, 0, 10, 18, 8, 46, 14}) {
            tally.add(tenths);
        }
        Interval interval =
                MeanInterval.of(tally.mean(), Decimals.root(tally.variance().orElseThrow()), tally.size());
        assertEquals("7.001143", Decimals.text(interval.low()));
        assertEquals("24.598857", Decimals.text(interval.high()));
    }

    /** Fieller's ends are where the t test of x − ρ y just rejects: t² = n (x̄ − ρ ȳ)² / s² there. */
    @Test
    void fiellersEndsAreWhereTheTestJustRejects() {
        RandomStream stream = new SeedTree(new Seed("pairs for the interval of a ratio"))
                .stream(new Address("fieller", 1, 0, "test"));
        int n = 25;
        long[] x = new long[n];
        long[] y = new long[n];
        for (int i = 0; i < n; i++) {
            y[i] = 20 + stream.below(30);
            x[i] = 2 * y[i] + stream.below(40);
        }
        BigDecimal[] s = sums(x, y);
        Interval interval = FiellerInterval.of(s[0], s[1], s[2], s[3], s[4], n).orElseThrow();
        double t = StudentT.quantile(n - 1).doubleValue();
        for (BigDecimal end : new BigDecimal[] {interval.low(), interval.high()}) {
            double rho = end.doubleValue();
            double mean = 0;
            for (int i = 0; i < n; i++) {
                mean += (x[i] - rho * y[i]) / n;
            }
            double variance = 0;
            for (int i = 0; i < n; i++) {
                variance += StrictMath.pow(x[i] - rho * y[i] - mean, 2) / (n - 1);
            }
            assertEquals(t * t, n * mean * mean / variance, 1e-6);
        }
    }

    @Test
    void fiellerHasNoIntervalWhereTheDenominatorMayBeZero() {
        BigDecimal one = BigDecimal.ONE;
        assertEquals(Optional.empty(), FiellerInterval.of(one, new BigDecimal("0.1"), one, BigDecimal.ZERO, one, 5));
    }

    @Test
    void constantCountsGiveAPoint() {
        Interval interval = FiellerInterval.of(
                        BigDecimal.TEN, BigDecimal.valueOf(4), BigDecimal.ZERO, BigDecimal.ZERO, BigDecimal.ZERO, 9)
                .orElseThrow();
        assertEquals("2.500000", Decimals.text(interval.low()));
        assertEquals("2.500000", Decimals.text(interval.high()));
    }

    @Test
    void quartilesAreTheLeastCountsThatEnoughTrialsDoNotExceed() {
        CountTally tally = new CountTally();
        for (long number : new long[] {9, 1, 5, 3, 7, 3, 8, 2}) {
            tally.add(number);
        }
        // Sorted: 1 2 3 3 5 7 8 9.
        assertEquals(1, tally.min());
        assertEquals(2, tally.quartile(1));
        assertEquals(3, tally.quartile(2));
        assertEquals(7, tally.quartile(3));
        assertEquals(9, tally.max());
        assertEquals("4.750000", Decimals.text(tally.mean()));
        assertEquals("8.785714", Decimals.text(tally.variance().orElseThrow()));
    }

    @Test
    void aValueThatRoundsToNothingIsWrittenWithoutASign() {
        assertEquals("0.000000", Decimals.text(new BigDecimal("-0.0000001")));
        assertEquals("0.000002", Decimals.text(new BigDecimal("0.0000025")));
        assertEquals("0.000004", Decimals.text(new BigDecimal("0.0000035")));
    }

    private static BigDecimal[] sums(long[] x, long[] y) {
        int n = x.length;
        double mx = 0;
        double my = 0;
        for (int i = 0; i < n; i++) {
            mx += (double) x[i] / n;
            my += (double) y[i] / n;
        }
        double sxx = 0;
        double sxy = 0;
        double syy = 0;
        for (int i = 0; i < n; i++) {
            sxx += (x[i] - mx) * (x[i] - mx) / (n - 1);
            sxy += (x[i] - mx) * (y[i] - my) / (n - 1);
            syy += (y[i] - my) * (y[i] - my) / (n - 1);
        }
        return new BigDecimal[] {
            new BigDecimal(mx), new BigDecimal(my), new BigDecimal(sxx), new BigDecimal(sxy), new BigDecimal(syy)
        };
    }
}
