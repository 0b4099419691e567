package org.notchwork.trial;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;

/**
 * Consecutive trials of one experiment and width.
 *
 * @param experiment the experiment
 * @param width the number of input bits
 * @param from the first trial
 * @param to the trial after the last
 */
public record TrialRange(Experiment experiment, int width, long from, long to) {

    private static final long MOST = 64;

    /** Checks the order. */
    public TrialRange {
        if (from < 0 || to <= from) {
            throw new IllegalArgumentException("trials " + from + " to " + to);
        }
    }

    /** Returns what is left of some ranges after their first trials. */
    public static List<TrialRange> after(List<TrialRange> ranges, long trials) {
        List<TrialRange> rest = new ArrayList<>();
        long skipped = trials;
        for (TrialRange range : ranges) {
            long size = range.to() - range.from();
            if (skipped >= size) {
                skipped -= size;
            } else {
                rest.add(new TrialRange(range.experiment(), range.width(), range.from() + skipped, range.to()));
                skipped = 0;
            }
        }
        return rest;
    }

    /** Returns all trials of a study in its order, in ranges short enough to be spread over threads. */
    public static List<TrialRange> of(Study study) {
        List<TrialRange> ranges = new ArrayList<>();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                long step = Math.max(1, MOST >> Math.max(0, width - 8));
                for (long from = 0; from < experiment.trials(); from += step) {
                    ranges.add(new TrialRange(experiment, width, from, Math.min(experiment.trials(), from + step)));
                }
            }
        }
        return ranges;
    }
}
