package org.notchwork.law;

import java.math.BigInteger;

/**
 * What no classical strategy can beat, adaptive or random, when the labels are uniformly random.
 *
 * <p>Until a collision is seen the labels say nothing: the period stays uniform over the words that are not yet the
 * sum of two queried points. After m queries at most C(m, 2) of the 2^n − 1 words are such sums, so P(Q ≤ m) ≤
 * C(m, 2) / (2^n − 1), the query that shows the collision counted. Summing P(Q &gt; m) bounds the mean from below.
 */
public final class ClassicalLowerBound {

    /**
     * Returns L(n) = Σ_m max(0, 1 − C(m, 2)/(2^n − 1)) = (r + 1) − C(r + 1, 3)/(2^n − 1), below which no mean number
     * of queries can lie; r is the largest number with C(r, 2) ≤ 2^n − 1. About 0.943 · 2^(n/2).
     *
     * @param width n, 2 to 63
     */
    public Prediction mean(int width) {
        BigInteger periods = periods(width);
        BigInteger r = BigInteger.valueOf(largestWithin(width));
        BigInteger next = r.add(BigInteger.ONE);
        BigInteger triples =
                next.multiply(r).multiply(r.subtract(BigInteger.ONE)).divide(BigInteger.valueOf(6));
        return Prediction.ratio(next.multiply(periods).subtract(triples), periods);
    }

    /**
     * Returns the least m with C(m, 2) ≥ 2^n − 1: no classical strategy is sure to be done in fewer queries.
     *
     * @param width n, 2 to 63
     */
    public long worst(int width) {
        long r = largestWithin(width);
        return pairs(r).equals(periods(width)) ? r : r + 1;
    }

    /**
     * Returns the bound min(1, C(m, 2)/(2^n − 1)) on the probability of a collision within m queries.
     *
     * @param width n, 2 to 63
     * @param queries m, at least 0
     */
    public Prediction within(int width, long queries) {
        return Prediction.ratio(pairs(queries).min(periods(width)), periods(width));
    }

    /** Returns the formula of the mean's bound, in one line of plain text. */
    public String formula() {
        return "(r + 1) - C(r + 1, 3) / (2^n - 1), r the largest with C(r, 2) <= 2^n - 1";
    }

    /** Returns where the bound comes from. */
    public String source() {
        return "derived: with random labels the period is uniform over the words not yet a sum of two queried points";
    }

    /** The largest r with r(r − 1)/2 ≤ 2^n − 1: ⌊(1 + √(8 (2^n − 1) + 1)) / 2⌋. */
    private static long largestWithin(int width) {
        BigInteger root = periods(width).shiftLeft(3).add(BigInteger.ONE).sqrt();
        return root.add(BigInteger.ONE).shiftRight(1).longValueExact();
    }

    private static BigInteger pairs(long m) {
        BigInteger count = BigInteger.valueOf(m);
        return count.multiply(count.subtract(BigInteger.ONE)).shiftRight(1);
    }

    private static BigInteger periods(int width) {
        if (width < 2 || width > 63) {
            throw new IllegalArgumentException("width " + width + " is not in 2 to 63");
        }
        return BigInteger.ONE.shiftLeft(width).subtract(BigInteger.ONE);
    }
}
