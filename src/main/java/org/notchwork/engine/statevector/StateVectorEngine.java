package org.notchwork.engine.statevector;

import java.util.Optional;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Farther;
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
    /** The amplified circuit has complex amplitudes of 16 bytes. */
    private static final int AMPLIFIED_QUBITS = 22;

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
    public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
        int most = circuit == Circuit.AMPLIFIED ? AMPLIFIED_QUBITS : QUBITS;
        int needed = circuit == Circuit.PHASE ? width + 1 : 2 * width;
        return needed <= most
                ? Optional.empty()
                : Optional.of("statevector holds " + most + " qubits and width " + width + " needs " + needed + "; "
                        + Farther.than(problem, width));
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
        private Optional<Measurement> signed = Optional.empty();

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
        public long phaseSample(RandomStream stream) {
            unitary.use();
            if (signed.isEmpty()) {
                signed = Optional.of(new Measurement(phaseWeights()));
            }
            return signed.get().draw(stream);
        }

        @Override
        public Outcomes phaseOutcomes() {
            Reach.requireListable(unitary.width());
            return new Outcomes(phaseWeights());
        }

        /** The value qubit starts in |1⟩ and gets a Hadamard of its own; nothing else differs. */
        private long[] phaseWeights() {
            StateVector state = new StateVector(unitary.width(), unitary.valueWidth());
            state.startInValueOne();
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            state.oracle(unitary::image);
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            return state.inputWeights();
        }

        @Override
        public long amplifiedSample(long test, RandomStream stream) {
            unitary.use();
            unitary.useInverse();
            unitary.use();
            return new Measurement(amplifiedWeights(test)).draw(stream);
        }

        @Override
        public Outcomes amplifiedOutcomes(long test) {
            Reach.requireListable(unitary.width());
            return new Outcomes(amplifiedWeights(test));
        }

        /** A, i on the accepted words, the inverse of A, which is A, i on |0…0⟩|0…0⟩, A: gate by gate. */
        private long[] amplifiedWeights(long test) {
            ComplexState state = new ComplexState(unitary.width(), unitary.valueWidth());
            sampling(state);
            state.phaseIfOdd(test);
            sampling(state);
            state.phaseAtZero();
            sampling(state);
            return state.inputWeights();
        }

        private void sampling(ComplexState state) {
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            state.oracle(unitary::image);
            for (int qubit = 0; qubit < unitary.width(); qubit++) {
                state.hadamard(qubit);
            }
            state.reduce();
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
