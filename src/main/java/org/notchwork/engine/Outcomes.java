package org.notchwork.engine;

/** An exact distribution over words: P(y) = weight(y) / total. Immutable. */
public final class Outcomes {

    private final long[] weights;
    private final long total;

    /**
     * Creates a distribution.
     *
     * @param weights one non-negative weight a word, 2^width of them; their sum is above 0
     */
    public Outcomes(long[] weights) {
        this.weights = weights.clone();
        long sum = 0;
        for (long weight : weights) {
            if (weight < 0) {
                throw new IllegalArgumentException("a negative weight");
            }
            sum = Math.addExact(sum, weight);
        }
        if (sum == 0) {
            throw new IllegalArgumentException("all weights are 0");
        }
        this.total = sum;
    }

    /** Returns the number of words, 2^width. */
    public int size() {
        return weights.length;
    }

    /** Returns the weight of a word. */
    public long weight(int word) {
        return weights[word];
    }

    /** Returns the sum of all weights. */
    public long total() {
        return total;
    }

    /** Returns how many words have different probabilities in two distributions over words of one width. */
    public long differences(Outcomes other) {
        if (weights.length != other.weights.length) {
            throw new IllegalArgumentException("distributions over words of different widths");
        }
        long differences = 0;
        for (int y = 0; y < weights.length; y++) {
            if (Math.multiplyExact(weights[y], other.total) != Math.multiplyExact(other.weights[y], total)) {
                differences++;
            }
        }
        return differences;
    }
}
