package org.notchwork.verify;

import java.util.Locale;

/** How a stage ended. */
public enum StageOutcome {
    /** Everything that the stage looks at holds. */
    PASSED,
    /** Checked, and something does not hold. */
    FAILED,
    /** The bundle cannot be read safely or in its format. */
    MALFORMED,
    /** Not asked for, or an earlier stage made it pointless. */
    NOT_DONE,
    /** Begun and stopped before its end. */
    NOT_FINISHED;

    /** Returns the word on the screen and in JSON, for example {@code not-done}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
