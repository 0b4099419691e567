package org.notchwork.claim;

/** Which ends of an interval mean what they say when trials were cut off by the query limit. */
enum Trust {
    /** No trial was cut off. */
    BOTH_ENDS,
    /** Trials were cut off, so the true mean is above the observed one: only the lower end bounds it. */
    LOWER_END,
    /** Trials of both parts of a ratio may be cut off: neither end bounds it. */
    NEITHER_END
}
