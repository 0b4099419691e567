package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;

/**
 * Queries 0, 1, 2, … until two values differ, or 2^(n−1) + 1 values are the same, which settles it for certain.
 *
 * @see "D. Deutsch, R. Jozsa, Rapid solution of problems by quantum computation, Proc. R. Soc. A 439 (1992)"
 */
public final class BalanceScan implements ClassicalStrategy {

    @Override
    public String name() {
        return "balance-scan";
    }

    @Override
    public String description() {
        return "queries 0, 1, 2, ... until two values differ or 2^(n-1) + 1 are the same";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.CONSTANT_OR_BALANCED));
    }

    /** The count depends on the function, not on the answer alone. */
    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 16;
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        long[] next = {0};
        return FirstDifference.run(oracle, (1L << (oracle.width() - 1)) + 1, () -> next[0]++);
    }
}
