package org.notchwork.strategy.classical;

import java.util.Optional;
import org.notchwork.problem.Problem;
import org.notchwork.problem.period.XorPeriodFamily;
import org.notchwork.strategy.ClassicalStrategy;

/** What the strategies have in common that name a period by the sum of two colliding points. */
interface PeriodByCollision extends ClassicalStrategy {

    /** Bytes of one slot at the fullest moment: a value and a point, in the table and in the one half its size. */
    long SLOT_BYTES = 24;

    @Override
    default Optional<String> refusal(Problem problem, int width) {
        return problem.kind().equals(XorPeriodFamily.KIND)
                ? Optional.empty()
                : Optional.of(name() + " names a period; " + problem.kind() + " asks for something else");
    }

    @Override
    default long memoryBytes(int width, long queryLimit) {
        long queries = Math.min(queryLimit, (1L << (width - 1)) + 1);
        return Math.multiplyExact(Math.min(queries, Long.MAX_VALUE / 128), SLOT_BYTES * 4);
    }
}
