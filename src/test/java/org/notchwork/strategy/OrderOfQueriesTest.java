package org.notchwork.strategy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Promise;
import org.notchwork.strategy.classical.DifferenceCover;
import org.notchwork.strategy.classical.RandomDraws;
import org.notchwork.strategy.classical.SequentialScan;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Recording;
import org.notchwork.support.Streams;

/** Where no two values are the same a strategy asks all its points, and ends without an answer. */
class OrderOfQueriesTest {

    static IntStream widths() {
        return IntStream.rangeClosed(2, 12);
    }

    private static List<Long> points(ClassicalStrategy strategy, int width, long number) {
        Recording function = new Recording(width);
        Oracle oracle = new Oracle(function, Promise.period(Promise.Labels.RANDOM), new Meter(1L << (width + 1)));
        assertInstanceOf(Attempt.Censored.class, strategy.attempt(oracle, Streams.numbered("order " + width, number)));
        return function.points();
    }

    @ParameterizedTest
    @MethodSource("widths")
    void everyNonZeroWordIsTheSumOfTwoPointsOfTheDifferenceCover(int width) {
        List<Long> points = points(new DifferenceCover(), width, 0);
        assertEquals((1 << (width / 2)) + (1 << ((width + 1) / 2)) - 1, points.size());
        Set<Long> sums = new HashSet<>();
        for (long x : points) {
            points.forEach(y -> sums.add(x ^ y));
        }
        assertEquals(1 << width, sums.size());
    }

    @ParameterizedTest
    @MethodSource("widths")
    void theScanAsksEveryPointInOrder(int width) {
        assertEquals(LongStream.range(0, 1L << width).boxed().toList(), points(new SequentialScan(), width, 0));
    }

    @ParameterizedTest
    @MethodSource("widths")
    void randomDrawsAskEveryPointOnce(int width) {
        List<Long> points = points(new RandomDraws(), width, 0);
        assertEquals(1 << width, points.size());
        assertEquals(1 << width, new HashSet<>(points).size());
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 7})
    void everyPointIsEquallyLikelyAtEveryDraw(int draw) {
        long[] counts = new long[8];
        for (int i = 0; i < 8_000; i++) {
            counts[points(new RandomDraws(), 3, i).get(draw).intValue()]++;
        }
        ChiSquared.even(counts).assertFits();
    }
}
