package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import org.notchwork.exact.Decimals;

/**
 * How probable it is at most that Fourier rounds miss a period where other words are periods of some points too. N(t)
 * is the number of x with f(x) = f(x ⊕ t).
 */
public final class SamplingBound {

    /**
     * Returns the bound (2 ((1 + p₀)/2)^c)^n on the failure of c · n rounds; it may be above 1 and then says nothing.
     * M. Kaplan, G. Leurent, A. Leverrier, M. Naya-Plasencia, CRYPTO 2016, Theorem 1.
     *
     * @param width n, at least 1
     * @param nearPeriod p₀, at least N(t)/2^n for every t but 0 and the period, 0 to below 1
     * @param factor c, at least 1
     */
    public Prediction published(int width, BigDecimal nearPeriod, int factor) {
        BigDecimal kept = BigDecimal.ONE.add(nearPeriod).divide(BigDecimal.valueOf(2), Decimals.CONTEXT);
        BigDecimal each = kept.pow(factor, Decimals.CONTEXT).multiply(BigDecimal.valueOf(2), Decimals.CONTEXT);
        return Prediction.decimal(each.pow(width, Decimals.CONTEXT));
    }

    /**
     * Returns the sharper bound ½ Σ ((1 + N(t)/2^n)/2)^m on the failure of m rounds, t neither 0 nor the period:
     * derived, a union bound over pairs t, t ⊕ s.
     *
     * @param counts N(t) for all t in order, 2^n of them
     * @param period s, not 0
     * @param rounds m, at least 0
     */
    public Prediction sharper(List<Integer> counts, int period, int rounds) {
        BigInteger size = BigInteger.valueOf(counts.size());
        BigInteger sum = BigInteger.ZERO;
        for (int t = 1; t < counts.size(); t++) {
            if (t != period) {
                sum = sum.add(size.add(BigInteger.valueOf(counts.get(t))).pow(rounds));
            }
        }
        return Prediction.ratio(sum, size.shiftLeft(1).pow(rounds).shiftLeft(1));
    }
}
