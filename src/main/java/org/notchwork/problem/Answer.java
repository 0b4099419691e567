package org.notchwork.problem;

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
}
