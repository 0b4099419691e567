package org.notchwork.engine.stabilizer;

/**
 * The naive twin at many qubits: the tableau as S. Aaronson and D. Gottesman print it (Phys. Rev. A 70, 052328 (2004),
 * section III), row by row, one bit an array element, Y a letter of its own.
 */
final class PlainTableau {

    private final int n;
    private final int[][] x;
    private final int[][] z;
    private final int[] r;

    PlainTableau(int n) {
        this.n = n;
        x = new int[2 * n + 1][n];
        z = new int[2 * n + 1][n];
        r = new int[2 * n + 1];
        for (int i = 0; i < n; i++) {
            x[i][i] = 1;
            z[n + i][i] = 1;
        }
    }

    void hadamard(int a) {
        for (int i = 0; i < 2 * n; i++) {
            r[i] ^= x[i][a] & z[i][a];
            int kept = x[i][a];
            x[i][a] = z[i][a];
            z[i][a] = kept;
        }
    }

    void phase(int a) {
        for (int i = 0; i < 2 * n; i++) {
            r[i] ^= x[i][a] & z[i][a];
            z[i][a] ^= x[i][a];
        }
    }

    void cnot(int a, int b) {
        for (int i = 0; i < 2 * n; i++) {
            r[i] ^= x[i][a] & z[i][b] & (x[i][b] ^ z[i][a] ^ 1);
            x[i][b] ^= x[i][a];
            z[i][a] ^= z[i][b];
        }
    }

    void z(int a) {
        phase(a);
        phase(a);
    }

    void x(int a) {
        hadamard(a);
        z(a);
        hadamard(a);
    }

    boolean isRandom(int a) {
        return pivot(a) >= 0;
    }

    /** Measures; the outcome, if random, is the one given. */
    int measure(int a, int ifRandom) {
        int p = pivot(a);
        if (p < 0) {
            x[2 * n] = new int[n];
            z[2 * n] = new int[n];
            r[2 * n] = 0;
            for (int i = 0; i < n; i++) {
                if (x[i][a] == 1) {
                    rowsum(2 * n, n + i);
                }
            }
            return r[2 * n];
        }
        for (int i = 0; i < 2 * n; i++) {
            if (i != p && i != p - n && x[i][a] == 1) {
                rowsum(i, p);
            }
        }
        x[p - n] = x[p];
        z[p - n] = z[p];
        r[p - n] = r[p];
        x[p] = new int[n];
        z[p] = new int[n];
        z[p][a] = 1;
        r[p] = ifRandom;
        return ifRandom;
    }

    private int pivot(int a) {
        for (int i = n; i < 2 * n; i++) {
            if (x[i][a] == 1) {
                return i;
            }
        }
        return -1;
    }

    private void rowsum(int h, int i) {
        int k = 2 * r[h] + 2 * r[i];
        for (int j = 0; j < n; j++) {
            k += g(x[i][j], z[i][j], x[h][j], z[h][j]);
            x[h][j] ^= x[i][j];
            z[h][j] ^= z[i][j];
        }
        r[h] = Math.floorMod(k, 4) / 2;
    }

    private static int g(int x1, int z1, int x2, int z2) {
        if (x1 == 0) {
            return z1 == 0 ? 0 : x2 * (1 - 2 * z2);
        }
        return z1 == 0 ? z2 * (2 * x2 - 1) : z2 - x2;
    }
}
