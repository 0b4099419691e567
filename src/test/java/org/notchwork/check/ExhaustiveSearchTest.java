package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.function.LongUnaryOperator;
import org.junit.jupiter.api.Test;
import org.notchwork.problem.BitFunction;

/** Search on functions small enough to be judged by eye. */
class ExhaustiveSearchTest {

    @Test
    void everyPeriodOfTheLeastOfPairIsFound() {
        for (long s = 1; s < 64; s++) {
            long period = s;
            assertEquals(
                    new ExhaustiveSearch.Found.Period(s),
                    ExhaustiveSearch.search(function(6, 6, x -> Math.min(x, x ^ period))));
        }
    }

    @Test
    void anInjectiveFunctionIsBrokenAtAnInputThatStandsAlone() {
        ExhaustiveSearch.Found.Broken broken = broken(function(3, 3, x -> 7 - x));
        assertEquals(broken.x(), broken.y());
    }

    @Test
    void aThirdInputOfOneValueIsNamed() {
        // 0, 1 and 2 share a value.
        assertEquals(
                new ExhaustiveSearch.Found.Broken(0, 2, "a third input has the value 0"),
                broken(function(2, 2, x -> x == 3 ? 1 : 0)));
    }

    @Test
    void pairsWithTwoSumsAreNamed() {
        // 0 and 1 differ by 1, 2 and 3 by 1, 4 and 6 by 2, 5 and 7 by 2.
        long[] values = {0, 0, 1, 1, 2, 3, 2, 3};
        ExhaustiveSearch.Found.Broken broken = broken(function(3, 2, x -> values[(int) x]));
        assertEquals(2, broken.x() ^ broken.y());
        assertEquals("they differ by 2, others by 1", broken.why());
    }

    @Test
    void aValueWithTooManyBitsIsABrokenPromiseAndNotACrash() {
        assertEquals(
                "the value 4 has too many bits",
                broken(function(2, 2, x -> 4 + x)).why());
        assertEquals(
                "the value -1 has too many bits",
                broken(function(2, 2, x -> -1)).why());
    }

    @Test
    void aDomainThatCannotBeSearchedIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> ExhaustiveSearch.search(function(21, 4, x -> 0)));
        assertThrows(IllegalArgumentException.class, () -> ExhaustiveSearch.search(function(4, 40, x -> 0)));
    }

    private static ExhaustiveSearch.Found.Broken broken(BitFunction function) {
        return assertInstanceOf(ExhaustiveSearch.Found.Broken.class, ExhaustiveSearch.search(function));
    }

    private static BitFunction function(int width, int valueWidth, LongUnaryOperator values) {
        return new BitFunction() {
            @Override
            public int width() {
                return width;
            }

            @Override
            public int valueWidth() {
                return valueWidth;
            }

            @Override
            public long at(long x) {
                return values.applyAsLong(x);
            }
        };
    }
}
