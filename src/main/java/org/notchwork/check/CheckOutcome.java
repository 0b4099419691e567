package org.notchwork.check;

import java.util.Locale;

/** What a cross-check found. */
public enum CheckOutcome {
    /** Everything compared agrees. */
    AGREES,
    /** Something compared differs; the run ends with exit code 10. */
    DIFFERS,
    /** There was nothing to compare, and the observation says why. */
    NOT_COMPARABLE;

    /** Returns the word in files: {@code agrees}, {@code differs} or {@code not-comparable}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
