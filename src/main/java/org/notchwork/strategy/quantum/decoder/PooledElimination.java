package org.notchwork.strategy.quantum.decoder;

import java.util.Optional;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.seed.RandomStream;

/**
 * Draws n − 1 of the measured words again and again; where they are independent, the one word orthogonal to them is a
 * candidate, and the candidate orthogonal to the most measured words wins, the first among equals.
 *
 * <p>A draw hits n − 1 undisturbed independent words with probability (1 − τ)^(n−1) ∏(1 − 2^−i), τ being the chance that a
 * word is not orthogonal. The words of a draw are the first n − 1 of {@code distinct(n − 1, m)}.
 *
 * @param draws how many draws
 */
public record PooledElimination(int draws) implements Decoder {

    private static final int GREATEST = 63;

    @Override
    public String name() {
        return "pooled-elimination";
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 16L * width;
    }

    @Override
    public Optional<Long> decode(int width, long[] words, RandomStream stream) {
        if (words.length < width - 1) {
            return Optional.empty();
        }
        Optional<Long> best = Optional.empty();
        int bestScore = -1;
        for (int draw = 0; draw < draws; draw++) {
            EchelonBasis basis = new EchelonBasis(width);
            for (int i : stream.distinct(width - 1, words.length)) {
                basis.add(words[i]);
            }
            if (basis.rank() == width - 1) {
                long candidate = basis.complement()[0];
                int score = orthogonal(candidate, words);
                if (score > bestScore) {
                    best = Optional.of(candidate);
                    bestScore = score;
                }
            }
        }
        return best;
    }

    private static int orthogonal(long candidate, long[] words) {
        int count = 0;
        for (long word : words) {
            count += 1 - (Long.bitCount(word & candidate) & 1);
        }
        return count;
    }
}
