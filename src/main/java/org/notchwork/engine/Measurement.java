package org.notchwork.engine;

import org.notchwork.seed.RandomStream;

/** Draws words from exact integer weights: cumulated sums, one exact draw below the total, a binary search. */
public final class Measurement {

    private final long[] cumulated;

    /**
     * Prepares to draw.
     *
     * @param weights one non-negative weight a word; their sum is above 0 and below 2^63
     */
    public Measurement(long[] weights) {
        this.cumulated = new long[weights.length];
        long sum = 0;
        for (int y = 0; y < weights.length; y++) {
            sum = Math.addExact(sum, weights[y]);
            cumulated[y] = sum;
        }
    }

    /** Returns a word with probability weight / total, from {@code below(total)} of the stream. */
    public long draw(RandomStream stream) {
        long target = stream.below(cumulated[cumulated.length - 1]);
        int low = 0;
        int high = cumulated.length - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (cumulated[middle] > target) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return low;
    }
}
