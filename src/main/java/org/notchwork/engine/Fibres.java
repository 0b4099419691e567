package org.notchwork.engine;

import java.util.Arrays;
import org.notchwork.problem.Unitary;

/**
 * All points of the domain, grouped by value: found by evaluating the function everywhere, without any promise.
 *
 * <p>Each entry holds a value in its high half and a point in its low half, sorted, so that a fibre is a run of
 * entries. Points of at most 26 bits, values of at most 31.
 */
public final class Fibres {

    private final long[] entries;

    /** Evaluates the function of a unitary everywhere; nothing is counted. */
    public Fibres(Unitary unitary) {
        entries = new long[1 << unitary.width()];
        for (int x = 0; x < entries.length; x++) {
            entries[x] = unitary.image(x) << 32 | x;
        }
        Arrays.sort(entries);
    }

    /** Returns the points with this value, ascending. */
    public int[] of(long value) {
        int start = from(value);
        int end = start;
        while (end < entries.length && entries[end] >>> 32 == value) {
            end++;
        }
        return points(start, end);
    }

    /** Returns the points from one fibre's first entry on, given where it starts. */
    public int[] startingAt(int start) {
        int end = start;
        while (end < entries.length && entries[end] >>> 32 == entries[start] >>> 32) {
            end++;
        }
        return points(start, end);
    }

    /** Returns the number of points of the domain. */
    public int size() {
        return entries.length;
    }

    private int from(long value) {
        int found = Arrays.binarySearch(entries, value << 32);
        return found >= 0 ? found : -found - 1;
    }

    private int[] points(int start, int end) {
        int[] points = new int[end - start];
        for (int i = 0; i < points.length; i++) {
            points[i] = (int) entries[start + i];
        }
        return points;
    }
}
