package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;

/**
 * Queries at most m uniformly random points, none twice, until two values differ, and answers "constant" if none do: never
 * wrong on a constant function. A point is {@code bits(n)}, drawn again while it has been asked before.
 *
 * @param queries m, at least 1
 */
public record BalanceSampling(int queries) implements ClassicalStrategy {

    /** The name in study files. */
    static final String NAME = "balance-sampling";

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder().put("queries", queries).build();
    }

    @Override
    public String description() {
        return "queries " + queries + " random points at most, none twice, until two values differ; wrong on a balanced"
                + " function if none do";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(NAME, problem, Set.of(Question.CONSTANT_OR_BALANCED))
                .or(() -> width >= 31 || queries <= 1 << width
                        ? Optional.empty()
                        : Optional.of(
                                NAME + " asks " + queries + " different points and width " + width + " has fewer"));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public boolean mayErr() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return SeenValues.bytes(queries);
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        SeenValues asked = new SeenValues();
        return FirstDifference.run(oracle, queries, () -> {
            long x = stream.bits(oracle.width());
            while (asked.noteOrFind(x, x) != SeenValues.NONE) {
                x = stream.bits(oracle.width());
            }
            return x;
        });
    }
}
