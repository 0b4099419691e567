package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.BitSet;
import java.util.HashSet;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
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
    @ValueSource(ints = {1, 32, 63})
    void theKeyTakes21WordsOfTheStream(int width) {
        RandomStream drawn = Streams.named("key");
        RandomStream words = Streams.named("key");
        KeyedPermutation.draw(width, drawn);
        for (int i = 0; i < 21; i++) {
            words.nextLong();
        }
        assertEquals(words.nextLong(), drawn.nextLong());
    }

    /** The naive twin: the steps of the description, one after the other. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5, 12, 31, 62, 63})
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
        for (int round = 0; round < 7; round++) {
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
