package org.notchwork.strategy.classical;

import java.util.Optional;
import org.notchwork.problem.Problem;
import org.notchwork.problem.period.XorPeriodFamily;
import org.notchwork.strategy.ClassicalStrategy;

/** What the strategies have in common that name a period by the sum of two colliding points. */
interface PeriodByCollision extends ClassicalStrategy {

    @Override
    default Optional<String> refusal(Problem problem, int width) {
        return problem.kind().equals(XorPeriodFamily.KIND)
                ? Optional.empty()
                : Optional.of(name() + " names a period; " + problem.kind() + " asks for something else");
    }

    @Override
    default long memoryBytes(int width, long queryLimit) {
        return SeenValues.bytes(Math.min(queryLimit, (1L << (width - 1)) + 1));
    }
}
