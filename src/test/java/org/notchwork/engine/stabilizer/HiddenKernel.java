package org.notchwork.engine.stabilizer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.notchwork.bits.WideBasis;
import org.notchwork.seed.RandomStream;

/**
 * A linear map f(x) = Mx of n bits with kernel {0, s}, and the circuit that asks it once in superposition: H on n
 * qubits, a CNOT from qubit j to qubit n + i wherever M has a 1 in row i and column j, H again.
 *
 * @param n the number of bits, at least 2
 * @param s the kernel's word that is not 0
 * @param rows n − 1 independent words, each orthogonal to s
 */
record HiddenKernel(int n, BigInteger s, List<BigInteger> rows) {

    static HiddenKernel random(int n, RandomStream stream) {
        BigInteger s = BigInteger.ZERO;
        while (s.signum() == 0) {
            for (int i = 0; i < n; i++) {
                s = stream.bits(1) == 1 ? s.flipBit(i) : s;
            }
        }
        WideBasis span = new WideBasis(n);
        span.add(s);
        List<BigInteger> rows = new ArrayList<>(span.complement());
        // Sums of rows with other rows keep them independent and, so many, make them dense.
        for (int i = 0; n > 2 && i < 8 * n; i++) {
            int[] pair = stream.distinct(2, n - 1);
            rows.set(pair[0], rows.get(pair[0]).xor(rows.get(pair[1])));
        }
        return new HiddenKernel(n, s, List.copyOf(rows));
    }

    /** Returns the state of both registers before any measurement. */
    Tableau run() {
        Tableau tableau = new Tableau(2 * n);
        IntStream.range(0, n).forEach(tableau::hadamard);
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < n; j++) {
                if (rows.get(i).testBit(j)) {
                    tableau.cnot(j, n + i);
                }
            }
        }
        IntStream.range(0, n).forEach(tableau::hadamard);
        return tableau;
    }
}
