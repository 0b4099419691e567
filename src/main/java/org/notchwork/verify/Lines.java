package org.notchwork.verify;

import java.util.List;
import java.util.OptionalLong;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialRecord;

/** Where the lines of trials stand: by width, then trial, then strategy. */
final class Lines {

    private Lines() {}

    /** Returns how many lines a study calls for. */
    static long of(Study study) {
        return study.experiments().stream().mapToLong(Lines::of).sum();
    }

    /** Returns how many lines an experiment calls for. */
    static long of(Experiment experiment) {
        return instances(experiment) * experiment.strategies().size();
    }

    /** Returns how many instances an experiment calls for. */
    static long instances(Experiment experiment) {
        return (long) experiment.widths().size() * experiment.trials();
    }

    /** Returns the index, from 0, of the first line of an instance in its experiment's file. */
    static long first(Experiment experiment, int width, long trial) {
        return (experiment.widths().indexOf(width) * (long) experiment.trials() + trial)
                * experiment.strategies().size();
    }

    /** Returns the index, from 0, of the first line of an instance in its experiment's file of controls. */
    static long firstControl(Study study, Experiment experiment, int width, long trial) {
        long first = 0;
        for (int narrower : experiment.widths()) {
            long each = study.controls(experiment, narrower).size();
            if (narrower == width) {
                return first + trial * each;
            }
            first += each * experiment.trials();
        }
        throw new IllegalArgumentException("no width " + width + " in " + experiment.id());
    }

    /** Returns the line, from 1, where a record belongs; empty if the experiment does not call for its trial. */
    static OptionalLong line(Experiment experiment, TrialRecord record) {
        int strategy = experiment.strategies().stream()
                .map(StrategyChoice::label)
                .toList()
                .indexOf(record.cell().label());
        boolean called = calls(experiment, record.cell().width(), record.trial()) && strategy >= 0;
        return called
                ? OptionalLong.of(first(experiment, record.cell().width(), record.trial()) + strategy + 1)
                : OptionalLong.empty();
    }

    /** Returns how many lines of controls an experiment calls for. */
    static long ofControls(Study study, Experiment experiment) {
        return experiment.widths().stream()
                .mapToLong(w -> (long) experiment.trials()
                        * study.controls(experiment, w).size())
                .sum();
    }

    /** Returns the line, from 1, where a control belongs; empty if the experiment does not call for it. */
    static OptionalLong line(Study study, Experiment experiment, ControlRecord record) {
        long before = 0;
        for (int width : experiment.widths()) {
            List<String> labels = study.controls(experiment, width).stream()
                    .map(StrategyChoice::label)
                    .toList();
            int strategy = labels.indexOf(record.cell().label());
            if (width == record.cell().width() && strategy >= 0 && calls(experiment, width, record.trial())) {
                return OptionalLong.of(before + record.trial() * labels.size() + strategy + 1);
            }
            before += (long) experiment.trials() * labels.size();
        }
        return OptionalLong.empty();
    }

    /** Returns whether an experiment calls for a trial of a width. */
    static boolean calls(Experiment experiment, int width, long trial) {
        return experiment.widths().contains(width) && trial >= 0 && trial < experiment.trials();
    }
}
