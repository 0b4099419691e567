package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.notchwork.exact.Decimals;

/** Gathers whole numbers as exact counts and answers for their order statistics, mean and deviation. */
final class CountTally {

    private final TreeMap<Long, Long> multiplicity = new TreeMap<>();
    private long size;

    /** Adds a number, not negative. */
    void add(long number) {
        multiplicity.merge(number, 1L, Math::addExact);
        size++;
    }

    long size() {
        return size;
    }

    /** Returns a copy of the numbers with how often each occurred. */
    SortedMap<Long, Long> multiplicities() {
        return new TreeMap<>(multiplicity);
    }

    long min() {
        return multiplicity.firstKey();
    }

    long max() {
        return multiplicity.lastKey();
    }

    /** Returns the least number that at least {@code parts} quarters of all do not exceed. */
    long quartile(int parts) {
        long seen = 0;
        for (Map.Entry<Long, Long> entry : multiplicity.entrySet()) {
            seen += entry.getValue();
            if (4 * seen >= parts * size) {
                return entry.getKey();
            }
        }
        throw new IllegalStateException("no numbers");
    }

    BigInteger sum() {
        return power(1);
    }

    BigDecimal mean() {
        return Decimals.quotient(sum(), BigInteger.valueOf(size));
    }

    /** Returns the sample variance, divisor size − 1; empty for one number. */
    Optional<BigDecimal> variance() {
        if (size < 2) {
            return Optional.empty();
        }
        BigInteger n = BigInteger.valueOf(size);
        BigInteger top = n.multiply(power(2)).subtract(sum().pow(2));
        return Optional.of(Decimals.quotient(top, n.multiply(n.subtract(BigInteger.ONE))));
    }

    private BigInteger power(int exponent) {
        BigInteger sum = BigInteger.ZERO;
        for (Map.Entry<Long, Long> entry : multiplicity.entrySet()) {
            sum = sum.add(
                    BigInteger.valueOf(entry.getKey()).pow(exponent).multiply(BigInteger.valueOf(entry.getValue())));
        }
        return sum;
    }
}
