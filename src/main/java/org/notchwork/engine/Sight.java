package org.notchwork.engine;

import java.util.Locale;

/** What an engine is told. */
public enum Sight {
    /** The engine works from evaluations of the function alone. */
    BLIND,
    /** The engine is told what the instance hides. */
    SIGHTED;

    /** Returns the word that files and reports use: {@code blind} or {@code sighted}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
