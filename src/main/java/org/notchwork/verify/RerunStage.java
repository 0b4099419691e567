package org.notchwork.verify;

import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.TrialLine;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialPool;
import org.notchwork.trial.TrialRange;
import org.notchwork.trial.TrialRunner;

/** Runs every trial again, compares the lines byte by byte, and makes all cross-checks anew. */
final class RerunStage {

    private final OpenedFiles files;
    private final Bag bag;
    private final VerifyOptions options;
    private final TrialRunner runner;
    private final InstanceExaminer examiner = new InstanceExaminer(Engines.reference());
    private final Findings findings = new Findings();
    private final SummaryBuilder figures;
    private final LineChecks lineChecks;
    private final Map<String, InstanceTally> examined = new LinkedHashMap<>();
    private long compared;

    RerunStage(OpenedFiles files, Bag bag, VerifyOptions options, TrialRunner runner) {
        this.files = files;
        this.bag = bag;
        this.options = options;
        this.runner = runner;
        this.figures = new SummaryBuilder(files.study());
        this.lineChecks = new LineChecks(files.study());
    }

    private record Again(TrialGroup group, InstanceTally examined) {}

    /** Runs everything again. An interrupt ends it early, and the report says how far it came. */
    StageReport all(LinePass.Listener listener) throws IOException {
        Study study = files.study();
        try {
            for (Experiment experiment : study.experiments()) {
                run(experiment, listener);
            }
        } catch (InterruptedException e) {
            return stopped(compared, Lines.of(study), findings);
        } catch (WrittenLines.Stopped e) {
            throw new IOException(e.getMessage(), e);
        }
        List<CrossCheck> checks = new CrossChecker(study).all(examined, lineChecks, figures.summary());
        CheckComparison.compare(findings, files.checks(), files.checks(), checks);
        return StageReport.of(
                Stage.RERUN,
                findings,
                "recomputed: identical: all " + compared + " trials and all " + checks.size()
                        + " cross-checks; answers agree with exhaustive search up to width "
                        + study.crossCheckWidth(),
                "recomputed: different");
    }

    private void run(Experiment experiment, LinePass.Listener listener)
            throws IOException, InterruptedException, WrittenLines.Stopped {
        String path = Layout.DATA + Layout.trials(experiment.id());
        List<TrialRange> ranges = TrialRange.of(files.study()).stream()
                .filter(r -> r.experiment().equals(experiment))
                .toList();
        boolean controlled = files.study().hasControls(experiment);
        String controlPath = controlled ? Layout.DATA + Layout.controls(experiment.id()) : path;
        long[] controls = {0};
        try (WrittenLines written = new WrittenLines(bag, path, options.limits().lineBytes(), findings);
                WrittenLines writtenControls =
                        new WrittenLines(bag, controlPath, options.limits().lineBytes(), findings)) {
            new TrialPool(options.threads()).<Again, WrittenLines.Stopped>run(ranges, this::again, (Again again) -> {
                TrialGroup group = again.group();
                long first = Lines.first(experiment, group.width(), group.trial());
                for (int i = 0; i < group.records().size(); i++) {
                    written.compare(
                            first + i,
                            TrialLine.write(
                                    group.records().get(i),
                                    experiment.strategies().get(i),
                                    experiment.problem().functions()));
                    compared++;
                }
                for (ControlRecord control : group.controls()) {
                    writtenControls.compare(controls[0]++, ControlLine.write(control));
                    figures.addControl(control);
                }
                figures.add(group);
                lineChecks.add(group);
                examined.merge(
                        CrossChecker.subject(experiment.id(), group.width()), again.examined(), InstanceTally::plus);
                listener.read();
            });
        }
    }

    private Again again(Experiment experiment, int width, long trial) {
        TrialGroup group = runner.run(experiment, width, trial);
        InstanceTally examination = CrossChecker.isExhaustive(files.study(), width)
                ? examiner.examine(experiment, runner.instance(experiment, width, trial), group)
                : InstanceTally.NONE;
        return new Again(group, examination);
    }

    /** Returns the report of a re-run that was interrupted. */
    static StageReport stopped(long compared, long wanted, Findings findings) {
        String far = "not finished: " + compared + " of " + wanted + " trials re-run, ";
        return findings.isEmpty()
                ? StageReport.of(Stage.RERUN, StageOutcome.NOT_FINISHED, far + "all equal")
                : StageReport.of(Stage.RERUN, findings, "", far + findings.count() + " different");
    }
}
