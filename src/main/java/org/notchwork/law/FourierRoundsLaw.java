package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * Rounds until n − 1 independent words are held, each word uniform on a space of dimension n − 1. The wait for the
 * i-th from the last is geometric with success 1 − 2^−i.
 */
public final class FourierRoundsLaw implements QueryLaw {

    /** Fractions of wider ones have more digits than anybody reads; decimals of 50 digits stand for them. */
    private static final int WIDEST_EXACT = 64;

    private static final int NEGLIGIBLE = 200;

    @Override
    public Prediction mean(int width) {
        if (width > WIDEST_EXACT) {
            return Prediction.decimal(waits(width));
        }
        BigInteger top = BigInteger.ZERO;
        BigInteger bottom = BigInteger.ONE;
        for (int i = 1; i < width; i++) {
            BigInteger p = BigInteger.ONE.shiftLeft(i);
            BigInteger q = p.subtract(BigInteger.ONE);
            top = top.multiply(q).add(p.multiply(bottom));
            bottom = bottom.multiply(q);
        }
        return Prediction.ratio(top, bottom);
    }

    private static BigDecimal waits(int width) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 1; i < width; i++) {
            BigInteger p = BigInteger.ONE.shiftLeft(i);
            sum = sum.add(Decimals.quotient(p, p.subtract(BigInteger.ONE)), Decimals.CONTEXT);
        }
        return sum;
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 1; i < width; i++) {
            BigInteger p = BigInteger.ONE.shiftLeft(i);
            BigInteger q = p.subtract(BigInteger.ONE);
            sum = sum.add(Decimals.quotient(p, q.multiply(q)), Decimals.CONTEXT);
        }
        return Optional.of(sum);
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.empty();
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    /**
     * Returns P(R ≤ m) = ∏_{i=0}^{n−2} (1 − 2^(i−m)), the probability that m words uniform on a space of dimension
     * n − 1 span it; 0 for m &lt; n − 1.
     */
    @Override
    public Optional<Prediction> within(int width, long rounds) {
        if (rounds < width - 1) {
            return Optional.of(Prediction.ratio(BigInteger.ZERO, BigInteger.ONE));
        }
        int m = Math.toIntExact(rounds);
        if (width > WIDEST_EXACT) {
            return Optional.of(Prediction.decimal(spanning(width - 1, m)));
        }
        BigInteger all = BigInteger.ONE.shiftLeft(m);
        BigInteger top = BigInteger.ONE;
        for (int i = 0; i < width - 1; i++) {
            top = top.multiply(all.subtract(BigInteger.ONE.shiftLeft(i)));
        }
        return Optional.of(Prediction.ratio(top, BigInteger.ONE.shiftLeft(Math.multiplyExact(m, width - 1))));
    }

    /** ∏_{i&lt;r} (1 − 2^(i−m)): factors that differ from 1 by less than 2^−200 change nothing. */
    private static BigDecimal spanning(int rank, int m) {
        BigDecimal product = BigDecimal.ONE;
        for (int i = Math.max(0, m - NEGLIGIBLE); i < rank; i++) {
            BigInteger all = BigInteger.ONE.shiftLeft(m - i);
            product = product.multiply(Decimals.quotient(all.subtract(BigInteger.ONE), all), Decimals.CONTEXT);
        }
        return product;
    }

    @Override
    public String formula() {
        return "sum_{i=1}^{n-1} 1 / (1 - 2^-i)";
    }

    @Override
    public String source() {
        return "Simon, SIAM J. Comput. 26 (1997) for the words; the waits are geometric, derived";
    }
}
