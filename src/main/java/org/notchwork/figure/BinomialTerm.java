package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * One probability of the binomial law, at a cost that does not grow with n.
 *
 * <p>Where k or n − k is below 64, the coefficient is a short product. Elsewhere Stirling's formula in the factorials
 * leaves √(n / (2π k (n − k))) (np / k)^k (nq / (n − k))^(n−k) e^(μ(n) − μ(k) − μ(n−k)), in which nothing cancels:
 * both powers are taken by squaring, so no logarithm is needed.
 */
final class BinomialTerm {

    /** A power multiplies the relative error of its base by at most n ≤ 10^7: 80 digits leave more than 70. */
    static final MathContext WORK = new MathContext(80);

    private static final BigDecimal TWO_PI = Pi.VALUE.multiply(BigDecimal.valueOf(2));

    private BinomialTerm() {}

    /** Returns P(X = k), 0 ≤ k ≤ n, 0 < p < 1, with a relative error below 10^−60. */
    static BigDecimal of(long k, long n, BigDecimal p) {
        if (k > n - k) {
            return of(n - k, n, BigDecimal.ONE.subtract(p));
        }
        return k < Stirling.LEAST ? byProduct(k, n, p) : byStirling(k, n, p);
    }

    private static BigDecimal byProduct(long k, long n, BigDecimal p) {
        BigDecimal ways = BigDecimal.ONE;
        for (long i = 1; i <= k; i++) {
            ways = ways.multiply(BigDecimal.valueOf(n - i + 1), WORK).divide(BigDecimal.valueOf(i), WORK);
        }
        BigDecimal solved = power(p, k);
        return ways.multiply(solved, WORK).multiply(power(BigDecimal.ONE.subtract(p), n - k), WORK);
    }

    private static BigDecimal byStirling(long k, long n, BigDecimal p) {
        BigDecimal size = BigDecimal.valueOf(n);
        BigDecimal hits = BigDecimal.valueOf(k);
        BigDecimal misses = BigDecimal.valueOf(n - k);
        BigDecimal q = BigDecimal.ONE.subtract(p);
        BigDecimal root =
                size.divide(TWO_PI.multiply(hits).multiply(misses), WORK).sqrt(WORK);
        BigDecimal hitPower = power(size.multiply(p).divide(hits, WORK), k);
        BigDecimal missPower = power(size.multiply(q).divide(misses, WORK), n - k);
        BigDecimal rest =
                Stirling.remainder(n).subtract(Stirling.remainder(k), WORK).subtract(Stirling.remainder(n - k), WORK);
        return root.multiply(hitPower, WORK).multiply(missPower, WORK).multiply(Exponential.of(rest, WORK), WORK);
    }

    private static BigDecimal power(BigDecimal base, long exponent) {
        return base.pow(Math.toIntExact(exponent), WORK);
    }
}
