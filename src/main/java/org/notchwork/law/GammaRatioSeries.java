package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.notchwork.exact.Decimals;

/**
 * Γ(M+1) / Γ(M+½) = √M (1 + c₁/M + c₂/M² + …): the coefficients c_k, each a whole number over a power of two.
 *
 * <p>They follow from g(M) g(M − ½) = M, which the ratio g satisfies, matched power by power in exact rationals. From
 * M = 2^12 on the terms left out are below 10^−45. F. G. Tricomi and A. Erdélyi, The asymptotic expansion of a ratio
 * of gamma functions, Pacific J. Math. 1 (1951), give the general form.
 */
final class GammaRatioSeries {

    private static final long[] TOPS = {
        1,
        1,
        1,
        -5,
        -21,
        399,
        869,
        -39325,
        -334477,
        28717403,
        59697183,
        -8400372435L,
        -34429291905L,
        7199255611995L,
        14631594576045L
    };

    private static final int[] SHIFTS = {0, 3, 7, 10, 15, 18, 22, 25, 31, 34, 38, 41, 46, 49, 53};

    private GammaRatioSeries() {}

    /** Returns c₀ = 1, c₁, c₂, … as decimals of 50 digits. */
    static List<BigDecimal> coefficients() {
        List<BigDecimal> coefficients = new ArrayList<>();
        for (int k = 0; k < TOPS.length; k++) {
            coefficients.add(Decimals.quotient(BigInteger.valueOf(TOPS[k]), BigInteger.ONE.shiftLeft(SHIFTS[k])));
        }
        return coefficients;
    }
}
