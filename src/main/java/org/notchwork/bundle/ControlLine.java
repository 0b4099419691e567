package org.notchwork.bundle;

import java.util.List;
import java.util.Optional;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.study.Cell;
import org.notchwork.trial.ControlOutcome;
import org.notchwork.trial.ControlRecord;

/** One line of a file of controls: its writer and its reader. */
public final class ControlLine {

    private ControlLine() {}

    /** Returns the line of a record as JSON. */
    public static JsonObject write(ControlRecord record) {
        JsonObject.Builder line = JsonObject.builder()
                .put("calls", TrialLine.counts(record.counts()))
                .put("format", Formats.CONTROL)
                .put("outcome", record.outcome().word())
                .put("secret", AnswerForm.write(record.secret()))
                .put("strategy", record.cell().label())
                .put("trial", record.trial())
                .put("width", record.cell().width());
        record.answer().ifPresent(a -> line.put("answer", AnswerForm.write(a)));
        record.certificate().ifPresent(c -> line.put("certificate", CertificateForm.write(c)));
        return line.build();
    }

    /**
     * Reads a line. Whether it is the line that the study calls for is for others to ask.
     *
     * @param value the line
     * @param experiment the id of the experiment whose file it stands in
     * @param faults where faults are noted, one or more exactly if nothing is returned
     */
    public static Optional<ControlRecord> read(JsonValue value, String experiment, List<Fault> faults) {
        int before = faults.size();
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.CONTROL);
        int width = (int) fields.integer("width", 1, TrialLine.GREATEST_WIDTH);
        Cell cell = new Cell(experiment, width, fields.text("strategy", 1, TrialLine.LONGEST_LABEL));
        long trial = fields.integer("trial", 0, JsonInteger.MAX);
        String word = fields.text("outcome", 1, 20);
        Optional<ControlOutcome> outcome = ControlOutcome.of(word);
        if (outcome.isEmpty() && !word.isEmpty()) {
            fields.fault("outcome", Fields.quoted(word), "secret, claimed, failed or nothing is wanted");
        }
        Counts counts = TrialLine.counts(fields.object("calls"));
        Optional<Answer> secret = AnswerForm.read(fields.object("secret"), width);
        Optional<Answer> answer = fields.optionalObject("answer").flatMap(f -> AnswerForm.read(f, width));
        Optional<Certificate> certificate =
                fields.optionalObject("certificate").flatMap(f -> CertificateForm.read(f, width));
        fields.end();
        if (answer.isPresent() != certificate.isPresent()) {
            fields.fault("answer", "without the other", "an answer goes with a certificate");
        }
        if (outcome.isPresent() && answer.isEmpty() && outcome.get() != ControlOutcome.NOTHING) {
            fields.fault("outcome", Fields.quoted(word), "\"nothing\" goes without an answer");
        }
        return faults.size() > before
                ? Optional.empty()
                : Optional.of(new ControlRecord(
                        cell, trial, secret.orElseThrow(), outcome.orElseThrow(), answer, certificate, counts));
    }
}
