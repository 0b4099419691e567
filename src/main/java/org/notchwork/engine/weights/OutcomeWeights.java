package org.notchwork.engine.weights;

import org.notchwork.bits.WalshHadamard;
import org.notchwork.engine.Fibres;
import org.notchwork.problem.Unitary;

/**
 * W(y) = Σ_d N(d) (−1)^(d·y): non-negative whole numbers with the sum 2^(2n).
 *
 * <p>A fibre of m points adds 1 to N at each of its m² ordered sums; where that is more than a transform costs, its
 * indicator is transformed and squared instead, which is the same on the other side of the transform.
 */
final class OutcomeWeights {

    private OutcomeWeights() {}

    static long[] of(Unitary unitary) {
        Fibres fibres = new Fibres(unitary);
        int size = fibres.size();
        long transform = (long) unitary.width() * size;
        long[] weights = new long[size];
        for (int start = 0; start < size; ) {
            int[] fibre = fibres.startingAt(start);
            if (isSmall(fibre.length, transform)) {
                for (int x : fibre) {
                    for (int y : fibre) {
                        weights[x ^ y]++;
                    }
                }
            }
            start += fibre.length;
        }
        WalshHadamard.transform(weights);
        for (int start = 0; start < size; ) {
            int[] fibre = fibres.startingAt(start);
            if (!isSmall(fibre.length, transform)) {
                addSquares(fibre, weights);
            }
            start += fibre.length;
        }
        return weights;
    }

    private static boolean isSmall(int points, long transform) {
        return (long) points * points <= transform;
    }

    private static void addSquares(int[] fibre, long[] weights) {
        long[] amplitudes = new long[weights.length];
        for (int x : fibre) {
            amplitudes[x] = 1;
        }
        WalshHadamard.transform(amplitudes);
        for (int y = 0; y < weights.length; y++) {
            weights[y] += amplitudes[y] * amplitudes[y];
        }
    }
}
