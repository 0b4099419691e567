package org.notchwork.verify;

import java.util.Locale;

/** The stages of verification, in their order, each with what it proves and what it does not. */
public enum Stage {
    /** Safe to read and complete. */
    CONTAINER("every file is a plain one, is listed, and what is listed is there", "nothing about what the files say"),
    /** Every file has the digest that the manifests list. */
    HASHES("every file has the bytes that the manifests list", "nothing against an author who made the manifests anew"),
    /** Every JSON file reads in the one form of its format. */
    SCHEMA(
            "every JSON file and line is canonical and of its format, so that all readers read the same",
            "nothing about whether it is true"),
    /** The seal is over these bytes. */
    SEAL(
            "the sealed files are those that the seal was made over",
            "who made it and when; without --expect, nothing against an author who sealed anew"),
    /** Every answer has a certificate that holds. */
    CERTIFICATES(
            "every instance was drawn from the seed, and every answer is proved by evaluations of its function",
            "that the calls were counted right; a re-run shows that"),
    /** All figures follow from the trial lines. */
    FIGURES(
            "the lines are those that the study calls for; figures, claims and the checks that need only lines follow",
            "that the lines themselves are true; a re-run shows that"),
    /** Trials run again give the same bytes. */
    RERUN(
            "the trials run again are what this program computes from the seed, to the byte",
            "that the seed was not chosen for its luck"),
    /** New trials on the referee's seed give compatible figures. */
    FRESH(
            "new trials on a seed that the author did not choose give figures that chance alone can explain",
            "that the figures are exact; a small effect needs many fresh trials to be seen");

    private final String proves;
    private final String proofEndsAt;

    Stage(String proves, String proofEndsAt) {
        this.proves = proves;
        this.proofEndsAt = proofEndsAt;
    }

    /** Returns the word on the screen and in JSON. */
    public String word() {
        return switch (this) {
            case RERUN -> "re-run";
            case FRESH -> "fresh run";
            default -> name().toLowerCase(Locale.ROOT);
        };
    }

    /** Returns what the stage proves if it passes. */
    public String proves() {
        return proves;
    }

    /** Returns what the stage does not prove. */
    public String doesNotProve() {
        return proofEndsAt;
    }
}
