package org.notchwork.study;

import java.util.Optional;

/** The figures of a cell that a claim can be about; each has an interval. */
public enum FigureKind {
    /** The mean number of queries of a trial, confirmation not included. */
    QUERIES_MEAN("queries-mean"),
    /** The fraction of trials that were solved. */
    SUCCESS_RATE("success-rate");

    private final String word;

    FigureKind(String word) {
        this.word = word;
    }

    /** Returns the word in files. */
    public String word() {
        return word;
    }

    /** Returns the figure of a word. */
    public static Optional<FigureKind> of(String word) {
        for (FigureKind kind : values()) {
            if (kind.word.equals(word)) {
                return Optional.of(kind);
            }
        }
        return Optional.empty();
    }
}
