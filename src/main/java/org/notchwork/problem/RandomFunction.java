package org.notchwork.problem;

import org.notchwork.seed.RandomStream;

/** A table of values without any promise. Immutable. */
public final class RandomFunction implements BitFunction {

    /** The largest width that can be drawn. */
    public static final int GREATEST_WIDTH = 16;

    private final int width;
    private final int valueWidth;
    private final int[] table;

    private RandomFunction(int width, int valueWidth, int[] table) {
        this.width = width;
        this.valueWidth = valueWidth;
        this.table = table;
    }

    /**
     * Draws every value on its own: {@code bits(valueWidth)} for x = 0, 1, …
     *
     * @param width the number of input bits, 1 to {@link #GREATEST_WIDTH}
     * @param valueWidth the number of bits of a value, 1 to 31
     * @param stream where the values come from
     */
    public static RandomFunction draw(int width, int valueWidth, RandomStream stream) {
        if (width < 1 || width > GREATEST_WIDTH) {
            throw new IllegalArgumentException("width " + width + " is not in 1 to " + GREATEST_WIDTH);
        }
        int[] table = new int[1 << width];
        for (int x = 0; x < table.length; x++) {
            table[x] = (int) stream.bits(valueWidth);
        }
        return new RandomFunction(width, valueWidth, table);
    }

    /**
     * Draws a function from n bits to n bits that has no period; draws again while it has one.
     *
     * @param width n, 1 to {@link #GREATEST_WIDTH}
     * @param stream where the values come from
     */
    public static RandomFunction withoutPeriod(int width, RandomStream stream) {
        while (true) {
            RandomFunction drawn = draw(width, width, stream);
            if (!drawn.hasPeriod()) {
                return drawn;
            }
        }
    }

    private boolean hasPeriod() {
        for (int t = 1; t < table.length; t++) {
            int x = 0;
            while (x < table.length && table[x] == table[x ^ t]) {
                x++;
            }
            if (x == table.length) {
                return true;
            }
        }
        return false;
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
        return table[(int) x];
    }
}
