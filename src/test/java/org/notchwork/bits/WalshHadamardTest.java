package org.notchwork.bits;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class WalshHadamardTest {

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 3, 6, 9})
    void theTransformIsTheSumOverAllPoints(int width) {
        long[] a = numbers(width);
        long[] expected = new long[a.length];
        for (int y = 0; y < a.length; y++) {
            for (int x = 0; x < a.length; x++) {
                expected[y] += (Integer.bitCount(x & y) & 1) == 0 ? a[x] : -a[x];
            }
        }
        WalshHadamard.transform(a);
        assertArrayEquals(expected, a);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 4, 10, 16})
    void twiceMultipliesByTheLength(int width) {
        long[] a = numbers(width);
        long[] expected = Arrays.stream(a).map(v -> v << width).toArray();
        WalshHadamard.transform(a);
        WalshHadamard.transform(a);
        assertArrayEquals(expected, a);
    }

    @Test
    void aPointBecomesItsCharacter() {
        long[] a = {0, 0, 0, 1};
        WalshHadamard.transform(a);
        assertArrayEquals(new long[] {1, -1, -1, 1}, a);
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 3, 6, 12})
    void lengthsThatAreNoPowerOfTwoAreRefused(int length) {
        assertThrows(IllegalArgumentException.class, () -> WalshHadamard.transform(new long[length]));
    }

    private static long[] numbers(int width) {
        RandomStream stream = Streams.numbered("transform", width);
        long[] a = new long[1 << width];
        for (int i = 0; i < a.length; i++) {
            a[i] = stream.bits(20) - (1 << 19);
        }
        return a;
    }
}
