package org.notchwork.engine;

import java.util.Optional;
import org.notchwork.problem.Problem;

/** A way to evaluate quantum circuits. Immutable and without state; what it opens has the state. */
public sealed interface Engine permits BlindEngine, SightedEngine {

    /** Returns the name, as a study file gives it. */
    String name();

    /** Returns whether the engine is told what the instance hides. */
    Sight sight();

    /** Returns in one sentence how the engine works, for people. */
    String description();

    /**
     * Returns why the engine cannot run a circuit on a problem at a width, with an engine that can; empty if it can.
     *
     * @param problem the problem
     * @param width the number of input bits
     * @param circuit the circuit
     */
    Optional<String> refusal(Problem problem, int width, Circuit circuit);

    /** Returns whether the engine can open what the controls of a problem face, which need not be of its family. */
    default boolean takesControlsOf(Problem problem) {
        return true;
    }

    /** Returns about how many bytes one simulation of a width takes. */
    long memoryBytes(int width);
}
