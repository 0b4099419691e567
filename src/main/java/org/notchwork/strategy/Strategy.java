package org.notchwork.strategy;

import java.util.Optional;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Problem;

/** A way to answer a question. Immutable and without state. */
public sealed interface Strategy permits ClassicalStrategy, QuantumStrategy {

    /** Returns the name, as a study file gives it. */
    String name();

    /** Returns the settings as a study file writes them, defaults filled in, the name not among them. */
    default JsonObject settings() {
        return JsonObject.builder().build();
    }

    /** Returns in one sentence how the strategy works, for people. */
    String description();

    /** Returns why the strategy does not answer a problem's question at a width; empty if it does. */
    Optional<String> refusal(Problem problem, int width);

    /** Returns whether the query count depends on the hidden answer alone, not on chance or labels. */
    boolean deterministic();

    /**
     * Returns whether the strategy may name a wrong answer by design, although the promise holds and nothing is disturbed:
     * then it is held to its rate of success, not to being right every time.
     */
    default boolean mayErr() {
        return false;
    }

    /** Returns about how many bytes an attempt at a width takes at most, within a query limit. */
    long memoryBytes(int width, long queryLimit);
}
