package org.notchwork.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.notchwork.bundle.Seal;
import org.notchwork.verify.Finding;
import org.notchwork.verify.StageOutcome;
import org.notchwork.verify.StageReport;
import org.notchwork.verify.VerdictRecord;

/** The page that a referee attaches to a report: each check with yes, no or not done, and its evidence. */
public final class RecordReport {

    private RecordReport() {}

    /** Returns the page as the bytes of a PDF. */
    public static byte[] pdf(VerdictRecord record) {
        Report.withoutScreen();
        try (PDDocument document = new PDDocument()) {
            Fonts fonts = Fonts.load(document);
            try (Flow flow = new Flow(document, fonts)) {
                set(record, flow);
                flow.finish("verification record · " + record.program());
            }
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            document.save(bytes);
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("the record cannot be made: " + e.getMessage(), e);
        }
    }

    private static void set(VerdictRecord record, Flow flow) throws IOException {
        flow.title("Verification record");
        flow.body(record.verdict().sentence());
        flow.heading("What was checked");
        Table facts = new Table(Table.Column.left("what"), Table.Column.left("value"));
        facts.add("day", record.day().toString());
        facts.add("program", record.program());
        facts.add("asked for", record.asked());
        facts.add("seal computed", record.verdict().seal().map(Seal::groups).orElse("none"));
        facts.set(flow);
        flow.heading("Checks");
        Table table = new Table(
                Table.Column.left("check"),
                Table.Column.left("holds"),
                Table.Column.left("evidence"),
                Table.Column.left("what it does not prove"));
        for (StageReport stage : record.verdict().stages()) {
            table.group();
            table.add(
                    stage.stage().word(),
                    word(stage.outcome()),
                    stage.sentence(),
                    stage.outcome() == StageOutcome.PASSED ? stage.stage().doesNotProve() : "");
        }
        table.set(flow);
        differences(record, flow);
        flow.note("Not under the seal, of these only the digests were compared: "
                + String.join(", ", record.verdict().notCovered())
                + ". This record names nobody and no machine; it says"
                + " what was computed, not that a result was reproduced or replicated.");
    }

    private static void differences(VerdictRecord record, Flow flow) throws IOException {
        List<String> lines = new ArrayList<>();
        for (StageReport stage : record.verdict().stages()) {
            for (Finding finding : stage.findings()) {
                lines.add(stage.stage().word() + ": " + finding.text());
            }
        }
        if (!lines.isEmpty()) {
            flow.heading("Differences found");
            flow.items(lines);
        }
    }

    private static String word(StageOutcome outcome) {
        return switch (outcome) {
            case PASSED -> "yes";
            case FAILED, MALFORMED -> "NO";
            case NOT_DONE -> "not done";
            case NOT_FINISHED -> "not finished";
        };
    }
}
