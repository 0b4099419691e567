package org.notchwork.verify;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.CrossChecksFile;
import org.notchwork.bundle.EnvironmentFile;
import org.notchwork.bundle.Formats;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.Seal;
import org.notchwork.check.CrossCheck;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Attachments;
import org.notchwork.study.Study;
import org.notchwork.study.StudyJson;
import org.notchwork.study.StudyReader;
import org.notchwork.study.StudyReading;

/**
 * The JSON files of a bundle, each canonical and of its format.
 *
 * @param study the study
 * @param seal what the seal lists
 * @param checks the cross-checks as written
 * @param values the files as JSON, by name
 */
record OpenedFiles(Study study, Seal seal, List<CrossCheck> checks, Map<String, JsonValue> values) {

    private static final List<String> NAMES = List.of(
            Layout.STUDY,
            Layout.SEAL,
            Layout.SUMMARY,
            Layout.CROSS_CHECKS,
            Layout.CLAIMS,
            Layout.ENVIRONMENT,
            Layout.SCHEMAS);

    /** Says why the files cannot be opened. */
    static final class Malformed extends Exception {

        private static final long serialVersionUID = 1L;

        Malformed(String line) {
            super(line);
        }
    }

    /** Opens the files. */
    static OpenedFiles open(Bag bag) throws IOException, BundleFault, Malformed {
        Map<String, JsonValue> values = new LinkedHashMap<>();
        for (String name : NAMES) {
            values.put(name, canonical(bag, name));
        }
        Study study = study(values.get(Layout.STUDY), bag);
        requireLayout(bag, study);
        List<Fault> faults = new ArrayList<>();
        Seal seal = Seal.read(values.get(Layout.SEAL), Layout.sealed(study), faults);
        refuse(Layout.SEAL, faults);
        List<CrossCheck> checks = CrossChecksFile.read(values.get(Layout.CROSS_CHECKS), faults);
        refuse(Layout.CROSS_CHECKS, faults);
        EnvironmentFile.read(values.get(Layout.ENVIRONMENT), faults);
        refuse(Layout.ENVIRONMENT, faults);
        format(Layout.SUMMARY, Formats.SUMMARY, values);
        format(Layout.CLAIMS, Formats.CLAIMS, values);
        return new OpenedFiles(study, seal, checks, values);
    }

    private static JsonValue canonical(Bag bag, String name) throws IOException, BundleFault, Malformed {
        String path = Layout.DATA + name;
        if (!bag.sizes().containsKey(path)) {
            throw new Malformed(path + ": missing; every bundle has it");
        }
        try {
            return new JsonReader(JsonLimits.FILE).readCanonical(bag.read(path, JsonLimits.FILE.bytes()));
        } catch (JsonFault e) {
            throw new Malformed(path + ", " + e.place() + ": " + e.getMessage());
        }
    }

    private static Study study(JsonValue value, Bag bag) throws Malformed {
        StudyReading reading = StudyReader.read(value, name -> attachment(bag, name));
        refuse(Layout.STUDY, reading.faults());
        Study study = reading.study().orElseThrow();
        if (!StudyJson.write(study).equals(value)) {
            throw new Malformed(
                    Layout.DATA + Layout.STUDY + ": defaults are left out; a bundle's study states them all");
        }
        return study;
    }

    /** A study can name any file; what it names is looked for among the bundle's tables alone. */
    private static Optional<byte[]> attachment(Bag bag, String name) {
        String path = Layout.DATA + Layout.attachment(name);
        if (!bag.sizes().containsKey(path)) {
            return Optional.empty();
        }
        try {
            return Optional.of(bag.read(path, Attachments.MOST_BYTES));
        } catch (IOException | BundleFault e) {
            return Optional.empty();
        }
    }

    private static void requireLayout(Bag bag, Study study) throws Malformed {
        List<String> wanted =
                Layout.payload(study).stream().map(n -> Layout.DATA + n).toList();
        for (String path : wanted) {
            if (!bag.sizes().containsKey(path)) {
                throw new Malformed(path + ": missing; the study calls for it");
            }
        }
        for (String path : bag.sizes().keySet()) {
            if (path.startsWith(Layout.DATA) && !wanted.contains(path)) {
                throw new Malformed(path + ": no bundle of this study has such a file");
            }
        }
    }

    private static void format(String name, String format, Map<String, JsonValue> values) throws Malformed {
        List<Fault> faults = new ArrayList<>();
        Fields fields = Fields.of(values.get(name), "", faults);
        Optional<String> found = Optional.of(fields.text("format", 1, 100));
        if (faults.isEmpty() && !found.equals(Optional.of(format))) {
            throw new Malformed(Layout.DATA + name + ": format " + found.get() + "; this program reads " + format);
        }
        refuse(name, faults);
    }

    private static void refuse(String name, List<Fault> faults) throws Malformed {
        if (!faults.isEmpty()) {
            throw new Malformed(Layout.DATA + name + ", " + faults.get(0).line());
        }
    }
}
