package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.notchwork.exact.Decimals;

/** An exact fraction on the way to a prediction; not reduced until it is asked for. */
record Fraction(BigInteger top, BigInteger bottom) {

    static final Fraction ZERO = new Fraction(BigInteger.ZERO, BigInteger.ONE);

    static final Fraction ONE = new Fraction(BigInteger.ONE, BigInteger.ONE);

    /** Factors of a falling product beyond which a law gives no probability. */
    static final long MOST_FACTORS = 1L << 13;

    /** Longer numbers take long to reduce and do not come down to a line of digits. */
    private static final int REDUCED_BITS = 1 << 16;

    static Fraction of(long top, long bottom) {
        return new Fraction(BigInteger.valueOf(top), BigInteger.valueOf(bottom));
    }

    /** Returns ∏_{i&lt;count} (top − step · i) / (bottom − i). */
    static Fraction falling(BigInteger top, long step, BigInteger bottom, long count) {
        BigInteger above = BigInteger.ONE;
        BigInteger below = BigInteger.ONE;
        for (long i = 0; i < count; i++) {
            above = above.multiply(top.subtract(BigInteger.valueOf(step * i)));
            below = below.multiply(bottom.subtract(BigInteger.valueOf(i)));
        }
        return new Fraction(above, below);
    }

    Fraction plus(Fraction other) {
        return new Fraction(top.multiply(other.bottom).add(other.top.multiply(bottom)), bottom.multiply(other.bottom));
    }

    Fraction minus(Fraction other) {
        return plus(new Fraction(other.top.negate(), other.bottom));
    }

    Fraction times(Fraction other) {
        return new Fraction(top.multiply(other.top), bottom.multiply(other.bottom));
    }

    Fraction times(long factor) {
        return new Fraction(top.multiply(BigInteger.valueOf(factor)), bottom);
    }

    Fraction half() {
        return new Fraction(top, bottom.shiftLeft(1));
    }

    Fraction complement() {
        return new Fraction(bottom.subtract(top), bottom);
    }

    BigDecimal value() {
        return Decimals.quotient(top, bottom);
    }

    Prediction prediction() {
        return bottom.bitLength() <= REDUCED_BITS ? Prediction.ratio(top, bottom) : Prediction.decimal(value());
    }
}
