package org.notchwork.law;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** ln x = 2^r · 2 artanh((y − 1)/(y + 1)), y the r-th repeated square root of x, by the series of artanh. */
final class NaturalLogarithm {

    /** More than are given away when terms cancel. */
    static final MathContext DIGITS = new MathContext(80, RoundingMode.HALF_EVEN);

    private static final int ROOTS = 10;

    private static final BigDecimal NEGLIGIBLE = new BigDecimal("1e-90");

    private NaturalLogarithm() {}

    /** Returns ln x for x &gt; 0, right to 70 places after the point where |ln x| is below 100. */
    static BigDecimal of(BigDecimal x) {
        BigDecimal y = x;
        for (int i = 0; i < ROOTS; i++) {
            y = y.sqrt(DIGITS);
        }
        BigDecimal z = y.subtract(BigDecimal.ONE).divide(y.add(BigDecimal.ONE), DIGITS);
        BigDecimal square = z.multiply(z, DIGITS);
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal power = z;
        for (int k = 1; power.abs().compareTo(NEGLIGIBLE) > 0; k += 2) {
            sum = sum.add(power.divide(BigDecimal.valueOf(k), DIGITS), DIGITS);
            power = power.multiply(square, DIGITS);
        }
        return sum.multiply(BigDecimal.valueOf(2L << ROOTS), DIGITS);
    }
}
