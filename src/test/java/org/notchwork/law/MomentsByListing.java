package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/** Mean, variance and worst case of equally likely counts that are listed one by one. */
final class MomentsByListing {

    private BigInteger size = BigInteger.ZERO;
    private BigInteger sum = BigInteger.ZERO;
    private BigInteger squares = BigInteger.ZERO;
    private long worst;

    void add(long count) {
        BigInteger number = BigInteger.valueOf(count);
        size = size.add(BigInteger.ONE);
        sum = sum.add(number);
        squares = squares.add(number.multiply(number));
        worst = Math.max(worst, count);
    }

    void assertAre(QueryLaw law, int width) {
        assertEquals(Prediction.ratio(sum, size), law.mean(width));
        BigInteger top = squares.multiply(size).subtract(sum.multiply(sum));
        assertEquals(
                Optional.of(Decimals.text(Decimals.quotient(top, size.multiply(size)), 40)),
                law.variance(width).map(v -> Decimals.text(v, 40)));
        assertEquals(OptionalLong.of(worst), law.worst(width));
    }
}
