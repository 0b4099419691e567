package org.notchwork.law;

import java.math.BigInteger;

/**
 * Constant or balanced, told from distinct random points: "constant" exactly if all values are equal. Both cases have
 * probability 1/2. The answer is never wrong on a constant function.
 *
 * @param points m, the number of points, 1 to 2^13
 */
public record BalancedSampleSuccess(long points) implements SuccessLaw {

    public BalancedSampleSuccess {
        if (points < 1 || points > Fraction.MOST_FACTORS) {
            throw new IllegalArgumentException("points " + points + " not in 1 to " + Fraction.MOST_FACTORS);
        }
    }

    @Override
    public Prediction success(int width) {
        return error(width).half().complement().prediction();
    }

    /** Returns the probability of a wrong answer on a balanced function, 2 C(M, m)/C(2M, m), M = 2^(n−1). */
    public Prediction errorOnBalanced(int width) {
        return error(width).prediction();
    }

    @Override
    public String formula() {
        return "1 - C(M, m) / C(2M, m), M = 2^(n-1), m = " + points;
    }

    @Override
    public String source() {
        return "Deutsch and Jozsa, Proc. R. Soc. A 439 (1992), for the problem; error derived";
    }

    private Fraction error(int width) {
        BigInteger half = BigInteger.ONE.shiftLeft(width - 1);
        if (BigInteger.valueOf(points).compareTo(half) > 0) {
            return Fraction.ZERO;
        }
        return Fraction.falling(half, 1, half.shiftLeft(1), points).times(2);
    }
}
