package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;
import org.notchwork.exact.Decimals;

/** Mean, variance and worst case of equally likely counts that are listed one by one. */
final class MomentsByListing {

    private BigInteger size = BigInteger.ZERO;
    private BigInteger sum = BigInteger.ZERO;
    private BigInteger squares = BigInteger.ZERO;
    private long worst;
    private final Map<Long, Long> times = new TreeMap<>();

    void add(long count) {
        BigInteger number = BigInteger.valueOf(count);
        size = size.add(BigInteger.ONE);
        sum = sum.add(number);
        squares = squares.add(number.multiply(number));
        worst = Math.max(worst, count);
        times.merge(count, 1L, Long::sum);
    }

    void assertAre(QueryLaw law, int width) {
        assertEquals(Prediction.ratio(sum, size), law.mean(width));
        BigInteger top = squares.multiply(size).subtract(sum.multiply(sum));
        assertEquals(
                Optional.of(Decimals.text(Decimals.quotient(top, size.multiply(size)), 40)),
                law.variance(width).map(v -> Decimals.text(v, 40)));
        assertEquals(OptionalLong.of(worst), law.worst(width));
    }

    /** The share of the listed counts that are at most m, for every m up to past the worst. */
    void assertDistributionIs(QueryLaw law, int width) {
        for (long m = 0; m <= worst + 2; m++) {
            long queries = m;
            long least = times.entrySet().stream()
                    .filter(entry -> entry.getKey() <= queries)
                    .mapToLong(Map.Entry::getValue)
                    .sum();
            assertEquals(Optional.of(Prediction.ratio(BigInteger.valueOf(least), size)), law.within(width, m));
        }
    }
}
