package org.notchwork.strategy;

import java.util.OptionalInt;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;

/** A strategy that runs circuits around the function. */
public non-sealed interface QuantumStrategy extends Strategy {

    /** Returns the circuit that the strategy runs. */
    Circuit circuit();

    /** Returns whether the answer is right and the limit on rounds is kept for certain, so that all secrets are run. */
    default boolean isZeroError() {
        return false;
    }

    /** Returns how many Fourier samples every attempt at a width draws; empty if that depends on what is measured. */
    default OptionalInt samples(int width) {
        return OptionalInt.empty();
    }

    /** Returns whether the strategy makes sense of disturbed samples. */
    default boolean bearsNoise() {
        return false;
    }

    /**
     * Tries to answer.
     *
     * @param simulation the engine, opened on the function; it counts on the oracle's meter
     * @param oracle the function, for classical evaluations; {@link Oracle#remaining} covers both
     * @param stream the strategy's own randomness, measurements included
     */
    Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream);
}
