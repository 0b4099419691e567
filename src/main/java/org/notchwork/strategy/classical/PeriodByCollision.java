package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.ClassicalStrategy;

/** What the strategies have in common that name a period by the sum of two colliding points. */
interface PeriodByCollision extends ClassicalStrategy {

    /** The widest words that the strategies keep. */
    int WIDEST = 63;

    @Override
    default Optional<String> refusal(Problem problem, int width) {
        return Answering.exactly(name(), problem, Set.of(Question.PERIOD, Question.PERIOD_OR_NONE))
                .or(() -> tooWide(name(), width));
    }

    /** Declines words that do not fit. */
    static Optional<String> tooWide(String name, int width) {
        return width <= WIDEST
                ? Optional.empty()
                : Optional.of(name + " keeps words of " + WIDEST + " bits, not " + width
                        + "; affine-solve and fourier-sampling reach further");
    }

    @Override
    default long memoryBytes(int width, long queryLimit) {
        return SeenValues.bytes(Math.min(queryLimit, (1L << (width - 1)) + 1));
    }
}
