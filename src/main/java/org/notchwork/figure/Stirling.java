package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * What J. Stirling's formula leaves over: μ(m) = ln m! − (m + 1/2) ln m + m − ln √(2π), by the asymptotic series
 * Σ B_2j / (2j (2j − 1) m^(2j−1)) (M. Abramowitz and I. A. Stegun (1964), 6.1.40 and 6.1.42).
 *
 * <p>The series alternates and its error is less than the first term left out; with 24 terms and m ≥ 64 that is less
 * than B_50 / (50 · 49 · 64^49) < 10^−66.
 */
final class Stirling {

    /** The least m for which the series is right to 66 places. */
    static final long LEAST = 64;

    private static final int TERMS = 24;
    private static final MathContext WORK = new MathContext(80);
    private static final List<BigDecimal> COEFFICIENTS = coefficients();

    private Stirling() {}

    /** Returns μ(m) with an absolute error below 10^−66, for m at least 64. */
    static BigDecimal remainder(long m) {
        if (m < LEAST) {
            throw new IllegalArgumentException(m + " is too small for the series");
        }
        BigDecimal value = BigDecimal.valueOf(m);
        BigDecimal square = value.multiply(value);
        BigDecimal sum = BigDecimal.ZERO;
        for (int j = TERMS - 1; j >= 0; j--) {
            sum = sum.divide(square, WORK).add(COEFFICIENTS.get(j), WORK);
        }
        return sum.divide(value, WORK);
    }

    /**
     * B_2j / (2j (2j − 1)) = (−1)^(j−1) T_j / ((2j − 1) 4^j (4^j − 1)), where T_j are the tangent numbers 1, 2, 16,
     * 272, … by the recurrence of D. E. Knuth and T. J. Buckholtz, Math. Comp. 21 (1967).
     */
    private static List<BigDecimal> coefficients() {
        List<BigInteger> tangents = tangents();
        List<BigDecimal> all = new ArrayList<>();
        for (int j = 1; j <= TERMS; j++) {
            BigInteger power = BigInteger.ONE.shiftLeft(2 * j);
            BigInteger denominator =
                    power.multiply(power.subtract(BigInteger.ONE)).multiply(BigInteger.valueOf((2L * j) - 1));
            BigDecimal size = new BigDecimal(tangents.get(j - 1)).divide(new BigDecimal(denominator), WORK);
            all.add(j % 2 == 1 ? size : size.negate());
        }
        return List.copyOf(all);
    }

    private static List<BigInteger> tangents() {
        List<BigInteger> t = new ArrayList<>(Collections.nCopies(TERMS, BigInteger.ONE));
        for (int k = 1; k < TERMS; k++) {
            t.set(k, t.get(k - 1).multiply(BigInteger.valueOf(k)));
        }
        for (int k = 1; k < TERMS; k++) {
            for (int j = k; j < TERMS; j++) {
                BigInteger before = t.get(j - 1).multiply(BigInteger.valueOf((long) j - k));
                t.set(j, before.add(t.get(j).multiply(BigInteger.valueOf((long) j - k + 2))));
            }
        }
        return t;
    }
}
