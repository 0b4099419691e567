package org.notchwork.problem;

/** What a problem asks. A closed set: a new question adds a case here and an {@link Answer}. */
public enum Question {
    /** Which period does the function have? */
    PERIOD,
    /** Has the function a period, and which? */
    PERIOD_OR_NONE,
    /** On the cosets of which subspace is the function constant? */
    SUBSPACE,
    /** The inner product with which word is the function? */
    MASK,
    /** Is the function constant or balanced? */
    CONSTANT_OR_BALANCED
}
