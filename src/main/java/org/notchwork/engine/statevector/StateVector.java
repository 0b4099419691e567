package org.notchwork.engine.statevector;

import java.util.function.LongUnaryOperator;

/**
 * The state of an input register of n qubits and a value register of m qubits, as 2^(n+m) amplitudes.
 *
 * <p>The factor 1/√2 of each Hadamard gate is pulled out of the amplitudes: what is kept are whole numbers, and the
 * true amplitudes are these times 2^(−gates/2). A Fourier-sampling circuit has 2n gates, so no number
 * exceeds 2^n and every probability is a whole number over 2^(2n), exactly. Index of |x⟩|z⟩: x · 2^m + z.
 */
final class StateVector {

    private final int inputs;
    private final int values;
    private final int[] amplitudes;

    /** Starts in |0…0⟩|0…0⟩. */
    StateVector(int inputs, int values) {
        this.inputs = inputs;
        this.values = values;
        this.amplitudes = new int[1 << (inputs + values)];
        this.amplitudes[0] = 1;
    }

    /** Starts in |0…0⟩ beside |0⟩ − |1⟩ instead: an X and a Hadamard gate on the one value qubit. */
    void startInValueOne() {
        if (values != 1) {
            throw new IllegalStateException(values + " value qubits");
        }
        amplitudes[0] = 1;
        amplitudes[1] = -1;
    }

    /** Applies a Hadamard gate, without its factor, to one qubit of the input register. */
    void hadamard(int qubit) {
        int half = 1 << (values + qubit);
        for (int block = 0; block < amplitudes.length; block += 2 * half) {
            for (int i = block; i < block + half; i++) {
                int zero = amplitudes[i];
                int one = amplitudes[i + half];
                amplitudes[i] = zero + one;
                amplitudes[i + half] = zero - one;
            }
        }
    }

    /** Applies U_f: the basis state |x⟩|z⟩ becomes |x⟩|z ⊕ f(x)⟩. */
    void oracle(LongUnaryOperator f) {
        int size = 1 << values;
        int[] column = new int[size];
        for (int x = 0; x < 1 << inputs; x++) {
            int image = (int) f.applyAsLong(x);
            int base = x << values;
            System.arraycopy(amplitudes, base, column, 0, size);
            for (int z = 0; z < size; z++) {
                amplitudes[base + (z ^ image)] = column[z];
            }
        }
    }

    /**
     * Returns the weight of each outcome of measuring the input register: the sum of the squared amplitudes over the
     * value register; to be divided by 2^gates.
     */
    long[] inputWeights() {
        long[] weights = new long[1 << inputs];
        for (int y = 0; y < weights.length; y++) {
            int base = y << values;
            long sum = 0;
            for (int z = 0; z < 1 << values; z++) {
                long amplitude = amplitudes[base + z];
                sum += amplitude * amplitude;
            }
            weights[y] = sum;
        }
        return weights;
    }
}
