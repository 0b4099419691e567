package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.exact.Decimals;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/** Intervals against published values. */
class IntervalsTest {

    /**
     * R. G. Newcombe, Statistics in Medicine 17 (1998), Table I, method 5, to four places: 81/263, 15/148, 0/20, 1/29;
     * the further digits and the other rows were computed with scipy.
     */
    @ParameterizedTest
    @CsvSource({
        "81, 263, 0.2527367456, 0.3676219226",
        "15, 148, 0.05784401008, 0.1616504903",
        "0, 20, 0, 0.168433471",
        "1, 29, 0.0008726468836, 0.1776442955",
        "20, 20, 0.831566529, 1",
        "23, 60, 0.260707058, 0.5178850486",
        "5, 10, 0.1870860284, 0.8129139716"
    })
    void clopperPearsonAgreesWithPublishedValues(long solved, long trials, BigDecimal low, BigDecimal high) {
        Interval interval = ClopperPearson.interval(solved, trials);
        assertEquals(six(low), interval.low());
        assertEquals(six(high), interval.high());
    }

    /** Closed forms: 1 − 0.025^(1/n) above no success, 0.025^(1/n) below n successes. */
    @Test
    void clopperPearsonHasItsClosedFormsAtTheEnds() {
        for (int n : new int[] {1, 2, 7, 100, 1000, 100_000, 1_000_000}) {
            double bound = StrictMath.pow(0.025, 1.0 / n);
            assertEquals(
                    six(new BigDecimal(1 - bound)),
                    ClopperPearson.interval(0, n).high());
            assertEquals(
                    six(new BigDecimal(bound)), ClopperPearson.interval(n, n).low());
        }
    }

    /** The six places bracket the exact end: the binomial tail passes 0.025 within half a unit on either side. */
    @Test
    void clopperPearsonIsRoundedRightByTheExactTail() {
        BigDecimal half = new BigDecimal("0.0000005");
        BigDecimal tail = new BigDecimal("0.025");
        for (int n = 1; n <= 40; n++) {
            for (int x = 1; x < n; x++) {
                Interval interval = ClopperPearson.interval(x, n);
                assertTrue(ClopperPearson.upperTail(x, n, interval.low().subtract(half))
                                .compareTo(tail)
                        <= 0);
                assertTrue(
                        ClopperPearson.upperTail(x, n, interval.low().add(half)).compareTo(tail) >= 0);
                assertTrue(ClopperPearson.lowerTail(x, n, interval.high().subtract(half))
                                .compareTo(tail)
                        >= 0);
                assertTrue(ClopperPearson.lowerTail(x, n, interval.high().add(half))
                                .compareTo(tail)
                        <= 0);
            }
        }
    }

    /** P(X ≥ 3) for 15 trials at 0.1 is 184061069106391 / 10^15, a documented example of an exact binomial test. */
    @Test
    void theBinomialTailIsExact() {
        assertEquals(
                "0.184061069106391",
                ClopperPearson.upperTail(3, 15, new BigDecimal("0.1"))
                        .setScale(15, RoundingMode.HALF_EVEN)
                        .toPlainString());
    }

    /** t tables: 12.706205, 2.570582, 2.262157, 1.972268 (195 − 1 degrees), 1.959964 in the limit. */
    @ParameterizedTest
    @CsvSource({"1, 12.706205", "5, 2.570582", "9, 2.262157", "194, 1.972268", "34, 2.032245"})
    void studentsQuantileAgreesWithTables(long degrees, BigDecimal quantile) {
        assertEquals(quantile, StudentT.quantile(degrees));
    }

    /** The exact distribution passes 0.95 within half a unit of the sixth place, on either side of the quantile. */
    @Test
    void studentsQuantileIsRoundedRightByTheExactDistribution() {
        BigDecimal half = new BigDecimal("0.0000005");
        BigDecimal central = new BigDecimal("0.95");
        for (long degrees :
                new long[] {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 29, 30, 99, 119, 120, 199, 999, 3080, 9998}) {
            BigDecimal t = StudentT.quantile(degrees);
            assertTrue(StudentCentral.probability(t.subtract(half), degrees).compareTo(central) <= 0, "" + degrees);
            assertTrue(StudentCentral.probability(t.add(half), degrees).compareTo(central) >= 0, "" + degrees);
        }
    }

    /** Exact values: P(|T| ≤ 1) is 1/2 for one degree of freedom and 1/√3 for two. */
    @Test
    void studentsDistributionHasItsClosedForms() {
        assertEquals("0.5000000000", Decimals.text(StudentCentral.probability(BigDecimal.ONE, 1), 10));
        assertEquals("0.5773502692", Decimals.text(StudentCentral.probability(BigDecimal.ONE, 2), 10));
    }

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

    private static BigDecimal six(BigDecimal value) {
        return value.setScale(6, RoundingMode.HALF_EVEN);
    }
}
