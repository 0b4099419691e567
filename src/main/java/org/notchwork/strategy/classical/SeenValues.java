package org.notchwork.strategy.classical;

/**
 * The values seen so far, each with the point where it was seen: open addressing with linear probing, no boxing.
 *
 * <p>Slots hold a value plus 1, so that 0 marks a free one; values are below 2^63. The table doubles at three fifths.
 */
final class SeenValues {

    /** A point that stands for none. */
    static final long NONE = -1;

    private static final long GOLDEN = 0x9E3779B97F4A7C15L;

    private static final int LEAST = 16;

    private static final long SLOT_BYTES = 16;

    private long[] values = new long[LEAST];
    private long[] points = new long[LEAST];
    private int size;

    /**
     * Notes a value and where it was seen, unless the value was seen before.
     *
     * @return the point where the value was seen first, {@link #NONE} if it is new
     */
    long noteOrFind(long value, long point) {
        if (5L * (size + 1) > 3L * values.length) {
            grow();
        }
        int slot = slot(value, values);
        if (values[slot] != 0) {
            return points[slot];
        }
        values[slot] = value + 1;
        points[slot] = point;
        size++;
        return NONE;
    }

    /** Returns where a value was seen, {@link #NONE} if it was not. */
    long find(long value) {
        int slot = slot(value, values);
        return values[slot] == 0 ? NONE : points[slot];
    }

    /** Returns how many values were noted. */
    int size() {
        return size;
    }

    /** Returns how many words of memory the slots take. */
    long memoryWords() {
        return 2L * values.length;
    }

    /**
     * Returns how many bytes a table takes at most while it takes up this many values: its slots of 16 bytes, fewer
     * than 10/3 a value, and half as many of the table it grew from.
     */
    static long bytes(long entries) {
        return Math.addExact(SLOT_BYTES * LEAST, Math.multiplyExact(Math.min(entries, Long.MAX_VALUE / 256), 80L));
    }

    private static int slot(long value, long[] table) {
        int mask = table.length - 1;
        int slot = (int) ((value * GOLDEN) >>> 32) & mask;
        while (table[slot] != 0 && table[slot] != value + 1) {
            slot = (slot + 1) & mask;
        }
        return slot;
    }

    private void grow() {
        long[] oldValues = values;
        long[] oldPoints = points;
        values = new long[2 * oldValues.length];
        points = new long[values.length];
        for (int i = 0; i < oldValues.length; i++) {
            if (oldValues[i] != 0) {
                int slot = slot(oldValues[i] - 1, values);
                values[slot] = oldValues[i];
                points[slot] = oldPoints[i];
            }
        }
    }
}
