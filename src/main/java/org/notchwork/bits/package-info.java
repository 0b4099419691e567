/**
 * Words of bits, linear algebra over GF(2) and the Walsh-Hadamard transform: mathematics only.
 *
 * <p>A word of at most 63 bits is a {@code long} in the kernels, bit i of the word being bit i of the number; what
 * is written down or handed over is a {@link org.notchwork.bits.Word}. Nothing here knows of problems, seeds or
 * files, and nothing here is random.
 */
package org.notchwork.bits;
