package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** How long a circuit with a hidden kernel takes. Prints its figures and judges none. */
@Tag("bench")
class TableauBench {

    @ParameterizedTest
    @CsvSource({"32,20", "512,12", "2048,3", "4096,1"})
    void oneCircuit(int n, int rounds) {
        List<Integer> all = OutcomeSpaceTest.range(2 * n);
        for (int round = 0; round < rounds; round++) {
            RandomStream stream = Streams.numbered("bench " + n, round);
            HiddenKernel hidden = HiddenKernel.random(n, stream);
            long start = System.nanoTime();
            Tableau tableau = hidden.run();
            long made = System.nanoTime();
            OutcomeSpace space = OutcomeSpace.of(tableau, OutcomeSpaceTest.range(n));
            long listed = System.nanoTime();
            BigInteger sample = space.sample(stream);
            long sampled = System.nanoTime();
            BigInteger word = OutcomeSpaceTest.measure(tableau, all, stream);
            long measured = System.nanoTime();
            assertEquals(0, word.and(hidden.s()).bitCount() & 1);
            assertEquals(0, sample.and(hidden.s()).bitCount() & 1);
            int gates = hidden.rows().stream().mapToInt(BigInteger::bitCount).sum();
            System.out.printf(
                    Locale.ROOT,
                    "%d qubits: %d CNOT %.4f s, outcome space %.4f s, a sample %.6f s, all measurements %.4f s%n",
                    2 * n,
                    gates,
                    (made - start) / 1e9,
                    (listed - made) / 1e9,
                    (sampled - listed) / 1e9,
                    (measured - sampled) / 1e9);
        }
    }
}
