package org.notchwork.verify;

import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.study.Experiment;
import org.notchwork.trial.TrialRecord;

/**
 * The first line that is not the one that the study calls for, and what became of the trials.
 *
 * @param path the file
 * @param line the line, from 1
 * @param wanted the trial that should stand there; absent if the file should have ended before
 * @param foundAt the line, from 1, where the trial that does stand there belongs; absent if nowhere in this file
 * @param endsHere whether the file ends before this line
 * @param lines how many lines the file has
 * @param called how many lines the study calls for
 */
record Misplacement(
        String path,
        long line,
        Optional<Place> wanted,
        OptionalLong foundAt,
        boolean endsHere,
        long lines,
        long called) {

    /**
     * Whose line it is.
     *
     * @param experiment the experiment
     * @param width the number of input bits
     * @param trial the number of the trial
     * @param label the strategy
     */
    record Place(Experiment experiment, int width, long trial, String label) {

        /** Returns the place in words. */
        String text() {
            return "trial " + trial + " of " + label + " at width " + width;
        }
    }

    /** Notes a place whose line is missing or, without a place, a line past the end. */
    Misplacement(String path, long line, Optional<Place> wanted) {
        this(path, line, wanted, OptionalLong.empty(), wanted.isPresent(), 0, 0);
    }

    /** Returns the same, where the record of another trial stands in the place. */
    Misplacement by(TrialRecord record) {
        return new Misplacement(
                path, line, wanted, Lines.line(wanted.orElseThrow().experiment(), record), false, lines, called);
    }

    /** Returns the same, in a file of which all lines were counted. */
    Misplacement in(long all, long wantedLines) {
        return new Misplacement(path, line, wanted, foundAt, endsHere, all, wantedLines);
    }

    /** Returns in one sentence what became of the trials, as far as the counts tell. */
    String sentence() {
        String where = path + ", line " + line + ": ";
        String counts = "; the file has " + lines + " lines, the study calls for " + called;
        if (wanted.isEmpty()) {
            return where + "one line too many" + counts;
        }
        String missing = wanted.orElseThrow().text();
        if (endsHere) {
            return where + missing + " is dropped" + counts;
        }
        if (foundAt.isEmpty()) {
            return where + "a trial that the study does not call for stands where " + missing + " should" + counts;
        }
        long at = foundAt.getAsLong();
        if (at == line) {
            return where + missing + " is named with another engine or sight than in the study";
        }
        if (lines < called && at > line) {
            return where + missing + " is dropped" + counts;
        }
        return lines > called && at < line
                ? where + "the trial of line " + at + " is repeated" + counts
                : where + "out of order: the trial of line " + at + " stands where " + missing + " should" + counts;
    }
}
