package org.notchwork.seed;

import java.util.Arrays;
import org.apache.commons.rng.core.source64.Philox4x64;

/**
 * A stream of random 64-bit words and the exact draws made from it.
 *
 * <p>Words come from Philox4x64-10 (J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw, Parallel random numbers: as
 * easy as 1, 2, 3, SC 2011). Every draw uses whole words from the front and throws unused bits away, so that the
 * rules fit on a page. Not for use by several threads.
 */
public final class RandomStream {

    private final Philox4x64 source;

    /**
     * Starts a stream.
     *
     * @param state two key words, then four counter words, lowest first
     */
    RandomStream(long[] state) {
        this.source = new Philox4x64(state);
    }

    /** Returns the next word. */
    public long nextLong() {
        return source.next();
    }

    /**
     * Returns {@code count} random bits as a number below 2^count: the low bits of the next word.
     *
     * @param count 1 to 63
     */
    public long bits(int count) {
        if (count < 1 || count > 63) {
            throw new IllegalArgumentException(count + " is not a number of bits from 1 to 63");
        }
        return source.next() & ((1L << count) - 1);
    }

    /** Returns {@code count} random bits that are not all 0: {@link #bits} again until one is set. */
    public long nonZeroBits(int count) {
        long word;
        do {
            word = bits(count);
        } while (word == 0);
        return word;
    }

    /**
     * Returns a number below the bound, each equally likely.
     *
     * <p>The low k bits of the next word, k being the length of bound − 1 in bits, again until they are below the
     * bound. A bound of 1 uses no word.
     *
     * @param bound at least 1
     */
    public long below(long bound) {
        if (bound < 1) {
            throw new IllegalArgumentException("bound " + bound + " is below 1");
        }
        if (bound == 1) {
            return 0;
        }
        int length = 64 - Long.numberOfLeadingZeros(bound - 1);
        long number;
        do {
            number = bits(length);
        } while (number >= bound);
        return number;
    }

    /**
     * Draws {@code count} different numbers below {@code size}, every sequence equally likely.
     *
     * <p>The first steps of the shuffle of R. A. Fisher and F. Yates (1938), in the form of R. Durstenfeld
     * (CACM 7 (1964)): for i = 0, 1, … swap item i with item i + below(size − i).
     *
     * @return the first {@code count} items of the shuffled list 0, 1, …, size − 1
     */
    public int[] distinct(int count, int size) {
        int[] items = new int[size];
        for (int i = 0; i < size; i++) {
            items[i] = i;
        }
        for (int i = 0; i < count; i++) {
            int j = i + (int) below(size - i);
            int swapped = items[i];
            items[i] = items[j];
            items[j] = swapped;
        }
        return Arrays.copyOf(items, count);
    }
}
