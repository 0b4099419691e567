package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.apache.commons.codec.binary.Hex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.ValueSource;

class SeedTreeTest {

    private final SeedTree seeds = new SeedTree(new Seed("a seed for the tests of streams"));

    /** Computed from the rules of the format page by a program in another language with its own Philox and SHA-256. */
    @ParameterizedTest
    @CsvFileSource(resources = "/seed-vectors.tsv", delimiter = '\t', numLinesToSkip = 1, quoteCharacter = '\u0001')
    void addressesGiveTheKeysAndWordsOfTheFormatPage(
            String seed, String experiment, int width, long trial, String role, String key, String words) {
        SeedTree tree = new SeedTree(new Seed(seed));
        Address address = new Address(experiment, width, trial, role);
        assertEquals(key, Hex.encodeHexString(tree.key(address)));
        RandomStream stream = tree.stream(address);
        for (String word : words.split(" ", -1)) {
            assertEquals(Long.parseUnsignedLong(word, 16), stream.nextLong());
        }
    }

    @Test
    void everyPartOfAnAddressMatters() {
        long first = seeds.stream(new Address("e", 3, 4, "r")).nextLong();
        assertNotEquals(first, seeds.stream(new Address("f", 3, 4, "r")).nextLong());
        assertNotEquals(first, seeds.stream(new Address("e", 4, 4, "r")).nextLong());
        assertNotEquals(first, seeds.stream(new Address("e", 3, 5, "r")).nextLong());
        assertNotEquals(first, seeds.stream(new Address("e", 3, 4, "s")).nextLong());
        assertEquals(first, seeds.stream(new Address("e", 3, 4, "r")).nextLong());
    }

    @Test
    void drawsBelowABoundAreTheLowBitsThatAreBelowIt() {
        for (long bound : new long[] {1, 2, 3, 5, 8, 100, (1L << 62) + 1}) {
            RandomStream drawn = stream(bound & 0xffff);
            RandomStream naive = stream(bound & 0xffff);
            for (int i = 0; i < 200; i++) {
                long expected = 0;
                if (bound > 1) {
                    long mask = Long.highestOneBit(bound - 1) * 2 - 1;
                    do {
                        expected = naive.nextLong() & mask;
                    } while (expected >= bound);
                }
                assertEquals(expected, drawn.below(bound));
            }
        }
        assertThrows(IllegalArgumentException.class, () -> stream(0).below(0));
    }

    /** Chi-squared with 9 degrees of freedom stays below 33.72, its 0.9999 quantile (tables of the distribution). */
    @Test
    void drawsBelowTenAreEven() {
        long[] counts = new long[10];
        RandomStream stream = stream(10);
        for (int i = 0; i < 100_000; i++) {
            counts[(int) stream.below(10)]++;
        }
        double statistic = Arrays.stream(counts)
                .mapToDouble(c -> (c - 10_000.0) * (c - 10_000.0) / 10_000.0)
                .sum();
        assertTrue(statistic < 33.72, () -> Arrays.toString(counts));
    }

    @Test
    void distinctDrawsAreTheBeginningOfAPermutation() {
        for (int size = 1; size <= 40; size++) {
            int[] all = stream(size).distinct(size, size);
            assertArrayEquals(
                    IntStream.range(0, size).toArray(),
                    Arrays.stream(all).sorted().toArray());
            assertArrayEquals(Arrays.copyOf(all, size / 2), stream(size).distinct(size / 2, size));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16})
    void aKeyedPermutationTakesEveryWordOnce(int width) {
        for (int key = 0; key < 5; key++) {
            KeyedPermutation permutation = KeyedPermutation.draw(width, stream(100L * width + key));
            boolean[] seen = new boolean[1 << width];
            for (int x = 0; x < seen.length; x++) {
                int image = (int) permutation.apply(x);
                assertTrue(!seen[image]);
                seen[image] = true;
            }
        }
    }

    /** Flipping one input bit flips each output bit in about half of the cases, at the widest word. */
    @Test
    void aKeyedPermutationSpreadsEveryBitAtTheWidestWord() {
        int samples = 400;
        for (int in = 0; in < 63; in++) {
            int[] flips = new int[63];
            for (int i = 0; i < samples; i++) {
                RandomStream stream = stream(1000L * in + i);
                KeyedPermutation permutation = KeyedPermutation.draw(63, stream);
                long x = stream.bits(63);
                long change = permutation.apply(x) ^ permutation.apply(x ^ 1L << in);
                for (int out = 0; out < 63; out++) {
                    flips[out] += (int) (change >>> out & 1);
                }
            }
            for (int out = 0; out < 63; out++) {
                // Binomial(400, 1/2) has standard deviation 10; seven of them.
                assertEquals(200, flips[out], 70, "input bit " + in + ", output bit " + out);
            }
        }
    }

    @Test
    void aSeedIsPrintableAndNotShort() {
        assertThrows(IllegalArgumentException.class, () -> new Seed("fifteen letters"));
        assertThrows(IllegalArgumentException.class, () -> new Seed("sixteen letters\n"));
        assertEquals(16, new Seed("sixteen letters!").text().length());
    }

    private RandomStream stream(long trial) {
        return seeds.stream(new Address("draws", 1, trial, "test"));
    }
}
