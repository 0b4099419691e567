package org.notchwork.trial;

import java.util.Locale;

/** What came of a trial. */
public enum Outcome {
    /** The answer was right. */
    SOLVED,
    /** The answer was wrong. */
    WRONG,
    /** The query limit was reached first. */
    CENSORED,
    /** The strategy had done all that it does and named nothing. */
    UNANSWERED;

    /** Returns the word in files. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
