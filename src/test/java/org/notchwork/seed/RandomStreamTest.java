package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Streams;

class RandomStreamTest {

    @ParameterizedTest
    @ValueSource(ints = {1, 7, 32, 62, 63})
    void bitsAreTheLowBitsOfOneWord(int count) {
        RandomStream bits = Streams.named("bits");
        RandomStream words = Streams.named("bits");
        for (int i = 0; i < 100; i++) {
            BigInteger word = BigInteger.valueOf(words.nextLong());
            assertEquals(word.mod(BigInteger.ONE.shiftLeft(count)).longValueExact(), bits.bits(count));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, -1, 64})
    void otherCountsOfBitsAreRefused(int count) {
        assertThrows(IllegalArgumentException.class, () -> Streams.named("bits").bits(count));
    }

    @Test
    void nonZeroBitsSkipTheWordsWithoutBits() {
        RandomStream nonZero = Streams.named("non-zero");
        RandomStream words = Streams.named("non-zero");
        int skipped = 0;
        for (int i = 0; i < 1000; i++) {
            long word = words.bits(2);
            while (word == 0) {
                skipped++;
                word = words.bits(2);
            }
            assertEquals(word, nonZero.nonZeroBits(2));
        }
        assertTrue(skipped > 250 && skipped < 420, () -> "a third of 1000 is expected");
    }

    @ParameterizedTest
    @ValueSource(longs = {2, 3, 4, 5, 7, 8, 9, 1000, 1L << 32, (1L << 32) + 1, (1L << 62) + 1, Long.MAX_VALUE})
    void belowTakesTheFirstNumberThatIsBelow(long bound) {
        RandomStream below = Streams.named("below");
        RandomStream words = Streams.named("below");
        int length = BigInteger.valueOf(bound - 1).bitLength();
        for (int i = 0; i < 200; i++) {
            long expected = words.bits(length);
            while (expected >= bound) {
                expected = words.bits(length);
            }
            assertEquals(expected, below.below(bound));
        }
        assertEquals(words.nextLong(), below.nextLong());
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 6, 7, 10, 13, 16, 17, 100})
    void numbersBelowABoundAreEquallyLikely(int bound) {
        RandomStream stream = Streams.numbered("even", bound);
        long[] counts = new long[bound];
        for (int i = 0; i < 20_000; i++) {
            counts[(int) stream.below(bound)]++;
        }
        ChiSquared.even(counts).assertFits();
    }

    @Test
    void belowOneUsesNoWord() {
        RandomStream stream = Streams.named("one");
        assertEquals(0, stream.below(1));
        assertEquals(Streams.named("one").nextLong(), stream.nextLong());
        assertThrows(IllegalArgumentException.class, () -> stream.below(0));
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 8, 33, 256})
    void distinctNumbersAreThePrefixOfAPermutation(int size) {
        int[] all = Streams.named("distinct").distinct(size, size);
        assertArrayEquals(
                IntStream.range(0, size).toArray(), Arrays.stream(all).sorted().toArray());
        for (int count = 0; count <= size; count++) {
            assertArrayEquals(
                    Arrays.copyOf(all, count), Streams.named("distinct").distinct(count, size));
        }
    }

    @Test
    void allOrdersOfFourAreEquallyLikely() {
        RandomStream stream = Streams.named("orders");
        long[] counts = new long[256];
        for (int i = 0; i < 24_000; i++) {
            int[] order = stream.distinct(4, 4);
            counts[order[0] * 64 + order[1] * 16 + order[2] * 4 + order[3]]++;
        }
        double[] weights = new double[256];
        for (int i = 0; i < 256; i++) {
            weights[i] = IntStream.of(i / 64, i / 16 % 4, i / 4 % 4, i % 4)
                                    .distinct()
                                    .count()
                            == 4
                    ? 1
                    : 0;
        }
        ChiSquared.of(counts, weights).assertFits();
    }
}
