package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * A block of 2^a points, then the multiples of 2^a, a = ⌊n/2⌋, b = n − a. For s = j · 2^a + l the collision comes at
 * 2^⌊log₂ l⌋ + 1 if j = 0, at 2^a + j if both are not 0, and at 2^a + 2^⌊log₂ j⌋ if l = 0.
 */
public final class DifferenceCoverLaw implements QueryLaw {

    @Override
    public Prediction mean(int width) {
        return Prediction.ratio(moment(width, 1), periods(width));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        BigInteger periods = periods(width);
        BigInteger first = moment(width, 1);
        BigInteger top = moment(width, 2).multiply(periods).subtract(first.multiply(first));
        return Optional.of(Decimals.quotient(top, periods.multiply(periods)));
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of((1L << (width / 2)) + (1L << (width - width / 2)) - 1);
    }

    @Override
    public OptionalLong queries(int width, long period) {
        int a = width / 2;
        long j = period >>> a;
        long l = period & ((1L << a) - 1);
        if (j == 0) {
            return OptionalLong.of(Long.highestOneBit(l) + 1);
        }
        return OptionalLong.of((1L << a) + (l == 0 ? Long.highestOneBit(j) : j));
    }

    /** Counts the periods of each of the three cases that are met by the m-th query. */
    @Override
    public Optional<Prediction> within(int width, long queries) {
        int a = width / 2;
        long block = 1L << a;
        long others = 1L << (width - a);
        long multiples = Math.max(0, Math.min(queries - block, others - 1));
        BigInteger met = BigInteger.valueOf(upToTop(Math.min(queries - 1, block - 1)))
                .add(BigInteger.valueOf(multiples).multiply(BigInteger.valueOf(block - 1)))
                .add(BigInteger.valueOf(upToTop(multiples)));
        return Optional.of(Prediction.ratio(met, periods(width)));
    }

    /** How many words have their top set bit not above that of {@code last}. */
    private static long upToTop(long last) {
        return last < 1 ? 0 : 2 * Long.highestOneBit(last) - 1;
    }

    @Override
    public String formula() {
        return "[S(a, 1) + (2^a - 1) sum_{j=1}^{2^b-1} (2^a + j) + S(b, 2^a)] / (2^n - 1),"
                + " S(m, c) = sum_{h<m} 2^h (2^h + c), a = floor(n/2), b = n - a";
    }

    @Override
    public String source() {
        return "derived by cases of s; order of growth: Cai and Qiu, J. Comput. Syst. Sci. 97 (2018)";
    }

    /** The sum over all periods of the query count to a power of 1 or 2. */
    private static BigInteger moment(int width, int power) {
        int a = width / 2;
        int b = width - a;
        BigInteger block = BigInteger.ONE.shiftLeft(a);
        BigInteger inBlock = tops(a, BigInteger.ONE, power);
        BigInteger mixed = block.subtract(BigInteger.ONE).multiply(shifted(b, block, power));
        return inBlock.add(mixed).add(tops(b, block, power));
    }

    /** Σ_{h<m} 2^h (2^h + c)^power: 2^h words of m bits have their top set bit at h. */
    private static BigInteger tops(int m, BigInteger c, int power) {
        BigInteger sum = BigInteger.ZERO;
        for (int h = 0; h < m; h++) {
            BigInteger count = BigInteger.ONE.shiftLeft(h);
            sum = sum.add(count.multiply(count.add(c).pow(power)));
        }
        return sum;
    }

    /** Σ_{j=1}^{k} (c + j)^power with k = 2^b − 1. */
    private static BigInteger shifted(int b, BigInteger c, int power) {
        BigInteger k = BigInteger.ONE.shiftLeft(b).subtract(BigInteger.ONE);
        BigInteger next = k.add(BigInteger.ONE);
        BigInteger sum = k.multiply(next).shiftRight(1);
        if (power == 1) {
            return k.multiply(c).add(sum);
        }
        BigInteger squares =
                k.multiply(next).multiply(k.shiftLeft(1).add(BigInteger.ONE)).divide(BigInteger.valueOf(6));
        return k.multiply(c).multiply(c).add(sum.multiply(c).shiftLeft(1)).add(squares);
    }

    private static BigInteger periods(int width) {
        return BigInteger.ONE.shiftLeft(width).subtract(BigInteger.ONE);
    }
}
