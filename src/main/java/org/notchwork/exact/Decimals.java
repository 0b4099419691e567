package org.notchwork.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.regex.Pattern;

/** The one rule for decimals: 50 digits while computing, six places after the point when written. */
public final class Decimals {

    /** Digits while computing. */
    public static final MathContext CONTEXT = new MathContext(50, RoundingMode.HALF_EVEN);

    /** Places after the point of a written figure. */
    public static final int PLACES = 6;

    /** What a written decimal looks like; at most 40 digits before the point. */
    public static final Pattern FORM = Pattern.compile("-?(0|[1-9][0-9]{0,39})(\\.[0-9]{1,12})?");

    private Decimals() {}

    /** Returns the written form: six places, half to even, plain digits, never an exponent, never −0. */
    public static String text(BigDecimal value) {
        return text(value, PLACES);
    }

    /** Returns the written form with a stated number of places, half to even. */
    public static String text(BigDecimal value, int places) {
        return value.setScale(places, RoundingMode.HALF_EVEN).toPlainString();
    }

    /** Returns a / b with 50 digits. */
    public static BigDecimal quotient(BigInteger a, BigInteger b) {
        return new BigDecimal(a).divide(new BigDecimal(b), CONTEXT);
    }

    /** Returns a / b with 50 digits. */
    public static BigDecimal quotient(long a, long b) {
        return BigDecimal.valueOf(a).divide(BigDecimal.valueOf(b), CONTEXT);
    }

    /** Returns the square root with 50 digits. */
    public static BigDecimal root(BigDecimal value) {
        return value.sqrt(CONTEXT);
    }
}
