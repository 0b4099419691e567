package org.notchwork.law;

import java.math.BigInteger;

/**
 * The rank of m words, each uniform on a space of d bits: the number of m × d matrices of rank r over GF(2) is
 * [m choose r]₂ ∏_{i&lt;r} (2^d − 2^i).
 *
 * @see "R. Lidl, H. Niederreiter, Finite Fields, exercises to chapter 6, from memory; derived"
 */
final class RankLaw {

    private RankLaw() {}

    /** Returns the probability that m words of d bits have a rank of at least d − 1. */
    static Fraction atLeastOneShort(long m, int d) {
        if (m < d - 1) {
            return Fraction.ZERO;
        }
        int rows = Math.toIntExact(m);
        BigInteger matrices = count(rows, d, d - 1).add(rows < d ? BigInteger.ZERO : count(rows, d, d));
        return new Fraction(matrices, BigInteger.ONE.shiftLeft(Math.multiplyExact(rows, d)));
    }

    private static BigInteger count(int m, int d, int rank) {
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        for (int i = 0; i < rank; i++) {
            BigInteger step = BigInteger.ONE.shiftLeft(i);
            top = top.multiply(BigInteger.ONE.shiftLeft(m).subtract(step))
                    .multiply(BigInteger.ONE.shiftLeft(d).subtract(step));
            bottom = bottom.multiply(BigInteger.ONE.shiftLeft(rank).subtract(step));
        }
        return top.divide(bottom);
    }
}
