package org.notchwork.bits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class WideBasisTest {

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 7, 8, 9, 31, 32, 33, 62, 63})
    void upToSixtyThreeBitsItIsTheNarrowBasis(int width) {
        for (int round = 0; round < 20; round++) {
            RandomStream stream = Streams.numbered("wide basis " + width, round);
            EchelonBasis narrow = new EchelonBasis(width);
            WideBasis wide = new WideBasis(width);
            for (int i = 0; i < width + 2; i++) {
                long mask = stream.bits(width);
                long word = stream.bits(width) & mask;
                assertEquals(narrow.add(word), wide.add(BigInteger.valueOf(word)));
                assertEquals(narrow.rank(), wide.rank());
                assertEquals(rows(narrow, width), wide.rows());
                assertEquals(words(narrow.complement()), wide.complement());
                long other = stream.bits(width);
                assertEquals(BigInteger.valueOf(narrow.reduce(other)), wide.reduce(BigInteger.valueOf(other)));
                assertEquals(narrow.reduce(other) == 0, wide.contains(BigInteger.valueOf(other)));
            }
        }
    }

    private static List<BigInteger> rows(EchelonBasis basis, int width) {
        return words(IntStream.range(0, width)
                .mapToLong(basis::row)
                .filter(row -> row != 0)
                .toArray());
    }

    private static List<BigInteger> words(long[] words) {
        return LongStream.of(words).mapToObj(BigInteger::valueOf).toList();
    }

    @ParameterizedTest
    @ValueSource(ints = {64, 65, 127, 128, 129, 300})
    void wideWordsReduceByTheDefinitionOfTheReducedForm(int width) {
        RandomStream stream = Streams.numbered("wide words", width);
        WideBasis basis = new WideBasis(width);
        BigInteger sum = BigInteger.ZERO;
        for (int i = 0; i < width / 2; i++) {
            BigInteger word = random(width, stream);
            basis.add(word);
            sum = sum.xor(stream.bits(1) == 0 ? word : BigInteger.ZERO);
        }
        assertTrue(basis.contains(sum));
        assertFalse(basis.add(sum));
        List<BigInteger> rows = basis.rows();
        assertEquals(basis.rank(), rows.size());
        for (int i = 0; i < rows.size(); i++) {
            int lead = rows.get(i).bitLength() - 1;
            assertTrue(i == 0 || lead >= rows.get(i - 1).bitLength());
            assertEquals(1, rows.stream().filter(row -> row.testBit(lead)).count());
        }
        BigInteger word = random(width, stream);
        BigInteger rest = basis.reduce(word);
        assertTrue(basis.contains(word.xor(rest)));
        assertTrue(rows.stream().noneMatch(row -> rest.testBit(row.bitLength() - 1)));
    }

    @ParameterizedTest
    @ValueSource(ints = {64, 65, 127, 128, 129, 300})
    void theComplementIsOrthogonalIndependentAndReducedFromTheLowEnd(int width) {
        RandomStream stream = Streams.numbered("wide complement", width);
        WideBasis basis = new WideBasis(width);
        for (int i = 0; i < width - width / 3; i++) {
            basis.add(random(width, stream));
        }
        List<BigInteger> complement = basis.complement();
        assertEquals(width - basis.rank(), complement.size());
        for (BigInteger word : complement) {
            assertTrue(basis.rows().stream().allMatch(row -> row.and(word).bitCount() % 2 == 0));
            int lowest = word.getLowestSetBit();
            assertEquals(1, complement.stream().filter(w -> w.testBit(lowest)).count());
        }
        WideBasis back = new WideBasis(width);
        complement.forEach(word -> assertTrue(back.add(word)));
        WideBasis again = new WideBasis(width);
        back.complement().forEach(again::add);
        assertEquals(basis.rows(), again.rows(), "the complement of the complement is the span");
    }

    @Test
    void combinationsAreTheSumsOfTheChosenRows() {
        RandomStream stream = Streams.named("wide combinations");
        WideBasis basis = new WideBasis(200);
        for (int i = 0; i < 70; i++) {
            basis.add(random(200, stream));
        }
        BigInteger chosen = random(basis.rank(), stream);
        BigInteger sum = BigInteger.ZERO;
        for (int i = 0; i < basis.rank(); i++) {
            sum = chosen.testBit(i) ? sum.xor(basis.rows().get(i)) : sum;
        }
        assertEquals(sum, basis.combination(chosen));
        assertEquals(BigInteger.ZERO, basis.combination(BigInteger.ZERO));
        BigInteger tooMany = BigInteger.ONE.shiftLeft(basis.rank());
        assertThrows(IllegalArgumentException.class, () -> basis.combination(tooMany));
    }

    @Test
    void rowsDoNotDependOnTheOrderOfAdding() {
        RandomStream stream = Streams.named("wide order");
        BigInteger[] words = new BigInteger[60];
        Arrays.setAll(words, i -> random(130, stream));
        WideBasis forwards = new WideBasis(130);
        WideBasis backwards = new WideBasis(130);
        for (int i = 0; i < words.length; i++) {
            forwards.add(words[i]);
            backwards.add(words[words.length - 1 - i]);
        }
        assertEquals(forwards.rows(), backwards.rows());
        assertEquals(forwards.complement(), backwards.complement());
    }

    @Test
    void theHighestBitOfTheLargestWidthHasItsPlace() {
        WideBasis basis = new WideBasis(WideBasis.MOST_BITS);
        BigInteger top = BigInteger.ONE.shiftLeft(WideBasis.MOST_BITS - 1);
        BigInteger all = BigInteger.ONE.shiftLeft(WideBasis.MOST_BITS).subtract(BigInteger.ONE);
        assertTrue(basis.add(all));
        assertTrue(basis.add(top));
        assertEquals(List.of(all.xor(top), top), basis.rows());
    }

    @ParameterizedTest
    @ValueSource(ints = {0, -1, 8193})
    void otherWidthsAreRefused(int width) {
        assertThrows(IllegalArgumentException.class, () -> new WideBasis(width));
    }

    @Test
    void aWordThatDoesNotFitIsRefused() {
        WideBasis basis = new WideBasis(64);
        BigInteger long65 = BigInteger.ONE.shiftLeft(64);
        BigInteger negative = BigInteger.ONE.negate();
        assertThrows(IllegalArgumentException.class, () -> basis.add(long65));
        assertThrows(IllegalArgumentException.class, () -> basis.reduce(long65));
        assertThrows(IllegalArgumentException.class, () -> basis.contains(negative));
    }

    private static BigInteger random(int width, RandomStream stream) {
        BigInteger word = BigInteger.ZERO;
        for (int from = 0; from < width; from += 63) {
            long bits = stream.bits(Math.min(63, width - from));
            word = word.or(BigInteger.valueOf(bits).shiftLeft(from));
        }
        return word;
    }
}
