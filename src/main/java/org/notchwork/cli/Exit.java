package org.notchwork.cli;

/**
 * The exit codes. None is 1 or 3: the JVM uses 1 for an uncaught fault and 3 where told to exit on memory exhaustion.
 */
public enum Exit {
    /** Yes; done; good. */
    GOOD(0),
    /** Wrong usage, or an invalid study. */
    USAGE(2),
    /** Checked, and the answer is no. */
    NO(10),
    /** Not finished or not decided: a limit, an interrupt, disk, memory, a full output pipe. */
    UNFINISHED(11),
    /** The bundle is malformed or unsafe. */
    MALFORMED(12),
    /** A fault of this program. */
    FAULT(70);

    private final int code;

    Exit(int code) {
        this.code = code;
    }

    /** Returns the number that the process ends with. */
    public int code() {
        return code;
    }
}
