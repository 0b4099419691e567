package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/** Queries 0, 1, 2, … of a uniformly random period: the collision comes at query 2^⌊log₂ s⌋ + 1. */
public final class SequentialScanLaw implements QueryLaw {

    @Override
    public Prediction mean(int width) {
        return Prediction.ratio(size(width).add(BigInteger.valueOf(4)), BigInteger.valueOf(3));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        BigInteger n = size(width);
        BigInteger top = n.shiftLeft(1).subtract(BigInteger.ONE).multiply(n.subtract(BigInteger.TWO));
        return Optional.of(Decimals.quotient(top, BigInteger.valueOf(63)));
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of((1L << (width - 1)) + 1);
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.of(Long.highestOneBit(period) + 1);
    }

    /** The first 2^h + 1 points meet the periods below 2^(h+1), and the points up to 2^(h+1) no others. */
    @Override
    public Optional<Prediction> within(int width, long queries) {
        long last = Math.min(queries - 1, 1L << (width - 1));
        BigInteger met = last < 1
                ? BigInteger.ZERO
                : BigInteger.valueOf(Long.highestOneBit(last)).shiftLeft(1).subtract(BigInteger.ONE);
        return Optional.of(Prediction.ratio(met, size(width).subtract(BigInteger.ONE)));
    }

    @Override
    public String formula() {
        return "(2^n + 4) / 3";
    }

    @Override
    public String source() {
        return "derived: the top set bit h of s is uniform over the words, and the collision comes at 2^h + 1";
    }

    private static BigInteger size(int width) {
        return BigInteger.ONE.shiftLeft(width);
    }
}
