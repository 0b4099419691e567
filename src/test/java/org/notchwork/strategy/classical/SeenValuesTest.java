package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class SeenValuesTest {

    /** The naive twin is a map. */
    @ParameterizedTest
    @ValueSource(ints = {1, 3, 8, 13, 40, 63})
    void theFirstPointOfEveryValueIsKept(int width) {
        RandomStream stream = Streams.numbered("seen", width);
        SeenValues seen = new SeenValues();
        Map<Long, Long> map = new HashMap<>();
        for (long point = 0; point < 10_000; point++) {
            long value = stream.bits(width);
            Long earlier = map.putIfAbsent(value, point);
            assertEquals(earlier == null ? SeenValues.NONE : earlier, seen.noteOrFind(value, point));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {0, Long.MAX_VALUE, Long.MAX_VALUE - 1})
    void extremeValuesAreKept(long value) {
        SeenValues seen = new SeenValues();
        assertEquals(SeenValues.NONE, seen.noteOrFind(value, 5));
        assertEquals(5, seen.noteOrFind(value, 6));
    }

    @ParameterizedTest
    @ValueSource(ints = {9, 10, 19, 20, 1000})
    void theTableDoublesAtThreeFifths(int values) {
        SeenValues seen = new SeenValues();
        for (int i = 0; i < values; i++) {
            seen.noteOrFind(i, i);
        }
        long slots = 16;
        while (5L * values > 3 * slots) {
            slots *= 2;
        }
        assertEquals(2 * slots, seen.memoryWords());
    }

    /** At the moment of growth the old table of half the size is held as well. */
    @ParameterizedTest
    @ValueSource(ints = {1, 9, 10, 19, 20, 39, 1000, 4915, 4916, 100_000})
    void theForecastCoversTheFullestMoment(int values) {
        SeenValues seen = new SeenValues();
        for (int i = 0; i < values; i++) {
            seen.noteOrFind(i, i);
        }
        long held = 8 * seen.memoryWords();
        long fullest = held + (seen.memoryWords() > 32 ? held / 2 : 0);
        assertTrue(SeenValues.bytes(values) >= fullest, () -> SeenValues.bytes(values) + " < " + fullest);
        assertTrue(SeenValues.bytes(values) <= 4 * fullest, () -> SeenValues.bytes(values) + " > 4 * " + fullest);
    }

    @Test
    void theForecastOfTheLargestCountIsANumber() {
        assertTrue(SeenValues.bytes(Long.MAX_VALUE) > 0);
        assertTrue(new RandomDraws().memoryBytes(63, Long.MAX_VALUE) > 0);
        assertTrue(new SequentialScan().memoryBytes(63, Long.MAX_VALUE) > 0);
        assertTrue(new DifferenceCover().memoryBytes(63, Long.MAX_VALUE) > 0);
    }
}
