package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;

/** The exponential function in decimals: Taylor's series at x / 2^h, squared h times. */
final class Exponential {

    /** Halvings beyond those that bring |x| below 1: each term then gains more than two digits. */
    private static final int MORE_HALVINGS = 8;

    /** Against the roundings of the sum, of which there are fewer than a hundred, and of the squarings. */
    private static final int GUARD = 6;

    private Exponential() {}

    /** Returns e^x; its relative error is below one unit of the last digit of the context. */
    static BigDecimal of(BigDecimal x, MathContext context) {
        int halvings = x.toBigInteger().bitLength() + MORE_HALVINGS;
        // A relative error doubles with each squaring: log10(2) < 1/3 of a digit.
        int digits = context.getPrecision() + (halvings / 3) + GUARD;
        MathContext work = new MathContext(digits);
        BigDecimal small = x.divide(new BigDecimal(BigInteger.ONE.shiftLeft(halvings)), work);
        BigDecimal least = BigDecimal.ONE.movePointLeft(digits);
        BigDecimal sum = BigDecimal.ONE;
        BigDecimal term = small;
        for (long i = 2; term.abs().compareTo(least) > 0; i++) {
            sum = sum.add(term, work);
            term = term.multiply(small, work).divide(BigDecimal.valueOf(i), work);
        }
        for (int i = 0; i < halvings; i++) {
            sum = sum.multiply(sum, work);
        }
        return sum.round(context);
    }
}
