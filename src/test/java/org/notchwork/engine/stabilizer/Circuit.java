package org.notchwork.engine.stabilizer;

import org.notchwork.seed.RandomStream;

/** One circuit for a tableau and its naive twins: gates drawn by a stream, the same for all. */
final class Circuit {

    /** A gate on two different qubits, of which a gate on one qubit uses the first. */
    record Gate(int kind, int qubit, int other) {

        static final int KINDS = 5;

        /** Draws a gate; on a single qubit never a CNOT. */
        static Gate random(int qubits, RandomStream stream) {
            int kind = (int) stream.below(qubits == 1 ? KINDS - 1 : KINDS);
            int qubit = (int) stream.below(qubits);
            int step = qubits == 1 ? 0 : 1 + (int) stream.below(qubits - 1L);
            return new Gate(kind, qubit, (qubit + step) % qubits);
        }
    }

    private Circuit() {}

    static void apply(Gate gate, Tableau tableau) {
        switch (gate.kind()) {
            case 0 -> tableau.hadamard(gate.qubit());
            case 1 -> tableau.phase(gate.qubit());
            case 2 -> tableau.x(gate.qubit());
            case 3 -> tableau.z(gate.qubit());
            default -> tableau.cnot(gate.qubit(), gate.other());
        }
    }

    static void apply(Gate gate, DenseState state) {
        switch (gate.kind()) {
            case 0 -> state.hadamard(gate.qubit());
            case 1 -> state.phase(gate.qubit());
            case 2 -> state.x(gate.qubit());
            case 3 -> state.z(gate.qubit());
            default -> state.cnot(gate.qubit(), gate.other());
        }
    }

    static void apply(Gate gate, PlainTableau tableau) {
        switch (gate.kind()) {
            case 0 -> tableau.hadamard(gate.qubit());
            case 1 -> tableau.phase(gate.qubit());
            case 2 -> tableau.x(gate.qubit());
            case 3 -> tableau.z(gate.qubit());
            default -> tableau.cnot(gate.qubit(), gate.other());
        }
    }
}
