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
        return 2 * width <= QUBITS
                ? Optional.empty()
                : Optional.of("statevector holds " + QUBITS + " qubits and width " + width + " needs " + 2 * width
                        + "; engine fibre reaches width 26");
    }

    @Override
    public long memoryBytes(int width) {
        return (4L << (2 * width)) + (16L << width);
    }

    @Override
    public Simulation open(Unitary unitary) {
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
