package org.notchwork.claim;

import java.util.Locale;

/** What the figures say of a claim. */
public enum ClaimVerdict {
    /** The whole interval lies where the claim says. */
    SUPPORTED,
    /** The whole interval lies where the claim says it does not. */
    REFUTED,
    /** The interval lies on both sides, or there is none. */
    UNDECIDED;

    /** Returns the word in files. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
