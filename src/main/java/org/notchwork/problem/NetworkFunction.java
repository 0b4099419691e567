package org.notchwork.problem;

/** A function that is given as a circuit of CNOT and X gates. */
public interface NetworkFunction extends BitFunction {

    /** Returns the circuit. */
    Network network();
}
