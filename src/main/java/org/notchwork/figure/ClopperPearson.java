package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import org.apache.commons.statistics.interval.BinomialConfidenceInterval;
import org.notchwork.exact.Decimals;

/**
 * The 95 % interval for a success rate by C. J. Clopper and E. S. Pearson (Biometrika 26 (1934)), to six places.
 *
 * <p>The library's doubles are right to far more than six places, but two machines could still round a value on a
 * boundary to different sides. Where a value lies within 10^−9 of a boundary, the exact binomial tail at the boundary
 * decides; so the six places are the same everywhere.
 */
final class ClopperPearson {

    private static final double ALPHA = 0.05;
    private static final BigDecimal TAIL = new BigDecimal("0.025");
    private static final BigDecimal STEP = new BigDecimal("0.000001");
    private static final BigDecimal HALF_STEP = new BigDecimal("0.0000005");
    private static final BigDecimal DOUBT = new BigDecimal("1e-9");

    private ClopperPearson() {}

    /** Returns the interval for {@code solved} of {@code trials}. */
    static Interval interval(long solved, long trials) {
        if (trials > Integer.MAX_VALUE) {
            throw new IllegalArgumentException(trials + " trials");
        }
        org.apache.commons.statistics.interval.Interval raw =
                BinomialConfidenceInterval.CLOPPER_PEARSON.fromErrorRate((int) trials, (int) solved, ALPHA);
        // The lower end p has P(X >= solved; p) = 0.025, the upper end P(X <= solved; p) = 0.025.
        BigDecimal low = solved == 0 ? zero() : settle(raw.getLowerBound(), solved, trials, true);
        BigDecimal high = solved == trials ? one() : settle(raw.getUpperBound(), solved, trials, false);
        return new Interval(low, high);
    }

    private static BigDecimal zero() {
        return BigDecimal.ZERO.setScale(Decimals.PLACES);
    }

    private static BigDecimal one() {
        return BigDecimal.ONE.setScale(Decimals.PLACES);
    }

    private static BigDecimal settle(double end, long solved, long trials, boolean lower) {
        BigDecimal value = new BigDecimal(end);
        BigDecimal floor = value.setScale(Decimals.PLACES, RoundingMode.FLOOR);
        BigDecimal boundary = floor.add(HALF_STEP);
        if (value.subtract(boundary).abs().compareTo(DOUBT) > 0) {
            return value.setScale(Decimals.PLACES, RoundingMode.HALF_EVEN);
        }
        boolean endIsAbove = lower
                ? upperTail(solved, trials, boundary).compareTo(TAIL) < 0
                : lowerTail(solved, trials, boundary).compareTo(TAIL) > 0;
        return endIsAbove ? floor.add(STEP) : floor;
    }

    /** Returns P(X ≥ k) for X binomial: rises with p. */
    static BigDecimal upperTail(long k, long n, BigDecimal p) {
        return lowerTail(n - k, n, BigDecimal.ONE.subtract(p));
    }

    /** Returns P(X ≤ k) for X binomial, term by term with 50 digits: falls with p. */
    static BigDecimal lowerTail(long k, long n, BigDecimal p) {
        BigDecimal q = BigDecimal.ONE.subtract(p);
        BigDecimal term = q.pow((int) n, Decimals.CONTEXT);
        BigDecimal odds = p.divide(q, Decimals.CONTEXT);
        BigDecimal sum = term;
        for (long i = 1; i <= k; i++) {
            BigDecimal factor = Decimals.quotient(BigInteger.valueOf(n - i + 1), BigInteger.valueOf(i));
            term = term.multiply(factor, Decimals.CONTEXT).multiply(odds, Decimals.CONTEXT);
            sum = sum.add(term, Decimals.CONTEXT);
        }
        return sum;
    }
}
