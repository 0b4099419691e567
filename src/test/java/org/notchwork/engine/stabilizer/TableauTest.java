package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class TableauTest {

    @Test
    void atFirstEveryQubitIsSurelyZero() {
        RandomStream stream = Streams.named("zero");
        Tableau tableau = new Tableau(70);
        for (int q = 0; q < 70; q++) {
            assertFalse(tableau.isRandom(q));
            assertEquals(0, tableau.measure(q, stream));
        }
    }

    @Test
    void xFlipsAndZBetweenHadamardsFlips() {
        RandomStream stream = Streams.named("flips");
        Tableau tableau = new Tableau(2);
        tableau.x(0);
        tableau.hadamard(1);
        tableau.phase(1);
        tableau.phase(1);
        tableau.hadamard(1);
        assertEquals(1, tableau.measure(0, stream));
        assertEquals(1, tableau.measure(1, stream), "S twice is Z, and H Z H is X");
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 64, 65, 300})
    void measuringOneQubitOfTheGhzStateFixesTheOthers(int qubits) {
        int ones = 0;
        for (int round = 0; round < 64; round++) {
            RandomStream stream = Streams.numbered("ghz " + qubits, round);
            Tableau tableau = ghz(qubits);
            int middle = qubits / 2;
            assertTrue(tableau.isRandom(middle));
            int bit = tableau.measure(middle, stream);
            ones += bit;
            for (int q = 0; q < qubits; q++) {
                assertFalse(tableau.isRandom(q));
                assertEquals(bit, tableau.measure(q, stream));
            }
        }
        // Fair coins stay within 16..48 of 64 but for 3 in 100 000 streams; these streams are always the same.
        assertTrue(ones >= 16 && ones <= 48, "ones: " + ones);
    }

    /** (|00⟩ + |11⟩)/√2 agrees in both bases; with a Z it disagrees in the Hadamard basis, with an X in this one. */
    @Test
    void bellStatesAgreeOrDisagreeAsTheirSignsSay() {
        for (int kind = 0; kind < 4; kind++) {
            for (int basis = 0; basis < 2; basis++) {
                RandomStream stream = Streams.numbered("bell", kind * 2 + basis);
                Tableau tableau = ghz(2);
                if ((kind & 1) == 1) {
                    tableau.x(1);
                }
                if ((kind & 2) == 2) {
                    tableau.z(0);
                }
                if (basis == 1) {
                    tableau.hadamard(0);
                    tableau.hadamard(1);
                }
                assertTrue(tableau.isRandom(0) && tableau.isRandom(1));
                int first = tableau.measure(0, stream);
                assertEquals(kind >> basis & 1, first ^ tableau.measure(1, stream));
            }
        }
    }

    @Test
    void measuringTwiceGivesTheSameAndDrawsOnce() {
        int qubits = 90;
        RandomStream gates = Streams.named("twice");
        Tableau tableau = new Tableau(qubits);
        for (int i = 0; i < 2000; i++) {
            Circuit.apply(Circuit.Gate.random(qubits, gates), tableau);
        }
        RandomStream stream = Streams.named("twice outcomes");
        RandomStream twin = Streams.named("twice outcomes");
        int random = 0;
        for (int q = 0; q < qubits; q++) {
            boolean open = tableau.isRandom(q);
            random += open ? 1 : 0;
            int first = tableau.measure(q, stream);
            assertTrue(!open || first == twin.bits(1));
            assertFalse(tableau.isRandom(q));
            assertEquals(first, tableau.measure(q, stream));
        }
        assertTrue(random > 10);
        assertEquals(twin.nextLong(), stream.nextLong());
    }

    @Test
    void aCopyGoesItsOwnWay() {
        RandomStream stream = Streams.named("copies");
        Tableau tableau = ghz(3);
        Tableau copy = tableau.copy();
        copy.x(0);
        int bit = copy.measure(0, stream);
        assertTrue(tableau.isRandom(0));
        assertEquals(1 - bit, copy.measure(1, stream));
        tableau.cnot(0, 1);
        assertFalse(tableau.isRandom(1));
        assertEquals(0, tableau.measure(1, stream));
        assertEquals(1 - bit, copy.measure(1, stream));
    }

    @Test
    void whatIsNoQubitIsRefused() {
        Tableau tableau = new Tableau(3);
        RandomStream stream = Streams.named("refused");
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.hadamard(3));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.x(-1));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.z(3));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.phase(3));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.cnot(0, 3));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.cnot(-1, 0));
        assertThrows(IllegalArgumentException.class, () -> tableau.cnot(1, 1));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.isRandom(3));
        assertThrows(IndexOutOfBoundsException.class, () -> tableau.measure(3, stream));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, -1, 8193})
    void otherNumbersOfQubitsAreRefused(int qubits) {
        assertThrows(IllegalArgumentException.class, () -> new Tableau(qubits));
    }

    static Tableau ghz(int qubits) {
        Tableau tableau = new Tableau(qubits);
        tableau.hadamard(0);
        for (int q = 1; q < qubits; q++) {
            tableau.cnot(q - 1, q);
        }
        return tableau;
    }
}
