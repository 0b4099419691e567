package org.notchwork.support;

import org.notchwork.problem.BitFunction;

/**
 * A function given by its values.
 *
 * @param width the number of input bits
 * @param valueWidth the number of bits of a value
 * @param values the values at 0, 1, …
 */
@SuppressWarnings("ArrayRecordComponent")
public record Given(int width, int valueWidth, long[] values) implements BitFunction {

    /** Returns the function with these values. */
    public static Given of(int width, int valueWidth, long... values) {
        return new Given(width, valueWidth, values);
    }

    @Override
    public long at(long x) {
        return values[(int) x];
    }
}
