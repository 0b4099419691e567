package org.notchwork.check;

import java.util.Arrays;
import org.notchwork.problem.BitFunction;

/**
 * Finds the period of a function by looking at its whole domain, or two inputs that break the promise.
 *
 * <p>Written apart from the strategies: it asks every point once, files points by value and demands that every value
 * has exactly two points and that all pairs have one sum. Width and values of at most 20 bits.
 */
public final class ExhaustiveSearch {

    private static final int NOWHERE = -1;
    private static final int MOST_BITS = 20;

    private ExhaustiveSearch() {}

    /** What the search found. A closed set. */
    public sealed interface Found {

        /**
         * The promise holds on the whole domain.
         *
         * @param s the period
         */
        record Period(long s) implements Found {}

        /**
         * The promise is broken.
         *
         * @param x an input
         * @param y another input, or the same where an input stands alone
         * @param why how the two break it
         */
        record Broken(long x, long y, String why) implements Found {}
    }

    /** Searches the whole domain. */
    public static Found search(BitFunction function) {
        if (function.width() > MOST_BITS || function.valueWidth() > MOST_BITS) {
            throw new IllegalArgumentException(
                    "a search of " + function.width() + " bits with values of " + function.valueWidth());
        }
        int size = 1 << function.width();
        int[] first = new int[1 << function.valueWidth()];
        int[] second = first.clone();
        Arrays.fill(first, NOWHERE);
        Arrays.fill(second, NOWHERE);
        for (int x = 0; x < size; x++) {
            long image = function.at(x);
            if (image < 0 || image >= first.length) {
                return new Found.Broken(x, x, "the value " + image + " has too many bits");
            }
            int value = (int) image;
            if (first[value] == NOWHERE) {
                first[value] = x;
            } else if (second[value] == NOWHERE) {
                second[value] = x;
            } else {
                return new Found.Broken(first[value], x, "a third input has the value " + value);
            }
        }
        return judge(first, second);
    }

    private static Found judge(int[] first, int[] second) {
        long period = 0;
        for (int value = 0; value < first.length; value++) {
            if (first[value] == NOWHERE) {
                continue;
            }
            if (second[value] == NOWHERE) {
                return new Found.Broken(first[value], first[value], "no other input has its value " + value);
            }
            long sum = first[value] ^ second[value];
            if (period != 0 && sum != period) {
                return new Found.Broken(first[value], second[value], "they differ by " + sum + ", others by " + period);
            }
            period = sum;
        }
        return new Found.Period(period);
    }
}
