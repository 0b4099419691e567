package org.notchwork.engine.stabilizer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bits.WideBasis;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** D. R. Simon, On the power of quantum computation, SIAM J. Comput. 26 (1997): all y are orthogonal to s. */
class HiddenKernelTest {

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 10, 64, 300})
    void theOutcomesOfTheFirstRegisterAreTheWordsOrthogonalToTheHiddenOne(int n) {
        for (int round = 0; round < 3; round++) {
            RandomStream stream = Streams.numbered("hidden kernel " + n, round);
            HiddenKernel hidden = HiddenKernel.random(n, stream);
            OutcomeSpace space = OutcomeSpace.of(hidden.run(), OutcomeSpaceTest.range(n));
            assertEquals(n - 1, space.dimension());
            assertEquals(BigInteger.ZERO, space.offset());
            WideBasis span = new WideBasis(n);
            for (BigInteger direction : space.basis()) {
                assertEquals(0, dot(direction, hidden.s()));
                assertTrue(span.add(direction));
            }
            assertEquals(List.of(hidden.s()), span.complement());
            assertEquals(0, dot(space.sample(stream), hidden.s()));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 10, 64, 300})
    void measuringTheSecondRegisterFirstChangesNothing(int n) {
        RandomStream stream = Streams.numbered("hidden kernel measured", n);
        HiddenKernel hidden = HiddenKernel.random(n, stream);
        Tableau tableau = hidden.run();
        BigInteger value = OutcomeSpaceTest.measure(
                tableau, IntStream.range(n, 2 * n).boxed().toList(), stream);
        assertTrue(value.bitLength() < n, "the last qubit has no row");
        assertEquals(n - 1, OutcomeSpace.of(tableau, OutcomeSpaceTest.range(n)).dimension());
        assertEquals(0, dot(OutcomeSpaceTest.measure(tableau, OutcomeSpaceTest.range(n), stream), hidden.s()));
    }

    private static int dot(BigInteger a, BigInteger b) {
        return a.and(b).bitCount() & 1;
    }
}
