package org.notchwork.engine;

import org.notchwork.problem.Unitary;

/** An engine that works from evaluations of the function alone. */
public non-sealed interface BlindEngine extends Engine {

    @Override
    default Sight sight() {
        return Sight.BLIND;
    }

    /** Prepares to run circuits around one function. */
    Simulation open(Unitary unitary);
}
