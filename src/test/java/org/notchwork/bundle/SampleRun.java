package org.notchwork.bundle;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.CanonicalJson;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.study.StudyReader;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRunner;

/** A small study that was really run, one trial after another, with every kind of line: solved, censored, quantum. */
final class SampleRun {

    static final Environment ENVIRONMENT = new Environment(
            "notchwork test", "2026-03-01T09:00:00Z", "2026-03-01T09:00:07Z", 7, 1, "17 (test)", "test");

    static final byte[] REPORT = "%PDF-1.7 stands for a report\n".getBytes(StandardCharsets.US_ASCII);

    private static final String STUDY = """
            {
              "format": "notchwork-study/1",
              "title": "Invented sample: two dials, £5 \\"wager\\"",
              "question": "Invented for a test: how many turns until the dials repeat?",
              "seed": "an invented seed for a test",
              "cross-check-width": 4,
              "experiments": [
                {
                  "id": "small",
                  "problem": { "kind": "xor-period", "instances": "table" },
                  "widths": [3, 4],
                  "strategies": [
                    { "name": "sequential-scan" },
                    { "name": "random-draws" },
                    { "name": "fourier-sampling", "engine": "fibre" },
                    { "name": "fourier-sampling", "engine": "annihilator" }
                  ],
                  "trials": 6,
                  "query-limit": 100
                },
                {
                  "id": "cut-short",
                  "problem": { "kind": "xor-period", "instances": "permutation" },
                  "widths": [9],
                  "strategies": [ { "name": "random-draws" }, { "name": "difference-cover" } ],
                  "trials": 5,
                  "query-limit": 22
                }
              ],
              "claims": [
                {
                  "id": "few",
                  "text": "Few rounds are enough.",
                  "figure": "queries-mean",
                  "cell": "small/4/fourier-sampling@fibre",
                  "between": ["1", "9.5"]
                },
                {
                  "id": "twice",
                  "text": "One needs at least twice the other.",
                  "ratio": { "of": "small/4/sequential-scan", "to": "small/4/random-draws" },
                  "at-least": "2"
                }
              ]
            }
            """;

    private final Study study;
    private final Results results;
    private final List<TrialGroup> groups = new ArrayList<>();

    SampleRun() {
        study = StudyReader.read(STUDY.getBytes(StandardCharsets.UTF_8)).study().orElseThrow();
        TrialRunner runner = new TrialRunner(study);
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        InstanceExaminer examiner = new InstanceExaminer(Engines.all());
        Map<String, InstanceTally> examined = new LinkedHashMap<>();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                for (long trial = 0; trial < experiment.trials(); trial++) {
                    TrialGroup group = runner.run(experiment, width, trial);
                    groups.add(group);
                    figures.add(group);
                    lines.add(group);
                    if (CrossChecker.isExhaustive(study, width)) {
                        examined.merge(
                                CrossChecker.subject(experiment.id(), width),
                                examiner.examine(experiment, runner.instance(experiment, width, trial), group),
                                InstanceTally::plus);
                    }
                }
            }
        }
        Summary summary = figures.summary();
        results = new Results(
                study, summary, new CrossChecker(study).all(examined, lines, summary), Judge.judge(study, summary));
    }

    Study study() {
        return study;
    }

    Results results() {
        return results;
    }

    List<TrialGroup> groups() {
        return groups;
    }

    /** Returns all trial lines in the order of the study. */
    List<byte[]> lines() {
        List<byte[]> lines = new ArrayList<>();
        groups.forEach(group -> lines.addAll(lines(group)));
        return lines;
    }

    /** Writes the bundle and returns its seal. */
    String write(Path target, boolean replace) throws IOException {
        try (BundleWriter writer = BundleWriter.begin(study, target, replace)) {
            addLines(writer);
            return writer.finish(results, ENVIRONMENT, seal -> REPORT);
        }
    }

    void addLines(BundleWriter writer) throws IOException {
        for (TrialGroup group : groups) {
            for (byte[] line : lines(group)) {
                writer.add(group.experiment(), line, MerkleTree.leaf(line));
            }
        }
    }

    private List<byte[]> lines(TrialGroup group) {
        Experiment experiment = study.experiment(group.experiment()).orElseThrow();
        List<byte[]> lines = new ArrayList<>();
        for (int i = 0; i < group.records().size(); i++) {
            lines.add(CanonicalJson.bytes(TrialLine.write(
                    group.records().get(i), experiment.strategies().get(i))));
        }
        return lines;
    }
}
