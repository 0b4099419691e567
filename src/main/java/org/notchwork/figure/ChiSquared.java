package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.MathContext;
import org.notchwork.exact.Decimals;

/**
 * The upper tail of the chi-squared law with a whole number of degrees of freedom, by its finite sums (M. Abramowitz
 * and I. A. Stegun (1964), 26.4.4 and 26.4.5).
 *
 * <p>All terms are positive, so that nothing cancels but in erfc near 0. There 1 − erf loses as many digits as erfc has
 * zeros: below x = 60, where the continued fraction takes over, at most 15. 80 digits while computing leave 65 less
 * some 4 for roundings of up to 500 terms: 50 are given. No doubles take part.
 */
public final class ChiSquared {

    /** The most degrees of freedom. */
    public static final int MOST_DEGREES = 500;

    /** Beyond it the tail of up to 500 degrees of freedom is below 10^−700, and given as 0. */
    private static final BigDecimal GREATEST = BigDecimal.valueOf(5000);

    private static final MathContext WORK = new MathContext(80);

    /** From here on 100 levels of the fraction are right to more than 80 digits: the error falls like e^(−4√(50x)). */
    private static final BigDecimal FRACTION_FROM = BigDecimal.valueOf(60);

    private static final int LEVELS = 100;
    private static final BigDecimal LEAST_TERM = new BigDecimal("1e-85");
    private static final BigDecimal TWO = BigDecimal.valueOf(2);

    private ChiSquared() {}

    /**
     * Returns the probability of a statistic at least as large, with 50 digits; 0 for a statistic above 5000.
     *
     * @param statistic at least 0
     * @param degrees degrees of freedom, 1 to 500
     */
    public static BigDecimal pValue(BigDecimal statistic, int degrees) {
        if (degrees < 1 || degrees > MOST_DEGREES) {
            throw new IllegalArgumentException(degrees + " degrees of freedom");
        }
        if (statistic.signum() < 0) {
            throw new IllegalArgumentException("statistic " + statistic);
        }
        if (statistic.signum() == 0) {
            return BigDecimal.ONE;
        }
        if (statistic.compareTo(GREATEST) > 0) {
            return BigDecimal.ZERO;
        }
        BigDecimal x = statistic.round(WORK);
        BigDecimal tail = degrees % 2 == 0 ? even(x, degrees) : odd(x, degrees);
        return tail.round(Decimals.CONTEXT).min(BigDecimal.ONE);
    }

    /** e^(−x/2) Σ (x/2)^i / i!, i below half the degrees. */
    private static BigDecimal even(BigDecimal x, int degrees) {
        return decay(x).multiply(sum(x, 2, degrees), WORK);
    }

    /** erfc √(x/2) + e^(−x/2) √(2x/π) Σ x^i / (1 · 3 ⋯ (2i + 1)), i below half of the degrees less one. */
    private static BigDecimal odd(BigDecimal x, int degrees) {
        BigDecimal factor =
                decay(x).multiply(TWO.multiply(x).divide(Pi.VALUE, WORK).sqrt(WORK), WORK);
        return erfc(x, factor).add(factor.multiply(sum(x, 3, degrees), WORK), WORK);
    }

    /** Returns 1 + x / a + x² / (a (a + 2)) + … with a last factor in the denominators below the limit; 0 if a > limit. */
    private static BigDecimal sum(BigDecimal x, int first, int limit) {
        if (first > limit) {
            return BigDecimal.ZERO;
        }
        BigDecimal term = BigDecimal.ONE;
        BigDecimal sum = term;
        for (int a = first; a < limit; a += 2) {
            term = term.multiply(x, WORK).divide(BigDecimal.valueOf(a), WORK);
            sum = sum.add(term, WORK);
        }
        return sum;
    }

    private static BigDecimal decay(BigDecimal x) {
        return Exponential.of(x.divide(TWO, WORK).negate(), WORK);
    }

    /** Returns erfc √(x/2), given the factor e^(−x/2) √(2x/π). */
    private static BigDecimal erfc(BigDecimal x, BigDecimal factor) {
        return x.compareTo(FRACTION_FROM) < 0
                ? BigDecimal.ONE.subtract(factor.multiply(series(x), WORK), WORK)
                : factor.multiply(fraction(x), WORK);
    }

    /** Σ x^i / (1 · 3 ⋯ (2i + 1)) over all i ≥ 0: Abramowitz and Stegun, 7.1.6. */
    private static BigDecimal series(BigDecimal x) {
        BigDecimal term = BigDecimal.ONE;
        BigDecimal sum = term;
        // From 2i + 1 > 2x on, the terms left out are together less than the last.
        for (long a = 3; term.compareTo(LEAST_TERM) > 0 || x.compareTo(BigDecimal.valueOf(a / 2)) > 0; a += 2) {
            term = term.multiply(x, WORK).divide(BigDecimal.valueOf(a), WORK);
            sum = sum.add(term, WORK);
        }
        return sum;
    }

    /** 1/(x + 1 − 1·2/(x + 5 − 3·4/(x + 9 − …))): the even part of Abramowitz and Stegun, 7.1.14. */
    private static BigDecimal fraction(BigDecimal x) {
        BigDecimal value = x.add(BigDecimal.valueOf((4L * LEVELS) + 1));
        for (long i = LEVELS; i >= 1; i--) {
            BigDecimal numerator = BigDecimal.valueOf(((2 * i) - 1) * 2 * i);
            value = x.add(BigDecimal.valueOf((4 * i) - 3)).subtract(numerator.divide(value, WORK), WORK);
        }
        return BigDecimal.ONE.divide(value, WORK);
    }
}
