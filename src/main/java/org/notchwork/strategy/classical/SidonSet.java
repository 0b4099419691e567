package org.notchwork.strategy.classical;

import java.util.Optional;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;

/**
 * Queries the points (x, x³), x = 0, 1, …, over GF(2^(n/2)), whose sums are all different, so that no strategy succeeds
 * more often with as many queries; then (0, b), b = 1, 2, …, after which every word is a sum of two points. The first
 * half of a word is the high one. Even widths; at most 2 · 2^(n/2) − 1 queries.
 *
 * @see "R. Gold, IEEE Trans. Inf. Theory 14 (1968); K. Nyberg, Eurocrypt 1993: cubing is almost perfect nonlinear"
 */
public final class SidonSet implements PeriodByCollision {

    @Override
    public String name() {
        return "sidon-set";
    }

    @Override
    public String description() {
        return "queries the points (x, x^3) over GF(2^(n/2)), whose sums all differ, then the line (0, b), until two"
                + " values are the same";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return PeriodByCollision.super
                .refusal(problem, width)
                .or(() -> width % 2 == 0
                        ? Optional.empty()
                        : Optional.of("sidon-set splits words into two halves and width " + width + " is odd"));
    }

    @Override
    public boolean deterministic() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return SeenValues.bytes(Math.min(queryLimit, 2L << (width / 2)));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return CollisionSearch.run(oracle, new CubesThenLine(oracle.width() / 2));
    }

    private static final class CubesThenLine implements CollisionSearch.Order {

        private final int half;
        private final BinaryField field;
        private final long size;
        private long next;

        CubesThenLine(int half) {
            this.half = half;
            this.field = new BinaryField(half);
            this.size = 1L << half;
        }

        @Override
        public boolean isDone() {
            return next == 2 * size - 1;
        }

        @Override
        public long next() {
            if (isDone()) {
                return SeenValues.NONE;
            }
            long x = next++;
            return x < size ? x << half | field.times(field.times(x, x), x) : x - size + 1;
        }
    }
}
