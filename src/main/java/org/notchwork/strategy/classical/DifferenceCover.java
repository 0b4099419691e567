package org.notchwork.strategy.classical;

import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;

/**
 * Queries 0, 1, …, 2^a − 1 and then 2^a, 2 · 2^a, …, (2^(n−a) − 1) 2^a with a = ⌊n/2⌋: every non-zero word is the sum
 * of two of these points, so 2^⌈n/2⌉ + 2^⌊n/2⌋ − 1 queries always suffice.
 *
 * @see "G. Cai, D. Qiu, Optimal separation in exact query complexities for Simon's problem, J. Comput. Syst. Sci. 97
 *     (2018): Θ(2^(n/2)) deterministic queries"
 */
public final class DifferenceCover implements PeriodByCollision {

    @Override
    public String name() {
        return "difference-cover";
    }

    @Override
    public String description() {
        return "queries a block 0 ... 2^a - 1, then the multiples of 2^a, a = floor(n/2), until two values are the same";
    }

    @Override
    public boolean deterministic() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        long points = (1L << (width / 2)) + (1L << (width - width / 2)) - 1;
        return SeenValues.bytes(Math.min(queryLimit, points));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return CollisionSearch.run(oracle, new BlockThenMultiples(oracle.width()));
    }

    private static final class BlockThenMultiples implements CollisionSearch.Order {

        private final long end;
        private final long block;
        private long next;

        BlockThenMultiples(int width) {
            this.end = 1L << width;
            this.block = 1L << (width / 2);
        }

        @Override
        public boolean isDone() {
            return next == end;
        }

        @Override
        public long next() {
            if (next == end) {
                return SeenValues.NONE;
            }
            long point = next;
            next += point < block ? 1 : block;
            return point;
        }
    }
}
