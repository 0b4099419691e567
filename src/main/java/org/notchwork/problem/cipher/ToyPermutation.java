package org.notchwork.problem.cipher;

import java.util.function.LongUnaryOperator;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/** Draws permutations of words: a uniformly random table to 12 bits, {@code distinct(2^n, 2^n)}, keyed above. */
final class ToyPermutation {

    /** The largest width that is drawn as a table. */
    static final int TABLE_WIDTH = 12;

    private ToyPermutation() {}

    static LongUnaryOperator draw(int width, RandomStream stream) {
        if (width > TABLE_WIDTH) {
            return KeyedPermutation.draw(width, stream)::apply;
        }
        int[] table = stream.distinct(1 << width, 1 << width);
        return x -> table[(int) x];
    }
}
