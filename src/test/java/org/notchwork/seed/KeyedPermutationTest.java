package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.BitSet;
import java.util.HashSet;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Streams;

class KeyedPermutationTest {

    static IntStream widths() {
        return IntStream.rangeClosed(1, 14);
    }

    @ParameterizedTest
    @MethodSource("widths")
    void everyWordIsTheImageOfExactlyOne(int width) {
        for (int key = 0; key < 20; key++) {
            KeyedPermutation permutation = KeyedPermutation.draw(width, Streams.numbered("bijective", key));
            BitSet images = new BitSet();
            for (long x = 0; x < 1L << width; x++) {
                int image = Math.toIntExact(permutation.apply(x));
                assertFalse(images.get(image));
                images.set(image);
            }
            assertEquals(1 << width, images.cardinality());
        }
    }

    @ParameterizedTest
    @CsvSource({"1, 96", "8, 96", "9, 30", "32, 30", "63, 30"})
    void theKeyTakesThreeWordsARound(int width, int count) {
        RandomStream drawn = Streams.named("key");
        RandomStream words = Streams.named("key");
        KeyedPermutation.draw(width, drawn);
        for (int i = 0; i < count; i++) {
            words.nextLong();
        }
        assertEquals(words.nextLong(), drawn.nextLong());
    }

    /** The naive twin: the steps of the description, one after the other. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5, 8, 9, 12, 31, 62, 63})
    void theImageFollowsTheDescription(int width) {
        long mask = (1L << width) - 1;
        KeyedPermutation permutation = KeyedPermutation.draw(width, Streams.numbered("steps", width));
        RandomStream keys = Streams.numbered("steps", width);
        RandomStream points = Streams.named("points");
        long[] x = new long[50];
        long[] images = new long[x.length];
        for (int i = 0; i < x.length; i++) {
            x[i] = points.bits(width);
            images[i] = permutation.apply(x[i]);
        }
        for (int round = 0; round < (width <= 8 ? 32 : 10); round++) {
            long k = keys.bits(width);
            long m = keys.bits(width) | 1;
            long a = keys.bits(width);
            for (int i = 0; i < x.length; i++) {
                x[i] ^= k;
                x[i] = (x[i] * m) & mask;
                x[i] ^= x[i] >>> ((width + 1) / 2);
                x[i] = (x[i] + a) & mask;
            }
        }
        for (int i = 0; i < x.length; i++) {
            assertEquals(x[i], images[i]);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8})
    void theImageOfAPointIsEveryWordEquallyOften(int width) {
        for (long point : new long[] {0, 1, (1L << width) - 1}) {
            long[] counts = new long[1 << width];
            for (int key = 0; key < 20_000; key++) {
                counts[
                        (int) KeyedPermutation.draw(width, Streams.numbered("image " + width, key))
                                .apply(point)]++;
            }
            ChiSquared.even(counts).assertFits();
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {4, 6, 8})
    void theSumOfTwoImagesIsEveryNonZeroWordEquallyOften(int width) {
        for (long other : new long[] {1, 2, 1L << (width - 1), (1L << width) - 1}) {
            long[] counts = new long[(1 << width) - 1];
            for (int key = 0; key < 20_000; key++) {
                KeyedPermutation permutation = KeyedPermutation.draw(width, Streams.numbered("sum " + width, key));
                counts[(int) (permutation.apply(0) ^ permutation.apply(other)) - 1]++;
            }
            ChiSquared.even(counts).assertFits();
        }
    }

    /** Each of the 4! permutations of two-bit words and of the 8! of three-bit words is drawn equally often. */
    @ParameterizedTest
    @CsvSource({"2, 24000", "3, 403200"})
    void everyPermutationOfFewWordsIsDrawnEquallyOften(int width, int keys) {
        int size = 1 << width;
        long[] counts = new long[IntStream.rangeClosed(1, size).reduce(1, (a, b) -> a * b)];
        RandomStream stream = Streams.numbered("whole", width);
        for (int key = 0; key < keys; key++) {
            KeyedPermutation permutation = KeyedPermutation.draw(width, stream);
            counts[
                    rank(IntStream.range(0, size)
                            .map(x -> (int) permutation.apply(x))
                            .toArray())]++;
        }
        ChiSquared.even(counts).assertFits();
    }

    /** The place of a permutation in the order of the dictionary (D. H. Lehmer, 1960): its inversions as digits. */
    private static int rank(int[] images) {
        int rank = 0;
        for (int i = 0; i < images.length; i++) {
            int smaller = 0;
            for (int j = i + 1; j < images.length; j++) {
                smaller += images[j] < images[i] ? 1 : 0;
            }
            rank = rank * (images.length - i) + smaller;
        }
        return rank;
    }

    /**
     * Of a random permutation the images of four words whose sum is 0 sum to 0 with probability 1/(2^n − 3): given
     * three images, their sum is one of the 2^n − 3 words left. Six standard deviations of the binomial law.
     */
    @ParameterizedTest
    @ValueSource(ints = {3, 4, 5, 6, 7, 8, 9, 10})
    void fourImagesSumToZeroAsOftenAsThoseOfARandomPermutation(int width) {
        int keys = 200_000;
        long high = 1L << (width - 1);
        long middle = 1L << (width / 2);
        for (long[] pair : new long[][] {{1, 2}, {1, high}, {2, high}, {middle, high}, {1, middle}}) {
            RandomStream stream = Streams.numbered("four " + pair[0] + " " + pair[1], width);
            int zeros = 0;
            for (int key = 0; key < keys; key++) {
                KeyedPermutation permutation = KeyedPermutation.draw(width, stream);
                long sum = permutation.apply(0)
                        ^ permutation.apply(pair[0])
                        ^ permutation.apply(pair[1])
                        ^ permutation.apply(pair[0] ^ pair[1]);
                zeros += sum == 0 ? 1 : 0;
            }
            double p = 1.0 / ((1 << width) - 3);
            assertEquals(keys * p, zeros, 6 * Math.sqrt(keys * p * (1 - p)), pair[0] + " and " + pair[1]);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {20, 40, 63})
    void imagesAtLargeWidthsAreDifferent(int width) {
        KeyedPermutation permutation = KeyedPermutation.draw(width, Streams.numbered("wide", width));
        Set<Long> images = new HashSet<>();
        for (long x = 0; x < 10_000; x++) {
            long image = permutation.apply(x);
            assertEquals(0, image >>> width);
            images.add(image);
        }
        assertEquals(10_000, images.size());
    }
}
