package org.notchwork.support;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.notchwork.exact.Decimals;

/** Reads fractions as the check values write them. */
public final class Fractions {

    private Fractions() {}

    /** Returns the value of {@code "p/q"} or {@code "p"} with 50 digits. */
    public static BigDecimal value(String fraction) {
        int slash = fraction.indexOf('/');
        if (slash < 0) {
            return Decimals.quotient(new BigInteger(fraction), BigInteger.ONE);
        }
        return Decimals.quotient(
                new BigInteger(fraction.substring(0, slash)), new BigInteger(fraction.substring(slash + 1)));
    }
}
