package org.notchwork.verify;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.notchwork.bundle.ClaimsFile;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.CrossChecksFile;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.SummaryFile;
import org.notchwork.bundle.TrialLine;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.LineChecks;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

/**
 * The most careful forger: changes a record, then makes figures, claims, cross-checks, seal and manifests anew with the
 * program's own code, so that the bundle agrees with itself everywhere.
 */
final class Forger {

    private Forger() {}

    /** Changes one line's record, from 1, and makes everything that follows from the lines anew. */
    static void forge(Path bundle, Study study, String experiment, int line, UnaryOperator<TrialRecord> change)
            throws IOException, JsonFault {
        for (Experiment e : study.experiments()) {
            if (e.id().equals(experiment)) {
                List<TrialRecord> records = records(bundle, e);
                records.set(line - 1, change.apply(records.get(line - 1)));
                write(bundle, e, records);
            }
        }
        derive(bundle, study);
    }

    /** Makes everything that follows from the lines of trials and controls anew. */
    static void derive(Path bundle, Study study) throws IOException, JsonFault {
        LineChecks lines = new LineChecks(study);
        Summary summary = summary(bundle, study, lines);
        derived(bundle, study, summary, lines);
        BundleFixture.reseal(bundle, study);
    }

    private static Summary summary(Path bundle, Study study, LineChecks lines) throws IOException, JsonFault {
        SummaryBuilder figures = new SummaryBuilder(study);
        for (Experiment e : study.experiments()) {
            List<TrialRecord> records = records(bundle, e);
            int strategies = e.strategies().size();
            for (int i = 0; i < records.size(); i += strategies) {
                TrialRecord first = records.get(i);
                TrialGroup group =
                        new TrialGroup(e.id(), first.cell().width(), first.trial(), records.subList(i, i + strategies));
                figures.add(group);
                lines.add(group);
            }
            if (study.hasControls(e)) {
                for (String line : Files.readAllLines(file(bundle, Layout.controls(e.id())), StandardCharsets.UTF_8)) {
                    figures.addControl(ControlLine.read(object(line), e.id(), new ArrayList<>())
                            .orElseThrow());
                }
            }
        }
        return figures.summary();
    }

    private static void derived(Path bundle, Study study, Summary summary, LineChecks lines)
            throws IOException, JsonFault {
        List<CrossCheck> checks = new ArrayList<>(
                CrossChecksFile.read(json(Files.readAllBytes(file(bundle, Layout.CROSS_CHECKS))), new ArrayList<>()));
        for (CrossCheck again : new CrossChecker(study).fromLines(lines, summary)) {
            checks.replaceAll(c -> c.kind() == again.kind() && c.subject().equals(again.subject()) ? again : c);
        }
        Files.write(file(bundle, Layout.SUMMARY), CanonicalJson.bytes(SummaryFile.write(summary, checks)));
        Files.write(file(bundle, Layout.CROSS_CHECKS), CanonicalJson.bytes(CrossChecksFile.write(checks)));
        Files.write(file(bundle, Layout.CLAIMS), CanonicalJson.bytes(ClaimsFile.write(Judge.judge(study, summary))));
    }

    /** Changes the list of checks, and makes what counts them anew. */
    static void checks(Path bundle, Study study, UnaryOperator<List<CrossCheck>> change) throws IOException, JsonFault {
        List<CrossCheck> checks = new ArrayList<>(
                CrossChecksFile.read(json(Files.readAllBytes(file(bundle, Layout.CROSS_CHECKS))), new ArrayList<>()));
        List<CrossCheck> before = List.copyOf(checks);
        checks = change.apply(checks);
        if (checks.equals(before)) {
            throw new IllegalStateException("no check was changed");
        }
        Summary summary = summary(bundle, study, new LineChecks(study));
        Files.write(file(bundle, Layout.SUMMARY), CanonicalJson.bytes(SummaryFile.write(summary, checks)));
        Files.write(file(bundle, Layout.CROSS_CHECKS), CanonicalJson.bytes(CrossChecksFile.write(checks)));
        BundleFixture.reseal(bundle, study);
    }

    /** Returns the records of an experiment's file. */
    static List<TrialRecord> records(Path bundle, Experiment experiment) throws IOException, JsonFault {
        List<TrialRecord> records = new ArrayList<>();
        for (String line : Files.readAllLines(file(bundle, Layout.trials(experiment.id())), StandardCharsets.UTF_8)) {
            records.add(TrialLine.read(json(line.getBytes(StandardCharsets.UTF_8)), experiment.id(), new ArrayList<>())
                    .orElseThrow()
                    .record());
        }
        return records;
    }

    private static void write(Path bundle, Experiment experiment, List<TrialRecord> records) throws IOException {
        StringBuilder text = new StringBuilder();
        for (TrialRecord record : records) {
            text.append(CanonicalJson.text(TrialLine.write(
                            record, experiment.choice(record.cell().label()).orElseThrow())))
                    .append('\n');
        }
        Files.writeString(file(bundle, Layout.trials(experiment.id())), text, StandardCharsets.UTF_8);
    }

    /** Returns an object with one member changed. */
    static JsonObject with(JsonObject object, String name, JsonValue value) {
        Map<String, JsonValue> members = new LinkedHashMap<>(object.members());
        members.put(name, value);
        return new JsonObject(members);
    }

    /** Returns a line as an object. */
    static JsonObject object(String line) {
        try {
            return (JsonObject) json(line.getBytes(StandardCharsets.UTF_8));
        } catch (JsonFault e) {
            throw new IllegalStateException(e);
        }
    }

    private static JsonValue json(byte[] bytes) throws JsonFault {
        return new JsonReader(JsonLimits.FILE).readCanonical(bytes);
    }

    private static Path file(Path bundle, String name) {
        return bundle.resolve("data").resolve(name);
    }
}
