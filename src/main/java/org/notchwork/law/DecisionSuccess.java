package org.notchwork.law;

import java.math.BigInteger;

/**
 * Whether there is a period at all, told from m Fourier rounds: "no period" exactly if the words have rank n. Both
 * cases have probability 1/2. The answer is never wrong where there is a period.
 *
 * @param rounds m, at least 0
 */
public record DecisionSuccess(long rounds) implements SuccessLaw {

    public DecisionSuccess {
        if (rounds < 0) {
            throw new IllegalArgumentException("rounds " + rounds + " below 0");
        }
    }

    @Override
    public Prediction success(int width) {
        return full(width).plus(Fraction.ONE).half().prediction();
    }

    /** Returns the probability of a wrong answer where there is no period, 1 − ∏_{i&lt;n} (1 − 2^(i−m)). */
    public Prediction errorWithoutPeriod(int width) {
        return full(width).complement().prediction();
    }

    /**
     * Returns the least error that any rule on the rank can have, Σ_r min(P₀(r), P₁(r))/2, P₀ and P₁ the laws of the
     * rank of m words uniform on dimension n and n − 1.
     */
    public Prediction bestError(int width) {
        int m = Math.toIntExact(rounds);
        BigInteger sum = BigInteger.ZERO;
        for (int r = 0; r <= Math.min(m, width); r++) {
            sum = sum.add(matrices(m, width, r).min(matrices(m, width - 1, r).shiftLeft(m)));
        }
        return Prediction.ratio(sum, BigInteger.ONE.shiftLeft(m * width + 1));
    }

    @Override
    public String formula() {
        return "(1 + prod_{i<n} (1 - 2^(i - m))) / 2, m = " + rounds;
    }

    @Override
    public String source() {
        return "Simon, SIAM J. Comput. 26 (1997) for the words; errors derived";
    }

    private Fraction full(int width) {
        int m = Math.toIntExact(rounds);
        return new Fraction(matrices(m, width, width), BigInteger.ONE.shiftLeft(m * width));
    }

    /** The number of m × n matrices of rank r over GF(2), ∏_{i&lt;r} (2^m − 2^i)(2^n − 2^i)/(2^r − 2^i). */
    private static BigInteger matrices(int m, int n, int r) {
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        for (int i = 0; i < r; i++) {
            BigInteger taken = BigInteger.ONE.shiftLeft(i);
            top = top.multiply(BigInteger.ONE.shiftLeft(m).subtract(taken))
                    .multiply(BigInteger.ONE.shiftLeft(n).subtract(taken));
            bottom = bottom.multiply(BigInteger.ONE.shiftLeft(r).subtract(taken));
        }
        return r > m || r > n ? BigInteger.ZERO : top.divide(bottom);
    }
}
