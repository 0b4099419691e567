package org.notchwork.problem.mask;

import java.util.Arrays;
import org.notchwork.problem.Network;
import org.notchwork.problem.NetworkFunction;

/**
 * x ↦ a·x ⊕ b. Immutable.
 *
 * @param width the number of input bits
 * @param a the word
 * @param b the constant bit
 */
record InnerProductFunction(int width, long a, long b) implements NetworkFunction {

    @Override
    public int valueWidth() {
        return 1;
    }

    @Override
    public long at(long x) {
        return (Long.bitCount(a & x) & 1) ^ b;
    }

    /** One CNOT a set bit of a, ascending, then an X gate if b is set; all on the value qubit. */
    @Override
    public Network network() {
        int gates = Long.bitCount(a) + (int) b;
        int[] controls = new int[gates];
        int[] targets = new int[gates];
        int gate = 0;
        for (int i = 0; i < width; i++) {
            if ((a >>> i & 1) != 0) {
                controls[gate++] = i;
            }
        }
        if (b != 0) {
            controls[gate] = Network.NO_CONTROL;
        }
        Arrays.fill(targets, width);
        return new Network(width, 1, controls, targets);
    }
}
