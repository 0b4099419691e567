package org.notchwork.trial;

import java.util.List;

/**
 * One instance faced by every strategy of its experiment.
 *
 * @param experiment the id of the experiment
 * @param width the number of input bits
 * @param trial the number of the trial, from 0
 * @param records one a strategy, in the order of the study
 * @param controls one a strategy that has a control at this width, in the order of the study
 */
public record TrialGroup(
        String experiment, int width, long trial, List<TrialRecord> records, List<ControlRecord> controls) {

    /** Creates a group without controls. */
    public TrialGroup(String experiment, int width, long trial, List<TrialRecord> records) {
        this(experiment, width, trial, records, List.of());
    }

    /** Copies the lists. */
    public TrialGroup {
        records = List.copyOf(records);
        controls = List.copyOf(controls);
    }
}
