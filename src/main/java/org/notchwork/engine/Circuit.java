package org.notchwork.engine;

import java.util.Locale;

/** The circuits around U_f that an engine may be asked to run. */
public enum Circuit {
    /** Hadamards on the inputs, U_f, Hadamards again, the inputs measured. */
    FOURIER,
    /** As {@link #FOURIER}, with the value qubit in (|0⟩ − |1⟩)/√2, so that f(x) becomes a sign. */
    PHASE,
    /** {@link #FOURIER}, then one round of amplitude amplification of the outcomes that a linear test accepts. */
    AMPLIFIED;

    /** Returns the word that messages use. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
