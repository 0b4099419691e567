package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.MathContext;
import org.notchwork.exact.Decimals;

/**
 * P(|T| ≤ t) for Student's t with a whole number ν of degrees of freedom, as a finite sum in decimals of 50 digits.
 *
 * <p>With θ = arctan(t/√ν): for even ν, sin θ (1 + ½ cos² θ + (1·3)/(2·4) cos⁴ θ + …) with ν/2 terms; for odd ν,
 * (2/π) (θ + sin θ (cos θ + ⅔ cos³ θ + (2·4)/(3·5) cos⁵ θ + …)) with (ν − 1)/2 terms in the inner sum.
 *
 * @see "M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions (1964), 26.7.3 and 26.7.4"
 */
final class StudentCentral {

    private static final MathContext CONTEXT = Decimals.CONTEXT;
    private static final BigDecimal ONE = BigDecimal.ONE;
    private static final BigDecimal TWO = BigDecimal.valueOf(2);
    private static final BigDecimal SMALL = new BigDecimal("1e-55");

    private StudentCentral() {}

    static BigDecimal probability(BigDecimal t, long degrees) {
        BigDecimal nu = BigDecimal.valueOf(degrees);
        BigDecimal squares = nu.add(t.multiply(t), CONTEXT);
        BigDecimal cosSquare = nu.divide(squares, CONTEXT);
        BigDecimal sin = t.divide(Decimals.root(squares), CONTEXT);
        if (degrees % 2 == 0) {
            return sin.multiply(sum(ONE, cosSquare, 1, degrees / 2), CONTEXT);
        }
        BigDecimal theta = arctan(t.divide(Decimals.root(nu), CONTEXT));
        BigDecimal inner = sum(Decimals.root(cosSquare), cosSquare, 2, (degrees - 1) / 2);
        BigDecimal halfPi = arctan(ONE).multiply(TWO, CONTEXT);
        return theta.add(sin.multiply(inner, CONTEXT), CONTEXT).divide(halfPi, CONTEXT);
    }

    /** Sums {@code terms} terms, each the one before times ratio · k/(k + 1), k = from, from + 2, from + 4, … */
    private static BigDecimal sum(BigDecimal first, BigDecimal ratio, long from, long terms) {
        BigDecimal term = first;
        BigDecimal sum = BigDecimal.ZERO;
        for (long i = 0; i < terms; i++) {
            sum = sum.add(term, CONTEXT);
            long k = from + 2 * i;
            term = term.multiply(ratio, CONTEXT).multiply(Decimals.quotient(k, k + 1), CONTEXT);
        }
        return sum;
    }

    /** Halves the angle until it is small, arctan x = 2 arctan(x / (1 + √(1 + x²))), then sums Gregory's series. */
    private static BigDecimal arctan(BigDecimal tangent) {
        BigDecimal x = tangent;
        BigDecimal factor = ONE;
        while (x.compareTo(new BigDecimal("0.01")) > 0) {
            x = x.divide(ONE.add(Decimals.root(ONE.add(x.multiply(x, CONTEXT), CONTEXT)), CONTEXT), CONTEXT);
            factor = factor.multiply(TWO);
        }
        BigDecimal square = x.multiply(x, CONTEXT).negate();
        BigDecimal power = x;
        BigDecimal sum = BigDecimal.ZERO;
        for (long k = 1; power.abs().compareTo(SMALL) > 0; k += 2) {
            sum = sum.add(power.divide(BigDecimal.valueOf(k), CONTEXT), CONTEXT);
            power = power.multiply(square, CONTEXT);
        }
        return sum.multiply(factor, CONTEXT);
    }
}
