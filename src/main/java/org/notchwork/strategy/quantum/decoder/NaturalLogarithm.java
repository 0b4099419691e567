package org.notchwork.strategy.quantum.decoder;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;

/** Logarithms as whole numbers, the same on every machine. */
final class NaturalLogarithm {

    /** Bits after the point while computing; the result needs far fewer. */
    private static final int WORKING = 160;

    private NaturalLogarithm() {}

    /**
     * Returns ln x, times 2^scale, rounded to the nearest whole number: ln x = k ln 2 + 2 artanh((y − 1)/(y + 1)) with
     * x = 2^k y and y from 2/3 to 4/3.
     *
     * @param x above 0
     * @param scale at most 100
     */
    static long scaled(BigDecimal x, int scale) {
        BigDecimal unit = new BigDecimal(BigInteger.ONE.shiftLeft(WORKING));
        BigInteger y = x.multiply(unit).setScale(0, RoundingMode.HALF_EVEN).toBigIntegerExact();
        BigInteger one = BigInteger.ONE.shiftLeft(WORKING);
        BigInteger three = BigInteger.valueOf(3);
        int k = 0;
        while (y.multiply(three).compareTo(one.shiftLeft(2)) > 0) {
            y = y.shiftRight(1);
            k++;
        }
        while (y.multiply(three).compareTo(one.shiftLeft(1)) < 0) {
            y = y.shiftLeft(1);
            k--;
        }
        BigInteger ln2 = artanh(one.divide(three), one).shiftLeft(1);
        BigInteger ln = artanh(y.subtract(one).multiply(one).divide(y.add(one)), one)
                .shiftLeft(1)
                .add(ln2.multiply(BigInteger.valueOf(k)));
        BigInteger half = BigInteger.ONE.shiftLeft(WORKING - scale - 1);
        return ln.add(half).shiftRight(WORKING - scale).longValueExact();
    }

    /** Σ z^(2j+1)/(2j+1), all numbers times {@code one}. */
    private static BigInteger artanh(BigInteger z, BigInteger one) {
        BigInteger square = z.multiply(z).divide(one);
        BigInteger power = z;
        BigInteger sum = BigInteger.ZERO;
        for (int odd = 1; power.signum() != 0; odd += 2) {
            sum = sum.add(power.divide(BigInteger.valueOf(odd)));
            power = power.multiply(square).divide(one);
        }
        return sum;
    }
}
