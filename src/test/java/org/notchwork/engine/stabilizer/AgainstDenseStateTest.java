package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** The tableau against amplitudes: every probability is 0 or 2^−d, and the same. */
class AgainstDenseStateTest {

    private static final double TOLERANCE = 1e-12;

    /** All short circuits, so that a fault in one gate shows with little around it. */
    @Test
    void everySequenceOfFourGatesOnTwoQubits() {
        List<Circuit.Gate> gates = new ArrayList<>();
        for (int kind = 0; kind < Circuit.Gate.KINDS; kind++) {
            gates.add(new Circuit.Gate(kind, 0, 1));
            gates.add(new Circuit.Gate(kind, 1, 0));
        }
        int sequences = (int) Math.pow(gates.size(), 4);
        for (int number = 0; number < sequences; number++) {
            Tableau tableau = new Tableau(2);
            DenseState state = new DenseState(2);
            List<Circuit.Gate> applied = new ArrayList<>();
            for (int rest = number, i = 0; i < 4; i++, rest /= gates.size()) {
                Circuit.Gate gate = gates.get(rest % gates.size());
                applied.add(gate);
                Circuit.apply(gate, tableau);
                Circuit.apply(gate, state);
            }
            assertSameOutcomes(state, tableau, List.of(0, 1), applied);
            // A last H shows the signs that the basis hides.
            tableau.hadamard(0);
            tableau.hadamard(1);
            state.hadamard(0);
            state.hadamard(1);
            assertSameOutcomes(state, tableau, List.of(0, 1), applied);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void randomCircuitsAfterEveryGate(int qubits) {
        List<Integer> all = IntStream.range(0, qubits).boxed().toList();
        for (int round = 0; round < 200; round++) {
            RandomStream stream = Streams.numbered("clifford " + qubits, round);
            Tableau tableau = new Tableau(qubits);
            DenseState state = new DenseState(qubits);
            for (int i = 0; i < 40; i++) {
                Circuit.Gate gate = Circuit.Gate.random(qubits, stream);
                Circuit.apply(gate, tableau);
                Circuit.apply(gate, state);
                assertSameOutcomes(state, tableau, all, gate);
                assertSameOutcomes(state, tableau, someOf(qubits, stream), gate);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void measurementsInTheMiddleLeaveTheStateOfTheirOutcome(int qubits) {
        List<Integer> all = IntStream.range(0, qubits).boxed().toList();
        int random = 0;
        for (int round = 0; round < 200; round++) {
            RandomStream stream = Streams.numbered("collapse " + qubits, round);
            RandomStream outcomes = Streams.numbered("collapse outcomes " + qubits, round);
            Tableau tableau = new Tableau(qubits);
            DenseState state = new DenseState(qubits);
            for (int i = 0; i < 60; i++) {
                if (stream.below(4) > 0) {
                    Circuit.Gate gate = Circuit.Gate.random(qubits, stream);
                    Circuit.apply(gate, tableau);
                    Circuit.apply(gate, state);
                    continue;
                }
                int q = (int) stream.below(qubits);
                double one = state.probability(List.of(q), 1);
                random += tableau.isRandom(q) ? 1 : 0;
                assertEquals(tableau.isRandom(q) ? 0.5 : Math.rint(one), one, TOLERANCE);
                int bit = tableau.measure(q, outcomes);
                assertTrue(state.probability(List.of(q), bit) > 0.4, "an impossible outcome");
                state.collapse(q, bit);
                assertSameOutcomes(state, tableau, all, q);
            }
        }
        assertTrue(random > 200, "the circuits have random measurements");
    }

    private static List<Integer> someOf(int qubits, RandomStream stream) {
        int count = 1 + (int) stream.below(qubits);
        return IntStream.of(stream.distinct(count, qubits)).boxed().toList();
    }

    private static void assertSameOutcomes(DenseState state, Tableau tableau, List<Integer> qubits, Object after) {
        OutcomeSpace space = OutcomeSpace.of(tableau, qubits);
        double each = Math.scalb(1.0, -space.dimension());
        int possible = 0;
        for (int word = 0; word < 1 << qubits.size(); word++) {
            boolean in = space.contains(BigInteger.valueOf(word));
            possible += in ? 1 : 0;
            assertEquals(state.probability(qubits, word), in ? each : 0, TOLERANCE, () -> "after " + after);
        }
        assertEquals(1 << space.dimension(), possible);
    }
}
