package org.notchwork.problem;

import java.util.Optional;

/**
 * U_f: |x⟩|z⟩ → |x⟩|z ⊕ f(x)⟩ as an engine sees it.
 *
 * <p>An engine that simulates one use of U_f has to evaluate f at many points; those evaluations are work of this
 * machine, not queries. What counts is the use: the engine calls {@link #use} once for each U_f in the circuit it
 * simulates. Only engines may hold one; strategies are handed none. Not for use by several threads.
 */
public final class Unitary {

    private final BitFunction function;
    private final Meter meter;

    /** Puts a meter in front of a function. */
    public Unitary(BitFunction function, Meter meter) {
        this.function = function;
        this.meter = meter;
    }

    /** Returns the number of qubits of the input register. */
    public int width() {
        return function.width();
    }

    /** Returns the number of qubits of the value register. */
    public int valueWidth() {
        return function.valueWidth();
    }

    /** Counts one use of U_f. */
    public void use() {
        meter.count(CallKind.QUANTUM);
    }

    /** Counts one use of the inverse of U_f. */
    public void useInverse() {
        meter.count(CallKind.INVERSE);
    }

    /** Returns f(x), the word that U_f adds to the value register beside x; not a query. */
    public long image(long x) {
        return function.at(x);
    }

    /** Returns the circuit of U_f, for a function that is given as one; empty for a function known by its values. */
    public Optional<Network> network() {
        return function instanceof NetworkFunction drawn ? Optional.of(drawn.network()) : Optional.empty();
    }
}
