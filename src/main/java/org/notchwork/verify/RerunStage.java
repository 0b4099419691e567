package org.notchwork.verify;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.LineReader;
import org.notchwork.bundle.TrialLine;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
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
    private long compared;

    RerunStage(OpenedFiles files, Bag bag, VerifyOptions options, TrialRunner runner) {
        this.files = files;
        this.bag = bag;
        this.options = options;
        this.runner = runner;
    }

    private record Again(TrialGroup group, InstanceTally examined) {}

    /** Runs everything again. An interrupt ends it early, and the report says how far it came. */
    StageReport all(LinePass.Listener listener) throws IOException, BundleFault {
        Study study = files.study();
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lineChecks = new LineChecks(study);
        Map<String, InstanceTally> examined = new LinkedHashMap<>();
        long lines = files.seal().trials();
        try {
            for (Experiment experiment : study.experiments()) {
                String path = Layout.DATA + Layout.trials(experiment.id());
                List<TrialRange> ranges = TrialRange.of(study).stream()
                        .filter(r -> r.experiment().equals(experiment))
                        .toList();
                try (LineReader written =
                        new LineReader(bag.open(path), path, options.limits().lineBytes())) {
                    new TrialPool(options.threads()).<Again, Stopped>run(ranges, this::again, (Again again) -> {
                        compare(experiment, again.group(), written, path);
                        figures.add(again.group());
                        lineChecks.add(again.group());
                        examined.merge(
                                CrossChecker.subject(
                                        experiment.id(), again.group().width()),
                                again.examined(),
                                InstanceTally::plus);
                        listener.read();
                    });
                }
            }
        } catch (InterruptedException e) {
            return StageReport.of(
                    Stage.RERUN,
                    findings.isEmpty() ? StageOutcome.NOT_FINISHED : StageOutcome.FAILED,
                    "not finished: " + compared + " of " + lines + " trials re-run, "
                            + (findings.isEmpty() ? "all equal" : findings.count() + " different"));
        } catch (Stopped e) {
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

    /** Says that the written lines cannot be read on. */
    private static final class Stopped extends Exception {

        private static final long serialVersionUID = 1L;

        Stopped(Exception cause) {
            super(cause.getMessage(), cause);
        }
    }

    private Again again(Experiment experiment, int width, long trial) {
        TrialGroup group = runner.run(experiment, width, trial);
        InstanceTally examined = CrossChecker.isExhaustive(files.study(), width)
                ? examiner.examine(experiment, runner.instance(experiment, width, trial), group)
                : InstanceTally.NONE;
        return new Again(group, examined);
    }

    private void compare(Experiment experiment, TrialGroup group, LineReader written, String path) throws Stopped {
        List<byte[]> lines = new ArrayList<>();
        for (int i = 0; i < group.records().size(); i++) {
            lines.add(CanonicalJson.bytes(TrialLine.write(
                    group.records().get(i), experiment.strategies().get(i))));
        }
        try {
            for (byte[] line : lines) {
                byte[] found = written.next().orElseGet(() -> new byte[0]);
                compared++;
                if (!Arrays.equals(found, line)) {
                    difference(findings, path, written.number(), found, line);
                }
            }
        } catch (IOException | BundleFault e) {
            throw new Stopped(e);
        }
    }

    /** Notes the fields in which a written line differs from the one computed again. */
    static void difference(Findings findings, String path, long number, byte[] written, byte[] again) {
        JsonReader reader = new JsonReader(JsonLimits.LINE);
        try {
            JsonValue found = reader.read(written);
            JsonValue right = reader.read(again);
            new JsonDifference(
                            (pointer, a, b) -> findings.add(new Finding(path, OptionalLong.of(number), pointer, a, b)))
                    .compare(found, right);
        } catch (JsonFault e) {
            findings.add(new Finding(path, OptionalLong.of(number), "", "not JSON: " + e.getMessage(), "a trial line"));
        }
    }
}
