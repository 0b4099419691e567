package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.apache.commons.statistics.interval.BinomialConfidenceInterval;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.exact.Decimals;

/**
 * The library's doubles are a thousand times nearer to the truth than the 10^−9 within which the exact distribution
 * decides, so nothing outside that margin is rounded to the wrong side. The truth is bracketed by finite sums.
 */
class LibraryAccuracyTest {

    private static final BigDecimal ERROR = new BigDecimal("1e-12");
    private static final BigDecimal TAIL = new BigDecimal("0.025");
    private static final BigDecimal CENTRAL = new BigDecimal("0.95");

    @Test
    void studentsQuantileIsRightToTwelvePlaces() {
        for (long degrees = 1; degrees <= 400; degrees++) {
            requireQuantile(degrees);
        }
        for (long degrees : new long[] {999, 1999, 4999, 9999, 20_000, 99_999}) {
            requireQuantile(degrees);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "1, 2",
        "1, 29",
        "15, 148",
        "81, 263",
        "119, 120",
        "1, 1000",
        "500, 1000",
        "999, 1000",
        "3, 100000",
        "99997, 100000",
        "2, 1000000",
        "500, 1000000"
    })
    void theEndsOfClopperAndPearsonAreRightToTwelvePlaces(int solved, int trials) {
        org.apache.commons.statistics.interval.Interval ends =
                BinomialConfidenceInterval.CLOPPER_PEARSON.fromErrorRate(trials, solved, 0.05);
        BigDecimal low = new BigDecimal(ends.getLowerBound());
        BigDecimal high = new BigDecimal(ends.getUpperBound());
        assertTrue(atLeast(solved, trials, low.subtract(ERROR)).compareTo(TAIL) < 0);
        assertTrue(atLeast(solved, trials, low.add(ERROR)).compareTo(TAIL) > 0);
        assertTrue(atMost(solved, trials, high.subtract(ERROR)).compareTo(TAIL) > 0);
        assertTrue(atMost(solved, trials, high.add(ERROR)).compareTo(TAIL) < 0);
    }

    private static void requireQuantile(long degrees) {
        BigDecimal quantile = new BigDecimal(StudentT.exact(degrees));
        assertTrue(StudentCentral.probability(quantile.subtract(ERROR), degrees).compareTo(CENTRAL) < 0, "" + degrees);
        assertTrue(StudentCentral.probability(quantile.add(ERROR), degrees).compareTo(CENTRAL) > 0, "" + degrees);
    }

    /** P(X ≥ k) by the shorter side. */
    private static BigDecimal atLeast(int k, int n, BigDecimal p) {
        return 2 * k > n
                ? sum(n - k, n, BigDecimal.ONE.subtract(p))
                : BigDecimal.ONE.subtract(sum(k - 1, n, p), Decimals.CONTEXT);
    }

    private static BigDecimal atMost(int k, int n, BigDecimal p) {
        return BigDecimal.ONE.subtract(atLeast(k + 1, n, p), Decimals.CONTEXT);
    }

    /** P(X ≤ k) from the definition, with C(n, i) built up term by term. */
    private static BigDecimal sum(int k, int n, BigDecimal p) {
        BigDecimal q = BigDecimal.ONE.subtract(p);
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal choices = BigDecimal.ONE;
        for (int i = 0; i <= k; i++) {
            BigDecimal powers = p.pow(i, Decimals.CONTEXT).multiply(q.pow(n - i, Decimals.CONTEXT), Decimals.CONTEXT);
            sum = sum.add(choices.multiply(powers, Decimals.CONTEXT), Decimals.CONTEXT);
            choices = choices.multiply(BigDecimal.valueOf(n - i), Decimals.CONTEXT)
                    .divide(BigDecimal.valueOf(i + 1L), Decimals.CONTEXT);
        }
        return sum;
    }
}
