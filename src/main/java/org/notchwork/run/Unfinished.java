package org.notchwork.run;

/** What to do with what an earlier run left unfinished. */
public enum Unfinished {
    /** Refuse to begin. */
    REFUSE,
    /** Go on from it. */
    RESUME,
    /** Remove it and begin again. */
    DISCARD
}
