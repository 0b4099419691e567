package org.notchwork.support;

import org.notchwork.problem.BitFunction;

/** A function given by its values. */
public final class Given implements BitFunction {

    private final int width;
    private final int valueWidth;
    private final long[] values;

    private Given(int width, int valueWidth, long[] values) {
        this.width = width;
        this.valueWidth = valueWidth;
        this.values = values;
    }

    /** Returns the function with these values at 0, 1, … */
    public static Given of(int width, int valueWidth, long... values) {
        return new Given(width, valueWidth, values.clone());
    }

    /** Returns the function with the value at one point replaced. */
    public static Given changed(BitFunction function, long point, long value) {
        long[] values = new long[1 << function.width()];
        for (int x = 0; x < values.length; x++) {
            values[x] = x == point ? value : function.at(x);
        }
        return new Given(function.width(), function.valueWidth(), values);
    }

    @Override
    public int width() {
        return width;
    }

    @Override
    public int valueWidth() {
        return valueWidth;
    }

    @Override
    public long at(long x) {
        return values[(int) x];
    }
}
