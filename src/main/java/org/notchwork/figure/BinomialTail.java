package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.notchwork.exact.Decimals;

/**
 * Exact tails of the binomial law and the exact test of a success rate (C. J. Clopper and E. S. Pearson, Biometrika 26
 * (1934)), for n up to 10^7 and p that is 0, 1 or no nearer than 10^−100 to either.
 *
 * <p>A tail that begins on the far side of the mode is summed from its first and greatest term outwards, in multiples
 * of that term; the other tails are complements of such. So a tail that is small keeps its digits: its relative error
 * is below 10^−45. Some 17 √(npq) terms matter. No doubles take part: the result is the same on every machine.
 */
public final class BinomialTail {

    /** The most trials. */
    public static final long MOST_TRIALS = 10_000_000;

    /**
     * Fractional bits of a sum whose first term is 1. Each of t terms is off by at most t units, all by t² / 2: for n =
     * 10^7 t is below 30 000, and the sum is right to 2^−192 · 2^29 < 10^−48.
     */
    private static final int FRACTION_BITS = 192;

    private static final BigDecimal ONE_UNIT = new BigDecimal(BigInteger.ONE.shiftLeft(FRACTION_BITS));

    /** Probabilities nearer to each other than this, relatively, are equal: p may stand for a fraction like 1/3. */
    private static final BigDecimal TIE = BigDecimal.ONE.add(new BigDecimal("1e-30"));

    private static final BigDecimal NEAREST = new BigDecimal("1e-100");

    private BinomialTail() {}

    /**
     * Returns P(X ≥ k) with 50 digits; 1 for k ≤ 0 and 0 for k > n.
     *
     * @param k how many successes at least
     * @param n trials, 0 to 10^7
     * @param p the probability of a success
     */
    public static BigDecimal atLeast(long k, long n, BigDecimal p) {
        check(n, p);
        if (k <= 0) {
            return BigDecimal.ONE;
        }
        if (k > n || p.signum() == 0) {
            return BigDecimal.ZERO;
        }
        BigDecimal q = BigDecimal.ONE.subtract(p);
        if (q.signum() == 0) {
            return BigDecimal.ONE;
        }
        if (k > mode(n, p)) {
            return outwards(k, n, p).round(Decimals.CONTEXT);
        }
        return BigDecimal.ONE.subtract(outwards(n - k + 1, n, q), Decimals.CONTEXT);
    }

    /**
     * Returns P(X ≤ k) with 50 digits; 0 for k < 0 and 1 for k ≥ n.
     *
     * @param k how many successes at most
     * @param n trials, 0 to 10^7
     * @param p the probability of a success
     */
    public static BigDecimal atMost(long k, long n, BigDecimal p) {
        check(n, p);
        if (k < 0) {
            return BigDecimal.ZERO;
        }
        return k >= n ? BigDecimal.ONE : atLeast(n - k, n, BigDecimal.ONE.subtract(p));
    }

    /**
     * Returns the two-sided p-value of k successes: the sum of all probabilities that do not exceed that of k.
     * Probabilities that differ by less than 10^−30 of themselves count as equal.
     *
     * @param k the successes observed, 0 to n
     * @param n trials, 0 to 10^7
     * @param p the probability of a success
     */
    public static BigDecimal twoSided(long k, long n, BigDecimal p) {
        check(n, p);
        if (k < 0 || k > n) {
            throw new IllegalArgumentException(k + " successes in " + n + " trials");
        }
        BigDecimal q = BigDecimal.ONE.subtract(p);
        if (p.signum() == 0 || q.signum() == 0) {
            boolean certain = p.signum() == 0 ? k == 0 : k == n;
            return certain ? BigDecimal.ONE : BigDecimal.ZERO;
        }
        long mode = mode(n, p);
        BigDecimal bar = BinomialTerm.of(k, n, p).multiply(TIE);
        if (BinomialTerm.of(mode, n, p).compareTo(bar) <= 0) {
            return BigDecimal.ONE;
        }
        if (k > mode) {
            return atLeast(k, n, p).add(atMost(below(bar, mode, n, p), n, p), Decimals.CONTEXT);
        }
        return twoSided(n - k, n, q);
    }

    /** Returns the greatest j left of the mode with P(X = j) ≤ bar, −1 if none: probabilities rise up to the mode. */
    private static long below(BigDecimal bar, long mode, long n, BigDecimal p) {
        long low = -1;
        long high = mode;
        while (high - low > 1) {
            long middle = low + ((high - low) / 2);
            if (BinomialTerm.of(middle, n, p).compareTo(bar) <= 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** Returns the sum of P(X = j), j ≥ k, for k from where these no longer rise: k + 1 ≥ (n + 1) p. */
    private static BigDecimal outwards(long k, long n, BigDecimal p) {
        BigInteger hit = p.unscaledValue();
        BigInteger miss = BigInteger.TEN.pow(p.scale()).subtract(hit);
        BigInteger term = BigInteger.ONE.shiftLeft(FRACTION_BITS);
        BigInteger sum = term;
        for (long j = k; j < n && term.signum() > 0; j++) {
            BigInteger rise = hit.multiply(BigInteger.valueOf(n - j));
            term = term.multiply(rise).divide(miss.multiply(BigInteger.valueOf(j + 1)));
            sum = sum.add(term);
        }
        BigDecimal multiple = new BigDecimal(sum).divide(ONE_UNIT, BinomialTerm.WORK);
        return BinomialTerm.of(k, n, p).multiply(multiple, BinomialTerm.WORK);
    }

    private static long mode(long n, BigDecimal p) {
        return BigDecimal.valueOf(n + 1).multiply(p).toBigInteger().longValueExact();
    }

    private static void check(long n, BigDecimal p) {
        if (n < 0 || n > MOST_TRIALS) {
            throw new IllegalArgumentException(n + " trials");
        }
        BigDecimal q = BigDecimal.ONE.subtract(p);
        BigDecimal nearer = p.min(q);
        if (nearer.signum() < 0 || (nearer.signum() > 0 && nearer.compareTo(NEAREST) < 0)) {
            throw new IllegalArgumentException("probability " + p);
        }
    }
}
