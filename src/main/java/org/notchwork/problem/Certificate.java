package org.notchwork.problem;

import java.util.List;
import org.notchwork.bits.Word;

/** What lets anybody check an answer without trusting the strategy that gave it. A closed set. */
public sealed interface Certificate {

    /**
     * Two points with one value; their sum is the period. Checked by two evaluations.
     *
     * @param pair the two points
     */
    record Collision(Pair pair) implements Certificate {}

    /**
     * Independent words orthogonal to the answer, and a pair that confirms it. Checked by rank, inner products and
     * two evaluations.
     *
     * @param words n − 1 independent words of n bits, in the order in which they were found
     * @param confirmation the points 0 and s with their values
     */
    record Equations(List<Word> words, Pair confirmation) implements Certificate {

        /** Copies the words. */
        public Equations {
            words = List.copyOf(words);
        }
    }
}
