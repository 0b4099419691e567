package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** Where no vector of amplitudes reaches, and words of 64 bits meet: against the tableau of the textbook. */
class AgainstPlainTableauTest {

    @ParameterizedTest
    @ValueSource(ints = {5, 63, 64, 65, 130, 200})
    void allMeasurementsOfRandomCircuitsAgree(int qubits) {
        RandomStream stream = Streams.numbered("plain", qubits);
        RandomStream outcomes = Streams.numbered("plain outcomes", qubits);
        RandomStream same = Streams.numbered("plain outcomes", qubits);
        Tableau tableau = new Tableau(qubits);
        PlainTableau plain = new PlainTableau(qubits);
        int random = 0;
        int sureOnes = 0;
        for (int round = 0; round < 12; round++) {
            for (int i = 0; i < 4 * qubits; i++) {
                // Every other round keeps basis states basis states, so that many outcomes are sure sums of many words.
                Circuit.Gate gate = Circuit.Gate.random(qubits, stream);
                if (gate.kind() != 0 || round % 2 == 0) {
                    Circuit.apply(gate, tableau);
                    Circuit.apply(gate, plain);
                }
            }
            for (int q : stream.distinct(round % 4 == 3 ? qubits / 3 : qubits, qubits)) {
                boolean open = plain.isRandom(q);
                assertEquals(open, tableau.isRandom(q));
                int expected = plain.measure(q, open ? (int) same.bits(1) : -1);
                assertEquals(expected, tableau.measure(q, outcomes));
                random += open ? 1 : 0;
                sureOnes += open ? 0 : expected;
            }
        }
        assertEquals(same.nextLong(), outcomes.nextLong(), "one draw for a random outcome, none for a sure one");
        assertTrue(random > qubits, "random outcomes met: " + random);
        assertTrue(sureOnes > qubits, "sure outcomes 1 met: " + sureOnes);
    }
}
