package org.notchwork.engine;

import org.notchwork.problem.Answer;
import org.notchwork.problem.Unitary;

/** An engine that is told what the instance hides. Its figures say so wherever they stand. */
public non-sealed interface SightedEngine extends Engine {

    @Override
    default Sight sight() {
        return Sight.SIGHTED;
    }

    /**
     * Prepares to run circuits around one function.
     *
     * @param unitary what counts the uses of U_f
     * @param hidden what the instance hides
     */
    Simulation open(Unitary unitary, Answer hidden);
}
