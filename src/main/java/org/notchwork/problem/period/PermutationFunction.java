package org.notchwork.problem.period;

import org.notchwork.problem.BitFunction;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/** A function with a period that labels a coset by a keyed permutation of its representative. Immutable. */
final class PermutationFunction implements BitFunction {

    private final Cosets cosets;
    private final KeyedPermutation permutation;

    PermutationFunction(Cosets cosets, RandomStream stream) {
        this.cosets = cosets;
        this.permutation = KeyedPermutation.draw(cosets.width(), stream);
    }

    @Override
    public int width() {
        return cosets.width();
    }

    @Override
    public int valueWidth() {
        return cosets.width();
    }

    @Override
    public long at(long x) {
        return permutation.apply(cosets.representative(x));
    }
}
