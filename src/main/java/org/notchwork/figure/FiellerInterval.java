package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.exact.Decimals;

/**
 * The 95 % interval of a ratio of two means of paired observations (E. C. Fieller, J. R. Statist. Soc. B 16 (1954)).
 *
 * <p>It is the set of ρ for which the mean of x − ρ y does not differ from 0 by a t test with N − 1 degrees of
 * freedom: (x̄ − ρ ȳ)² ≤ (t²/N)(s_xx − 2 ρ s_xy + ρ² s_yy), a quadratic in ρ.
 */
final class FiellerInterval {

    private FiellerInterval() {}

    /**
     * Returns the interval; empty where it is unbounded because ȳ does not differ from 0.
     *
     * @param meanX the mean of the numerator
     * @param meanY the mean of the denominator
     * @param sxx sample variance of the numerator
     * @param sxy sample covariance
     * @param syy sample variance of the denominator
     * @param size N, at least 2
     */
    static Optional<Interval> of(
            BigDecimal meanX, BigDecimal meanY, BigDecimal sxx, BigDecimal sxy, BigDecimal syy, long size) {
        BigDecimal t = StudentT.quantile(size - 1);
        BigDecimal weight = t.multiply(t).divide(BigDecimal.valueOf(size), Decimals.CONTEXT);
        // a ρ² − 2 b ρ + c ≤ 0
        BigDecimal a = square(meanY).subtract(weight.multiply(syy, Decimals.CONTEXT), Decimals.CONTEXT);
        BigDecimal b = meanX.multiply(meanY, Decimals.CONTEXT)
                .subtract(weight.multiply(sxy, Decimals.CONTEXT), Decimals.CONTEXT);
        BigDecimal c = square(meanX).subtract(weight.multiply(sxx, Decimals.CONTEXT), Decimals.CONTEXT);
        if (a.signum() <= 0) {
            return Optional.empty();
        }
        BigDecimal discriminant = square(b).subtract(a.multiply(c, Decimals.CONTEXT), Decimals.CONTEXT);
        // Exactly 0 where both counts are constant; rounding may leave it a hair below.
        BigDecimal root = Decimals.root(discriminant.max(BigDecimal.ZERO));
        return Optional.of(new Interval(
                b.subtract(root, Decimals.CONTEXT).divide(a, Decimals.CONTEXT),
                b.add(root, Decimals.CONTEXT).divide(a, Decimals.CONTEXT)));
    }

    private static BigDecimal square(BigDecimal value) {
        return value.multiply(value, Decimals.CONTEXT);
    }
}
