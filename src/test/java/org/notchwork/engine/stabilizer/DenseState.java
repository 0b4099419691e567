package org.notchwork.engine.stabilizer;

import java.util.List;

/**
 * The naive twin at few qubits: a vector of 2^n complex amplitudes, every gate a matrix. Bit q of an index is qubit q.
 */
final class DenseState {

    private static final double HALF = Math.sqrt(0.5);

    private final double[] re;
    private final double[] im;

    DenseState(int qubits) {
        re = new double[1 << qubits];
        im = new double[1 << qubits];
        re[0] = 1;
    }

    void hadamard(int q) {
        single(q, new double[] {HALF, HALF, HALF, -HALF}, new double[4]);
    }

    void x(int q) {
        single(q, new double[] {0, 1, 1, 0}, new double[4]);
    }

    void z(int q) {
        single(q, new double[] {1, 0, 0, -1}, new double[4]);
    }

    void phase(int q) {
        single(q, new double[] {1, 0, 0, 0}, new double[] {0, 0, 0, 1});
    }

    void cnot(int control, int target) {
        for (int i = 0; i < re.length; i++) {
            if ((i >> control & 1) == 1 && (i >> target & 1) == 0) {
                swap(re, i, i | 1 << target);
                swap(im, i, i | 1 << target);
            }
        }
    }

    /** Returns the probability that the listed qubits are found as the bits of the word, lowest first. */
    double probability(List<Integer> qubits, int word) {
        double sum = 0;
        for (int i = 0; i < re.length; i++) {
            boolean fits = true;
            for (int j = 0; j < qubits.size(); j++) {
                fits &= (i >> qubits.get(j) & 1) == (word >> j & 1);
            }
            sum += fits ? re[i] * re[i] + im[i] * im[i] : 0;
        }
        return sum;
    }

    /** Leaves the state after the qubit was found as the bit. */
    void collapse(int q, int bit) {
        double factor = 1 / Math.sqrt(probability(List.of(q), bit));
        for (int i = 0; i < re.length; i++) {
            double scale = (i >> q & 1) == bit ? factor : 0;
            re[i] *= scale;
            im[i] *= scale;
        }
    }

    /** Multiplies by a 2×2 matrix given by rows, real and imaginary parts. */
    private void single(int q, double[] a, double[] b) {
        for (int i = 0; i < re.length; i++) {
            if ((i >> q & 1) == 0) {
                int j = i | 1 << q;
                double re0 = a[0] * re[i] - b[0] * im[i] + a[1] * re[j] - b[1] * im[j];
                double im0 = a[0] * im[i] + b[0] * re[i] + a[1] * im[j] + b[1] * re[j];
                double re1 = a[2] * re[i] - b[2] * im[i] + a[3] * re[j] - b[3] * im[j];
                double im1 = a[2] * im[i] + b[2] * re[i] + a[3] * im[j] + b[3] * re[j];
                re[i] = re0;
                im[i] = im0;
                re[j] = re1;
                im[j] = im1;
            }
        }
    }

    private static void swap(double[] vector, int i, int j) {
        double kept = vector[i];
        vector[i] = vector[j];
        vector[j] = kept;
    }
}
