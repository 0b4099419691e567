package org.notchwork.engine;

import org.notchwork.bits.WalshHadamard;
import org.notchwork.problem.Unitary;

/** The outcome weights of the phase circuit: (Σ_x (−1)^(f(x) ⊕ x·y))², to be divided by 2^(2n). */
public final class SignedTransform {

    private SignedTransform() {}

    /**
     * Evaluates the function everywhere and transforms its signs.
     *
     * @param unitary a function with values of one bit and at most 26 input bits
     */
    public static long[] weights(Unitary unitary) {
        if (unitary.valueWidth() != 1) {
            throw new IllegalArgumentException(
                    "the phase circuit wants values of one bit, not " + unitary.valueWidth());
        }
        long[] amplitudes = new long[1 << unitary.width()];
        for (int x = 0; x < amplitudes.length; x++) {
            amplitudes[x] = 1 - 2 * unitary.image(x);
        }
        WalshHadamard.transform(amplitudes);
        for (int y = 0; y < amplitudes.length; y++) {
            amplitudes[y] *= amplitudes[y];
        }
        return amplitudes;
    }
}
