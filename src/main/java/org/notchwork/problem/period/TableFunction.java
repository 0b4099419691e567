package org.notchwork.problem.period;

import org.notchwork.problem.BitFunction;
import org.notchwork.seed.RandomStream;

/** A function with a period whose values are a uniformly random injective labelling of the cosets. Immutable. */
final class TableFunction implements BitFunction {

    private final int width;
    private final int[] table;

    /**
     * Draws the labels: 2^(width − 1) different words of {@code width} bits by {@link RandomStream#distinct}, given to
     * the cosets in increasing order of their representatives.
     */
    TableFunction(Cosets cosets, RandomStream stream) {
        this.width = cosets.width();
        int size = 1 << width;
        this.table = new int[size];
        int[] labels = stream.distinct(size / 2, size);
        int next = 0;
        for (int x = 0; x < size; x++) {
            if (cosets.representative(x) == x) {
                table[x] = labels[next];
                table[(int) (x ^ cosets.period())] = labels[next];
                next++;
            }
        }
    }

    @Override
    public int width() {
        return width;
    }

    @Override
    public int valueWidth() {
        return width;
    }

    @Override
    public long at(long x) {
        return table[(int) x];
    }
}
