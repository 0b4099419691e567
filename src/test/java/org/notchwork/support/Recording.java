package org.notchwork.support;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.problem.BitFunction;

/**
 * The identity, which has no period, writing down the points at which it is evaluated.
 *
 * @param width the number of input and value bits
 * @param points the points, in order
 */
public record Recording(int width, List<Long> points) implements BitFunction {

    /** Starts with no points. */
    public Recording(int width) {
        this(width, new ArrayList<>());
    }

    @Override
    public int valueWidth() {
        return width;
    }

    @Override
    public long at(long x) {
        points.add(x);
        return x;
    }
}
