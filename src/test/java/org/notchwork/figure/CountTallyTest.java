package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class CountTallyTest {

    /** The naive twin: the sorted list, the least index with at least the wanted share at or before it. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 100, 1001})
    void figuresAreThoseOfTheSortedList(int size) {
        for (int number = 0; number < 10; number++) {
            RandomStream stream = Streams.numbered("tally " + size, number);
            CountTally tally = new CountTally();
            long[] list = new long[size];
            for (int i = 0; i < size; i++) {
                list[i] = stream.below(50);
                tally.add(list[i]);
            }
            Arrays.sort(list);
            assertEquals(size, tally.size());
            assertEquals(list[0], tally.min());
            assertEquals(list[size - 1], tally.max());
            for (int quarter = 1; quarter <= 3; quarter++) {
                assertEquals(list[(quarter * size + 3) / 4 - 1], tally.quartile(quarter));
            }
            assertEquals(Decimals.quotient(Arrays.stream(list).sum(), size), tally.mean());
            assertEquals(
                    variance(list).map(v -> Decimals.text(v, 40)),
                    tally.variance().map(v -> Decimals.text(v, 40)));
        }
    }

    private static Optional<BigDecimal> variance(long[] list) {
        if (list.length == 1) {
            return Optional.empty();
        }
        BigDecimal mean = Decimals.quotient(Arrays.stream(list).sum(), list.length);
        BigDecimal sum = BigDecimal.ZERO;
        for (long number : list) {
            sum = sum.add(BigDecimal.valueOf(number).subtract(mean).pow(2));
        }
        return Optional.of(sum.divide(BigDecimal.valueOf(list.length - 1L), Decimals.CONTEXT));
    }

    @Test
    void theVarianceOfHugeCountsIsExact() {
        CountTally tally = new CountTally();
        tally.add(Long.MAX_VALUE);
        tally.add(Long.MAX_VALUE - 2);
        assertEquals(0, tally.variance().orElseThrow().compareTo(BigDecimal.valueOf(2)));
        assertEquals(0, tally.mean().compareTo(BigDecimal.valueOf(Long.MAX_VALUE - 1)));
    }

    @Test
    void noNumbersHaveNoQuartile() {
        CountTally tally = new CountTally();
        assertThrows(IllegalStateException.class, () -> tally.quartile(2));
    }
}
