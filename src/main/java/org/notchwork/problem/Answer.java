package org.notchwork.problem;

import java.util.List;
import org.notchwork.bits.Word;

/** What a strategy may answer, and what an instance hides. A closed set: a new question adds a case here. */
public sealed interface Answer {

    /**
     * The function has this period: f(x) = f(x ⊕ s).
     *
     * @param s the period, not 0
     */
    record Period(Word s) implements Answer {

        /** Checks that the period is not 0. */
        public Period {
            if (s.isZero()) {
                throw new IllegalArgumentException("a period is not 0");
            }
        }
    }

    /** The function has no period. */
    record NoPeriod() implements Answer {}

    /**
     * The function is constant exactly on the cosets of this subspace.
     *
     * @param basis its basis in reduced echelon form, leading bits descending; not empty
     */
    record Subspace(List<Word> basis) implements Answer {

        /** Copies the basis and checks its form, so that equal subspaces are equal answers. */
        public Subspace {
            basis = List.copyOf(basis);
            if (basis.isEmpty()) {
                throw new IllegalArgumentException("a subspace without a basis");
            }
            for (int i = 0; i < basis.size(); i++) {
                requireReduced(basis, i);
            }
        }

        private static void requireReduced(List<Word> basis, int row) {
            int lead = basis.get(row).value().bitLength() - 1;
            for (int i = 0; i < basis.size(); i++) {
                boolean set = lead >= 0 && basis.get(i).value().testBit(lead);
                boolean later = i > row && basis.get(i).value().bitLength() > lead;
                if (set != (i == row)
                        || later
                        || basis.get(i).width() != basis.get(0).width()) {
                    throw new IllegalArgumentException("not a reduced echelon form: " + basis);
                }
            }
        }
    }

    /**
     * The function is x ↦ a·x, perhaps with a constant bit added.
     *
     * @param a the word, 0 allowed
     */
    record Mask(Word a) implements Answer {}

    /**
     * The function is constant, or it takes both values equally often.
     *
     * @param isBalanced which of the two
     */
    record Balance(boolean isBalanced) implements Answer {}
}
