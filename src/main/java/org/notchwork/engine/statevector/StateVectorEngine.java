package org.notchwork.engine.statevector;

import java.util.Optional;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Measurement;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/** Keeps the amplitudes of both registers and applies the circuit gate by gate; at most 26 qubits. */
public final class StateVectorEngine implements BlindEngine {

    /** The name in study files. */
    public static final String NAME = "statevector";

    private static final int QUBITS = 26;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "amplitudes of both registers as exact integers, gate by gate: Hadamards, the oracle's permutation of"
                + " basis states, Hadamards, measurement";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        if (2 * width <= QUBITS) {
            return Optional.empty();
        }
        String other =
                width <= 26 ? "engine fibre reaches width 26" : "engine annihilator reaches width 63 but is sighted";
        return Optional.of(
                "statevector holds " + QUBITS + " qubits and width " + width + " needs " + 2 * width + "; " + other);
    }

    @Override
    public long memoryBytes(int width) {
        return (4L << (2 * width)) + (16L << width);
    }

    /**
     * Prepares to run circuits around one function.
     *
     * @throws IllegalArgumentException if both registers together have more than 26 qubits
     */
    @Override
    public Simulation open(Unitary unitary) {
        int qubits = unitary.width() + unitary.valueWidth();
        if (qubits > QUBITS) {
            throw new IllegalArgumentException("statevector holds " + QUBITS + " qubits, not " + qubits);
        }
        return new Opened(unitary);
    }

    /**
     * The circuit on one function. The state before the measurement is the same in every run, so it is prepared once
     * and measured as often as asked; each run counts its use of U_f.
     */
    private static final class Opened implements Simulation {

        private final Unitary unitary;
        private Optional<Measurement> prepared = Optional.empty();

        Opened(Unitary unitary) {
            this.unitary = unitary;
        }

        @Override
        public long fourierSample(RandomStream stream) {
            unitary.use();
            if (prepared.isEmpty()) {
                prepared = Optional.of(new Measurement(weights()));
            }
            return prepared.get().draw(stream);
        }

        @Override
        public Outcomes outcomes() {
            Reach.requireListable(unitary.width());
            return new Outcomes(weights());
        }

        private long[] weights() {
            StateVector state = new StateVector(unitary.width(), unitary.valueWidth());
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            state.oracle(unitary::image);
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            return state.inputWeights();
        }
    }
}
