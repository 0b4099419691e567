package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.notchwork.exact.Decimals;

/**
 * A number that theory predicts.
 *
 * @param value the number, right to 40 digits or more
 * @param fraction the number as a reduced fraction {@code "p/q"} where its digits fit a line (at most 40 characters)
 */
public record Prediction(BigDecimal value, Optional<String> fraction) {

    private static final int LINE = 40;

    /** Returns the prediction p / q. */
    public static Prediction ratio(BigInteger p, BigInteger q) {
        BigInteger divisor = p.gcd(q);
        BigInteger top = p.divide(divisor);
        BigInteger bottom = q.divide(divisor);
        String text = bottom.equals(BigInteger.ONE) ? top.toString() : top + "/" + bottom;
        return new Prediction(
                Decimals.quotient(top, bottom), text.length() <= LINE ? Optional.of(text) : Optional.empty());
    }

    /** Returns a prediction known as a decimal only. */
    public static Prediction decimal(BigDecimal value) {
        return new Prediction(value, Optional.empty());
    }
}
