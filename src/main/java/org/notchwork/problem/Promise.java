package org.notchwork.problem;

/**
 * What everybody is told about the functions of a problem before the first query.
 *
 * @param question what is asked
 * @param dimension the dimension of the hidden subspace: 1 for a period, 0 where none is hidden
 * @param labels what is known of the values
 * @param offset whether an inner product may come with a constant bit
 */
public record Promise(Question question, int dimension, Labels labels, boolean offset) {

    /** What is known of the values of a function. */
    public enum Labels {
        /** Uniformly random under the promise, or as good as that: the labels say nothing but which are equal. */
        RANDOM,
        /** As in {@link #RANDOM}, but different cosets may share a label by accident: the promise holds nearly. */
        COLLIDING,
        /** The function is affine over GF(2). */
        AFFINE,
        /** Anything; only the promise is known. */
        ANY
    }

    /** Returns whether equal values always mean what the promise says. */
    public boolean isExact() {
        return labels != Labels.COLLIDING;
    }

    /** Returns the promise of a function with one period. */
    public static Promise period(Labels labels) {
        return new Promise(Question.PERIOD, 1, labels, false);
    }

    /** Returns the promise of a function with one period or with none. */
    public static Promise periodOrNone(Labels labels) {
        return new Promise(Question.PERIOD_OR_NONE, 1, labels, false);
    }
}
