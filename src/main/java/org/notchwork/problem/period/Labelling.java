package org.notchwork.problem.period;

import java.util.Locale;

/** How the values of an instance are drawn. */
public enum Labelling {
    /** A uniformly random table; widths to 20. */
    TABLE(20),
    /** A keyed permutation evaluated on demand; widths to 63. */
    PERMUTATION(63);

    private final int greatestWidth;

    Labelling(int greatestWidth) {
        this.greatestWidth = greatestWidth;
    }

    /** Returns the largest width that can be drawn. */
    public int greatestWidth() {
        return greatestWidth;
    }

    /** Returns the word in study files: {@code table} or {@code permutation}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
