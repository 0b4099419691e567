package org.notchwork.problem;

import org.notchwork.bits.Word;

/** A function from words of {@link #width} bits to words of {@link #valueWidth} bits, without a counter. */
public interface BitFunction {

    /** Returns the number of input bits, at least 1. */
    int width();

    /** Returns the number of bits of a value, at least 1. */
    int valueWidth();

    /**
     * Returns the value at a point.
     *
     * @param x 0 ≤ x &lt; 2^width, for widths of at most 63
     */
    long at(long x);

    /**
     * Returns the value at a point of any width; functions of more than 63 bits answer here alone.
     *
     * @param x a word of {@link #width} bits
     */
    default Word at(Word x) {
        return Word.of(valueWidth(), at(x.bits()));
    }
}
