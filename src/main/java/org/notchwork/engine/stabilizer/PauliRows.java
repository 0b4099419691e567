package org.notchwork.engine.stabilizer;

import java.util.Arrays;

/**
 * n Pauli words on n qubits without their phases: word i is X^x Z^z, all X before all Z.
 *
 * <p>The bits lie by qubit: bit i of {@code x[q]} says whether word i has an X at qubit q. So a gate, which treats all
 * words alike, works on 64 of them at a time.
 */
final class PauliRows {

    final long[][] x;
    final long[][] z;

    /** Creates n words equal to 1. */
    PauliRows(int qubits) {
        int length = (qubits + Long.SIZE - 1) / Long.SIZE;
        this.x = new long[qubits][length];
        this.z = new long[qubits][length];
    }

    private PauliRows(long[][] x, long[][] z) {
        this.x = x;
        this.z = z;
    }

    PauliRows copy() {
        return new PauliRows(copy(x), copy(z));
    }

    /** Conjugates by H: X and Z of the qubit change places. */
    void exchange(int qubit) {
        long[] kept = x[qubit];
        x[qubit] = z[qubit];
        z[qubit] = kept;
    }

    /** Conjugates by CNOT: an X of the control spreads to the target, a Z of the target to the control. */
    void spread(int control, int target) {
        add(x[control], x[target]);
        add(z[target], z[control]);
    }

    /** Conjugates by S: an X of the qubit gets a Z. */
    void shear(int qubit) {
        add(x[qubit], z[qubit]);
    }

    /** Adds one vector to another over GF(2). */
    static void add(long[] summand, long[] sum) {
        for (int i = 0; i < sum.length; i++) {
            sum[i] ^= summand[i];
        }
    }

    static boolean bit(long[] vector, int index) {
        return (vector[index >> 6] >>> index & 1) != 0;
    }

    static void set(long[] vector, int index) {
        vector[index >> 6] |= 1L << index;
    }

    static void clear(long[] vector, int index) {
        vector[index >> 6] &= ~(1L << index);
    }

    /** Returns the lowest index whose bit is set, −1 if there is none. */
    static int first(long[] vector) {
        for (int i = 0; i < vector.length; i++) {
            if (vector[i] != 0) {
                return i * Long.SIZE + Long.numberOfTrailingZeros(vector[i]);
            }
        }
        return -1;
    }

    private static long[][] copy(long[][] columns) {
        return Arrays.stream(columns).map(long[]::clone).toArray(long[][]::new);
    }
}
