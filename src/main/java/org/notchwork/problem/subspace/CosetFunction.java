package org.notchwork.problem.subspace;

import java.util.function.LongUnaryOperator;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.problem.BitFunction;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/**
 * A function with one label a coset of a subspace. Immutable.
 *
 * @param width the number of bits
 * @param values the value at each point
 */
record CosetFunction(int width, LongUnaryOperator values) implements BitFunction {

    /** The largest width whose values are drawn as a table. */
    static final int TABLE_WIDTH = 16;

    /** Draws the labels. */
    static CosetFunction draw(EchelonBasis subspace, int width, RandomStream stream) {
        if (width > TABLE_WIDTH) {
            KeyedPermutation permutation = KeyedPermutation.draw(width, stream);
            return new CosetFunction(width, x -> permutation.apply(subspace.reduce(x)));
        }
        int size = 1 << width;
        int[] labels = stream.distinct(size >>> subspace.rank(), size);
        int[] table = new int[size];
        int next = 0;
        for (int x = 0; x < size; x++) {
            int representative = (int) subspace.reduce(x);
            if (representative == x) {
                table[x] = labels[next++];
            } else {
                table[x] = table[representative];
            }
        }
        return new CosetFunction(width, x -> table[(int) x]);
    }

    @Override
    public int valueWidth() {
        return width;
    }

    @Override
    public long at(long x) {
        return values.applyAsLong(x);
    }
}
