package org.notchwork.problem;

/** A function from words of {@link #width} bits to words of {@link #valueWidth} bits, without a counter. */
public interface BitFunction {

    /** Returns the number of input bits, 1 to 63. */
    int width();

    /** Returns the number of bits of a value, 1 to 63. */
    int valueWidth();

    /**
     * Returns the value at a point.
     *
     * @param x 0 ≤ x &lt; 2^width
     */
    long at(long x);
}
