package org.notchwork.bits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class EchelonBasisTest {

    /** The naive twin: the set of all sums of the words added. */
    private static final class Span {

        private final Set<Long> sums = new HashSet<>(Set.of(0L));

        boolean add(long word) {
            if (sums.contains(word)) {
                return false;
            }
            Set<Long> shifted = new HashSet<>();
            sums.forEach(s -> shifted.add(s ^ word));
            return sums.addAll(shifted);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 5, 8, 10})
    void rankSpanAndComplementEqualThoseOfTheListedSpan(int width) {
        for (int round = 0; round < 40; round++) {
            RandomStream stream = Streams.numbered("basis " + width, round);
            EchelonBasis basis = new EchelonBasis(width);
            Span span = new Span();
            for (int i = 0; i < width + 2; i++) {
                long mask = stream.bits(width);
                long word = stream.bits(width) & mask;
                assertEquals(span.add(word), basis.add(word));
                assertEquals(span.sums.size(), 1 << basis.rank());
                assertSpan(width, span.sums, basis);
                assertComplement(width, span.sums, basis);
            }
        }
    }

    private static void assertSpan(int width, Set<Long> span, EchelonBasis basis) {
        for (long word = 0; word < 1L << width; word++) {
            long rest = basis.reduce(word);
            assertEquals(span.contains(word), rest == 0);
            assertTrue(span.contains(word ^ rest));
        }
    }

    private static void assertComplement(int width, Set<Long> span, EchelonBasis basis) {
        long[] complement = basis.complement();
        assertEquals(width - basis.rank(), complement.length);
        Span spanned = new Span();
        for (long word : complement) {
            assertTrue(spanned.add(word), "the words of the complement are independent");
            for (long member : span) {
                assertEquals(0, Long.bitCount(word & member) & 1);
            }
        }
    }

    @Test
    void everyRowAloneHasItsLeadingBit() {
        RandomStream stream = Streams.named("rows");
        EchelonBasis basis = new EchelonBasis(63);
        while (basis.rank() < 40) {
            basis.add(stream.bits(63));
        }
        for (int lead = 0; lead < 63; lead++) {
            long row = basis.row(lead);
            if (row == 0) {
                continue;
            }
            assertEquals(1L << lead, Long.highestOneBit(row));
            for (int other = 0; other < 63; other++) {
                assertTrue(other == lead || (basis.row(other) >>> lead & 1) == 0);
            }
        }
    }

    @Test
    void sixtyTwoIndependentWordsLeaveOneOrthogonalWord() {
        RandomStream stream = Streams.named("complement");
        long hidden = stream.nonZeroBits(63);
        EchelonBasis basis = new EchelonBasis(63);
        while (basis.rank() < 62) {
            long y = stream.bits(63);
            if ((Long.bitCount(y & hidden) & 1) == 0) {
                basis.add(y);
            }
        }
        long[] complement = basis.complement();
        assertEquals(1, complement.length);
        assertEquals(hidden, complement[0]);
    }

    @Test
    void theZeroWordIsNeverIndependent() {
        EchelonBasis basis = new EchelonBasis(4);
        assertFalse(basis.add(0));
        assertEquals(0, basis.rank());
    }

    @ParameterizedTest
    @ValueSource(ints = {0, -1, 64})
    void otherWidthsAreRefused(int width) {
        assertThrows(IllegalArgumentException.class, () -> new EchelonBasis(width));
    }

    @Test
    void aWordThatDoesNotFitIsRefused() {
        EchelonBasis basis = new EchelonBasis(4);
        assertThrows(IllegalArgumentException.class, () -> basis.add(16));
        assertThrows(IllegalArgumentException.class, () -> basis.reduce(-1));
    }
}
