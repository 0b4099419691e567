package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * Distinct points until two values differ, or until M + 1 = 2^(n−1) + 1 values are equal. Half of the instances are
 * constant, half balanced and uniform among the balanced functions.
 *
 * <p>On a balanced function P(Q &gt; m) = 2 C(M, m)/C(2M, m) for m ≥ 1. The number X of further points equal to the
 * first kind has E[X] = M/(M + 1) and E[C(X, 2)] = M (M − 1)/((M + 1)(M + 2)).
 */
public final class BalancedScanLaw implements QueryLaw {

    @Override
    public Prediction mean(int width) {
        BigInteger half = half(width);
        Fraction constant = new Fraction(half.add(BigInteger.ONE), BigInteger.ONE);
        return constant.plus(balancedMean(half)).half().prediction();
    }

    /** Returns the exact mean on a balanced function, 1 + 2M/(M + 1). */
    public Prediction balancedMean(int width) {
        return balancedMean(half(width)).prediction();
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        BigInteger half = half(width);
        BigInteger next = half.add(BigInteger.ONE);
        Fraction waiting = new Fraction(half, next);
        Fraction pairs =
                new Fraction(half.multiply(half.subtract(BigInteger.ONE)), next.multiply(next.add(BigInteger.ONE)));
        Fraction balanced = Fraction.ONE.plus(pairs.times(4)).plus(waiting.times(6));
        Fraction second =
                new Fraction(next.multiply(next), BigInteger.ONE).plus(balanced).half();
        Fraction mean =
                new Fraction(next, BigInteger.ONE).plus(balancedMean(half)).half();
        return Optional.of(second.minus(mean.times(mean)).value());
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of((1L << (width - 1)) + 1);
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    /** Returns 1/2 − C(M, m)/C(2M, m) for 1 ≤ m ≤ M; empty where it takes more than 2^13 factors. */
    @Override
    public Optional<Prediction> within(int width, long queries) {
        if (queries < 2) {
            return Optional.of(Fraction.ZERO.prediction());
        }
        if (queries > 1L << (width - 1)) {
            return Optional.of(Fraction.ONE.prediction());
        }
        if (queries > Fraction.MOST_FACTORS) {
            return Optional.empty();
        }
        BigInteger half = half(width);
        return Optional.of(Fraction.of(1, 2)
                .minus(Fraction.falling(half, 1, half.shiftLeft(1), queries))
                .prediction());
    }

    @Override
    public String formula() {
        return "(M + 1 + 1 + 2M/(M + 1)) / 2, M = 2^(n-1)";
    }

    @Override
    public String source() {
        return "Deutsch and Jozsa, Proc. R. Soc. A 439 (1992), for the problem; counts derived";
    }

    private static Fraction balancedMean(BigInteger half) {
        return Fraction.ONE.plus(new Fraction(half.shiftLeft(1), half.add(BigInteger.ONE)));
    }

    private static BigInteger half(int width) {
        return BigInteger.ONE.shiftLeft(width - 1);
    }
}
