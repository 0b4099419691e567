package org.notchwork.engine.statevector;

import java.util.function.LongUnaryOperator;

/**
 * A state of both registers with amplitudes that are whole complex numbers, for circuits with phase gates. As
 * {@link StateVector} it pulls the factor 1/√2 of each Hadamard gate out; powers of two that all amplitudes share are
 * taken out by {@link #reduce}, so that weights are right up to one common factor.
 */
final class ComplexState {

    private final int inputs;
    private final int values;
    private final long[] real;
    private final long[] imaginary;

    /** Starts in |0…0⟩|0…0⟩. */
    ComplexState(int inputs, int values) {
        this.inputs = inputs;
        this.values = values;
        this.real = new long[1 << (inputs + values)];
        this.imaginary = new long[real.length];
        this.real[0] = 1;
    }

    /** Applies a Hadamard gate, without its factor, to one qubit of the input register. */
    void hadamard(int qubit) {
        int half = 1 << (values + qubit);
        butterflies(real, half);
        butterflies(imaginary, half);
    }

    private static void butterflies(long[] a, int half) {
        for (int block = 0; block < a.length; block += 2 * half) {
            for (int i = block; i < block + half; i++) {
                long zero = a[i];
                long one = a[i + half];
                a[i] = zero + one;
                a[i + half] = zero - one;
            }
        }
    }

    /** Applies U_f, which is its own inverse: the basis state |x⟩|z⟩ becomes |x⟩|z ⊕ f(x)⟩. */
    void oracle(LongUnaryOperator f) {
        int size = 1 << values;
        for (int x = 0; x < 1 << inputs; x++) {
            int image = (int) f.applyAsLong(x);
            permute(real, x << values, image, size);
            permute(imaginary, x << values, image, size);
        }
    }

    private static void permute(long[] a, int base, int image, int size) {
        for (int z = 0; z < size; z++) {
            if (z < (z ^ image)) {
                long kept = a[base + z];
                a[base + z] = a[base + (z ^ image)];
                a[base + (z ^ image)] = kept;
            }
        }
    }

    /** Multiplies every basis state whose input word has an odd inner product with w by i. */
    void phaseIfOdd(long w) {
        int size = 1 << values;
        for (int x = 0; x < 1 << inputs; x++) {
            if ((Long.bitCount(x & w) & 1) != 0) {
                for (int i = x * size; i < (x + 1) * size; i++) {
                    phase(i);
                }
            }
        }
    }

    /** Multiplies the basis state in which all qubits of both registers are 0 by i. */
    void phaseAtZero() {
        phase(0);
    }

    private void phase(int index) {
        long kept = real[index];
        real[index] = -imaginary[index];
        imaginary[index] = kept;
    }

    /** Divides all amplitudes by the largest power of two that divides them all. */
    void reduce() {
        long bits = 0;
        for (int i = 0; i < real.length; i++) {
            bits |= real[i] | imaginary[i];
        }
        int shift = Long.numberOfTrailingZeros(bits);
        for (int i = 0; i < real.length; i++) {
            real[i] >>= shift;
            imaginary[i] >>= shift;
        }
    }

    /** Returns the weight of each outcome of measuring the input register, up to one common factor. */
    long[] inputWeights() {
        long[] weights = new long[1 << inputs];
        for (int y = 0; y < weights.length; y++) {
            int base = y << values;
            long sum = 0;
            for (int z = 0; z < 1 << values; z++) {
                long a = real[base + z];
                long b = imaginary[base + z];
                sum = Math.addExact(sum, Math.addExact(Math.multiplyExact(a, a), Math.multiplyExact(b, b)));
            }
            weights[y] = sum;
        }
        return weights;
    }
}
