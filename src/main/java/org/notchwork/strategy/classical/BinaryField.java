package org.notchwork.strategy.classical;

/**
 * Multiplication in GF(2^k), k from 1 to 31, words being polynomials.
 *
 * <p>The modulus for k = 1 to 6, 8, 10, 12, 16 is the one that published orders of points use; elsewhere it is the
 * irreducible polynomial that is least as a number. The choice is a rule of the format.
 */
final class BinaryField {

    private static final long[] MODULI = {
        0x3,
        0x7,
        0xb,
        0x13,
        0x25,
        0x43,
        0x83,
        0x11b,
        0x203,
        0x409,
        0x805,
        0x1053,
        0x201b,
        0x4021,
        0x8003,
        0x1100b,
        0x20009,
        0x40009,
        0x80027,
        0x100009,
        0x200005,
        0x400003,
        0x800021,
        0x100001b,
        0x2000009,
        0x400001b,
        0x8000027,
        0x10000003,
        0x20000005,
        0x40000003,
        0x80000009L
    };

    private final int degree;
    private final long modulus;

    BinaryField(int degree) {
        if (degree < 1 || degree > MODULI.length) {
            throw new IllegalArgumentException("degree " + degree + " is not in 1 to " + MODULI.length);
        }
        this.degree = degree;
        this.modulus = MODULI[degree - 1];
    }

    /** Returns the product of two elements. */
    long times(long a, long b) {
        long product = 0;
        long shifted = a;
        for (long rest = b; rest != 0; rest >>>= 1) {
            if ((rest & 1) != 0) {
                product ^= shifted;
            }
            shifted <<= 1;
            if ((shifted >>> degree & 1) != 0) {
                shifted ^= modulus;
            }
        }
        return product;
    }
}
