package org.notchwork.problem.period;

import java.util.function.LongUnaryOperator;
import org.notchwork.problem.BitFunction;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/**
 * A permutation of the words of n bits. Immutable.
 *
 * @param width n
 * @param permutation the permutation
 */
record InjectiveFunction(int width, LongUnaryOperator permutation) implements BitFunction {

    /** Draws a uniformly random permutation as a table. */
    static InjectiveFunction table(int width, RandomStream stream) {
        int[] table = stream.distinct(1 << width, 1 << width);
        return new InjectiveFunction(width, x -> table[(int) x]);
    }

    /** Wraps a keyed permutation. */
    static InjectiveFunction of(KeyedPermutation permutation, int width) {
        return new InjectiveFunction(width, permutation::apply);
    }

    @Override
    public int valueWidth() {
        return width;
    }

    @Override
    public long at(long x) {
        return permutation.applyAsLong(x);
    }
}
