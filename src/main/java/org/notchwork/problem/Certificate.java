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

    /**
     * Pairs of points with one value each; their sums span the subspace. Checked by two evaluations a pair and a rank.
     *
     * @param pairs as many as the subspace has dimensions
     */
    record Collisions(List<Pair> pairs) implements Certificate {

        /** Copies the pairs. */
        public Collisions {
            pairs = List.copyOf(pairs);
        }
    }

    /**
     * Independent words orthogonal to a subspace, and pairs that confirm a basis of it. Checked by rank, inner products
     * and two evaluations a pair.
     *
     * @param words n − k independent words of n bits, in the order in which they were found
     * @param confirmations 0 and each word of the basis with their values
     */
    record Annihilators(List<Word> words, List<Pair> confirmations) implements Certificate {

        /** Copies both lists. */
        public Annihilators {
            words = List.copyOf(words);
            confirmations = List.copyOf(confirmations);
        }
    }

    /**
     * Words that were measured and span everything, so that no word but 0 is orthogonal to all of them. Only the rank
     * can be checked: that the words were measured has to be re-run.
     *
     * @param words n independent words of n bits, in the order in which they were found
     */
    record Spanning(List<Word> words) implements Certificate {

        /** Copies the words. */
        public Spanning {
            words = List.copyOf(words);
        }
    }

    /**
     * Two points with different values. Checked by two evaluations.
     *
     * @param pair the two points
     */
    record Difference(Pair pair) implements Certificate {}

    /**
     * Nothing that a few evaluations could check.
     *
     * @param basis what the answer rests on, in a few words
     */
    record Absent(String basis) implements Certificate {}
}
