package org.notchwork.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Attachments;
import org.notchwork.seed.Seed;

/**
 * Reads a study file strictly: whatever is unknown, repeated, out of range or impossible is a fault, and all faults of
 * a file are found in one pass.
 */
public final class StudyReader {

    /** The first version of the format: no controls unless asked for, fewer cross-checks. */
    public static final String FORMAT = "notchwork-study/1";

    /** The second version: controls at small widths, distributions and rates checked against their laws. */
    public static final String SECOND_FORMAT = "notchwork-study/2";

    /** The largest width that can be checked exhaustively. */
    public static final int GREATEST_CROSS_CHECK = 12;

    private static final int USUAL_CROSS_CHECK = 10;
    private static final int LONGEST_TITLE = 200;
    private static final int LONGEST_TEXT = 2000;
    private static final int MOST_EXPERIMENTS = 16;
    private static final int MOST_CLAIMS = 100;
    private static final Pattern FORMATS = Pattern.compile(Pattern.quote(FORMAT) + "|" + Pattern.quote(SECOND_FORMAT));

    private StudyReader() {}

    /** Reads a study that names no files from the bytes of its own. */
    public static StudyReading read(byte[] file) {
        return read(file, Attachments.NONE);
    }

    /**
     * Reads a study from the bytes of its file.
     *
     * @param files the files that the study may name
     */
    public static StudyReading read(byte[] file, Attachments files) {
        try {
            return read(new JsonReader(JsonLimits.FILE).read(file), files);
        } catch (JsonFault e) {
            return new StudyReading(Optional.empty(), List.of(e.fault()));
        }
    }

    /** Reads a study that names no files from a value that was read strictly already. */
    public static StudyReading read(JsonValue document) {
        return read(document, Attachments.NONE);
    }

    /** Reads a study from a value that was read strictly already. */
    public static StudyReading read(JsonValue document, Attachments files) {
        List<Fault> faults = new ArrayList<>();
        Fields fields = Fields.of(document, "", faults);
        String format = fields.text(
                "format",
                FORMATS,
                "\"" + FORMAT + "\" or \"" + SECOND_FORMAT + "\" is wanted; another version needs another program");
        String title = fields.line("title", 1, LONGEST_TITLE);
        String question = fields.text("question", 1, LONGEST_TEXT);
        String seed = fields.text("seed", Seed.FORM, Seed.MEND);
        int crossCheck = (int) fields.optionalInteger("cross-check-width", 0, GREATEST_CROSS_CHECK)
                .orElse(USUAL_CROSS_CHECK);
        List<ExperimentReading> experiments = experiments(fields, files);
        List<Claim> claims = claims(fields, experiments);
        fields.end();
        if (!faults.isEmpty()) {
            return new StudyReading(Optional.empty(), faults);
        }
        List<Experiment> sound =
                experiments.stream().flatMap(e -> e.experiment().stream()).toList();
        return new StudyReading(
                Optional.of(new Study(
                        format.equals(FORMAT) ? 1 : 2, title, question, new Seed(seed), sound, crossCheck, claims)),
                List.of());
    }

    private static List<ExperimentReading> experiments(Fields fields, Attachments files) {
        Ids ids = new Ids("experiment");
        return fields.items("experiments", 1, MOST_EXPERIMENTS).stream()
                .map(item -> ExperimentReader.read(item.object(), ids, files))
                .toList();
    }

    private static List<Claim> claims(Fields fields, List<ExperimentReading> experiments) {
        Ids ids = new Ids("claim");
        ClaimReader reader = new ClaimReader(new NamedCells(experiments));
        return fields.optionalItems("claims", 0, MOST_CLAIMS).orElse(List.of()).stream()
                .flatMap(item -> reader.read(item.object(), ids).stream())
                .toList();
    }
}
