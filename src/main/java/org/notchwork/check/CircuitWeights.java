package org.notchwork.check;

import org.notchwork.engine.Outcomes;
import org.notchwork.problem.BitFunction;

/**
 * Outcome distributions straight from their definitions, by double sums without any transform; widths of at most 12.
 *
 * <p>Fourier sampling: P(y) = 2^(−2n) Σ_d N(d) (−1)^(d·y), N(d) being the number of x with f(x) = f(x ⊕ d). The phase
 * circuit: P(y) = 2^(−2n) (Σ_x (−1)^(f(x) ⊕ x·y))².
 */
final class CircuitWeights {

    private CircuitWeights() {}

    static Outcomes fourier(BitFunction function) {
        long[] values = values(function);
        long[] equal = new long[values.length];
        for (int d = 0; d < values.length; d++) {
            for (int x = 0; x < values.length; x++) {
                equal[d] += values[x] == values[x ^ d] ? 1 : 0;
            }
        }
        return new Outcomes(signed(equal));
    }

    static Outcomes phase(BitFunction function) {
        long[] values = values(function);
        long[] signs = new long[values.length];
        for (int x = 0; x < signs.length; x++) {
            signs[x] = 1 - 2 * values[x];
        }
        long[] amplitudes = signed(signs);
        for (int y = 0; y < amplitudes.length; y++) {
            amplitudes[y] *= amplitudes[y];
        }
        return new Outcomes(amplitudes);
    }

    private static long[] values(BitFunction function) {
        long[] values = new long[1 << function.width()];
        for (int x = 0; x < values.length; x++) {
            values[x] = function.at(x);
        }
        return values;
    }

    /** Returns Σ_d a(d) (−1)^(d·y) for every y. */
    private static long[] signed(long[] a) {
        long[] sums = new long[a.length];
        for (int y = 0; y < a.length; y++) {
            for (int d = 0; d < a.length; d++) {
                sums[y] += a[d] * (1 - 2 * (Integer.bitCount(d & y) & 1));
            }
        }
        return sums;
    }
}
