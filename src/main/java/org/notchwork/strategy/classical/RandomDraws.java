package org.notchwork.strategy.classical;

import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;

/**
 * Queries uniformly random points, none twice, until the first collision.
 *
 * <p>A point is {@code bits(n)} of the strategy's stream, drawn again while it has been asked before.
 */
public final class RandomDraws implements PeriodByCollision {

    @Override
    public String name() {
        return "random-draws";
    }

    @Override
    public String description() {
        return "queries uniformly random points, none twice, until two values are the same";
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    /** The points asked are held in a table of their own beside the values seen. */
    @Override
    public long memoryBytes(int width, long queryLimit) {
        return Math.multiplyExact(2L, PeriodByCollision.super.memoryBytes(width, queryLimit));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return CollisionSearch.run(oracle, new Fresh(oracle.width(), stream));
    }

    private static final class Fresh implements CollisionSearch.Order {

        private final int width;
        private final RandomStream stream;
        private final SeenValues asked = new SeenValues();
        private long drawn;

        Fresh(int width, RandomStream stream) {
            this.width = width;
            this.stream = stream;
        }

        @Override
        public long next() {
            if (drawn == 1L << width) {
                return SeenValues.NONE;
            }
            drawn++;
            while (true) {
                long x = stream.bits(width);
                if (asked.noteOrFind(x, x) == SeenValues.NONE) {
                    return x;
                }
            }
        }
    }
}
