package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class OutcomeSpaceTest {

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 64, 100})
    void theGhzStateHasTwoOutcomesAndItsPartsToo(int qubits) {
        Tableau tableau = TableauTest.ghz(qubits);
        OutcomeSpace all = OutcomeSpace.of(tableau, range(qubits));
        BigInteger ones = BigInteger.ONE.shiftLeft(qubits).subtract(BigInteger.ONE);
        assertEquals(List.of(ones), all.basis());
        assertEquals(BigInteger.ZERO, all.offset());
        OutcomeSpace ends = OutcomeSpace.of(tableau, List.of(qubits - 1, 0));
        assertEquals(List.of(BigInteger.valueOf(3)), ends.basis());
    }

    @Test
    void bitsAreInTheOrderOfTheList() {
        Tableau tableau = new Tableau(3);
        tableau.x(2);
        tableau.hadamard(0);
        OutcomeSpace space = OutcomeSpace.of(tableau, List.of(2, 1, 0));
        assertEquals(BigInteger.ONE, space.offset());
        assertEquals(List.of(BigInteger.valueOf(4)), space.basis());
    }

    @Test
    void oneHundredAndThirtyFreeBitsAreDrawnInThreeChunks() {
        Tableau tableau = new Tableau(131);
        tableau.x(130);
        IntStream.range(0, 130).forEach(tableau::hadamard);
        OutcomeSpace space = OutcomeSpace.of(tableau, range(131));
        assertEquals(130, space.dimension());
        RandomStream stream = Streams.named("chunks");
        RandomStream twin = Streams.named("chunks");
        for (int i = 0; i < 10; i++) {
            BigInteger expected = BigInteger.valueOf(twin.bits(63))
                    .add(BigInteger.valueOf(twin.bits(63)).shiftLeft(63))
                    .add(BigInteger.valueOf(twin.bits(4)).shiftLeft(126))
                    .setBit(130);
            assertEquals(expected, space.sample(stream));
        }
    }

    @Test
    void aSureOutcomeDrawsNothing() {
        Tableau tableau = new Tableau(2);
        tableau.x(1);
        OutcomeSpace space = OutcomeSpace.of(tableau, range(2));
        RandomStream stream = Streams.named("sure");
        assertEquals(BigInteger.TWO, space.sample(stream));
        assertEquals(Streams.named("sure").nextLong(), stream.nextLong());
    }

    /** Qubit by qubit or at once: the same words are possible, and both ways meet all of them. */
    @Test
    void samplesAndMeasurementsMeetTheSameWords() {
        int qubits = 9;
        for (int round = 0; round < 20; round++) {
            RandomStream stream = Streams.numbered("same words", round);
            Tableau tableau = new Tableau(qubits);
            IntStream.range(0, 120).forEach(i -> Circuit.apply(Circuit.Gate.random(qubits, stream), tableau));
            List<Integer> listed = List.of(7, 2, 5, 0);
            OutcomeSpace space = OutcomeSpace.of(tableau, listed);
            Map<BigInteger, Integer> sampled = new HashMap<>();
            Map<BigInteger, Integer> measured = new HashMap<>();
            for (int i = 0; i < 400; i++) {
                sampled.merge(space.sample(stream), 1, Integer::sum);
                measured.merge(measure(tableau.copy(), listed, stream), 1, Integer::sum);
            }
            // With at most 16 words, one is missed by 400 fair draws with probability below 1e-10.
            assertEquals(1 << space.dimension(), sampled.size());
            assertEquals(sampled.keySet(), measured.keySet());
            assertTrue(sampled.keySet().stream().allMatch(space::contains));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {65, 150})
    void measuredWordsOfManyQubitsLieInTheSpace(int qubits) {
        RandomStream stream = Streams.numbered("many qubits", qubits);
        Tableau tableau = new Tableau(qubits);
        // Few gates for many qubits: some outcomes stay sure, some parities too.
        IntStream.range(0, 5 * qubits).forEach(i -> Circuit.apply(Circuit.Gate.random(qubits, stream), tableau));
        OutcomeSpace space = OutcomeSpace.of(tableau, range(qubits));
        assertTrue(space.dimension() > 0 && space.dimension() < qubits, "dimension " + space.dimension());
        int random = 0;
        Tableau copy = tableau.copy();
        for (int q = 0; q < qubits; q++) {
            random += copy.isRandom(q) ? 1 : 0;
            copy.measure(q, stream);
        }
        assertEquals(space.dimension(), random, "so many outcomes are not fixed by those before them");
        for (int i = 0; i < 20; i++) {
            BigInteger word = measure(tableau.copy(), range(qubits), stream);
            assertTrue(space.contains(word));
            int sure = IntStream.range(0, qubits)
                    .filter(q -> !tableau.isRandom(q))
                    .findFirst()
                    .orElseThrow();
            assertTrue(!space.contains(word.flipBit(sure)));
        }
    }

    @Test
    void theTableauStaysAsItIs() {
        Tableau tableau = TableauTest.ghz(4);
        OutcomeSpace.of(tableau, range(4));
        assertTrue(tableau.isRandom(0));
    }

    @Test
    void noQubitsOrOneTwiceOrOneThatIsNotThereAreRefused() {
        Tableau tableau = new Tableau(2);
        List<Integer> none = List.of();
        List<Integer> twice = List.of(1, 1);
        List<Integer> beyond = List.of(2);
        assertThrows(IllegalArgumentException.class, () -> OutcomeSpace.of(tableau, none));
        assertThrows(IllegalArgumentException.class, () -> OutcomeSpace.of(tableau, twice));
        assertThrows(IndexOutOfBoundsException.class, () -> OutcomeSpace.of(tableau, beyond));
    }

    static BigInteger measure(Tableau tableau, List<Integer> qubits, RandomStream stream) {
        BigInteger word = BigInteger.ZERO;
        for (int i = 0; i < qubits.size(); i++) {
            word = tableau.measure(qubits.get(i), stream) == 1 ? word.setBit(i) : word;
        }
        return word;
    }

    static List<Integer> range(int end) {
        return IntStream.range(0, end).boxed().toList();
    }
}
