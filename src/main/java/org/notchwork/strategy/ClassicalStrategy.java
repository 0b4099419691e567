package org.notchwork.strategy;

import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;

/** A strategy that evaluates the function at one point after another. */
public non-sealed interface ClassicalStrategy extends Strategy {

    /**
     * Tries to answer.
     *
     * @param oracle the function; {@link Oracle#remaining} is asked before each call
     * @param stream the strategy's own randomness
     */
    Attempt attempt(Oracle oracle, RandomStream stream);
}
