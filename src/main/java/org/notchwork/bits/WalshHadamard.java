package org.notchwork.bits;

/**
 * The Walsh-Hadamard transform A(y) = Σ_x a(x) (−1)^(x·y), in exact integers, in place and without a factor.
 *
 * <p>Applied twice it multiplies by the length. Source: any account of fast orthogonal transforms; the butterfly
 * order here is the plain one.
 */
public final class WalshHadamard {

    private WalshHadamard() {}

    /**
     * Transforms in place.
     *
     * @param a 2^n numbers; the sum of their magnitudes must stay below 2^63
     */
    public static void transform(long[] a) {
        requirePowerOfTwo(a.length);
        for (int half = 1; half < a.length; half *= 2) {
            for (int block = 0; block < a.length; block += 2 * half) {
                for (int i = block; i < block + half; i++) {
                    long u = a[i];
                    long v = a[i + half];
                    a[i] = u + v;
                    a[i + half] = u - v;
                }
            }
        }
    }

    private static void requirePowerOfTwo(int length) {
        if (length < 1 || (length & (length - 1)) != 0) {
            throw new IllegalArgumentException("length " + length + " is not a power of two");
        }
    }
}
