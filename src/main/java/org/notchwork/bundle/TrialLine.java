package org.notchwork.bundle;

import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Pair;
import org.notchwork.strategy.Usage;
import org.notchwork.study.Cell;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** One line of a file of trials: its writer and its reader. */
public final class TrialLine {

    private static final int GREATEST_WIDTH = 63;
    private static final int LONGEST_LABEL = 121;

    private TrialLine() {}

    /** Returns the line of a record as JSON. */
    public static JsonObject write(TrialRecord record, StrategyChoice choice) {
        JsonObject.Builder line = JsonObject.builder()
                .put("calls", counts(record.counts()))
                .put("equations", record.usage().equations())
                .put("format", Formats.TRIAL)
                .put("hidden", answer(record.hidden()))
                .put("memory-words", record.usage().memoryWords())
                .put("outcome", record.outcome().word())
                .put("strategy", record.cell().label())
                .put("trial", record.trial())
                .put("width", record.cell().width())
                .put("engine", choice.engine().map(e -> e.name()))
                .put("sight", choice.sight());
        record.answer().ifPresent(a -> line.put("answer", answer(a)));
        record.certificate().ifPresent(c -> line.put("certificate", certificate(c)));
        return line.build();
    }

    /**
     * A line as it was read.
     *
     * @param record the record
     * @param engine the engine that the line names
     * @param sight what the line says that the engine was told
     */
    public record Read(TrialRecord record, Optional<String> engine, Optional<String> sight) {}

    /**
     * Reads a line. Whether it is the line that the study calls for is for others to ask.
     *
     * @param value the line
     * @param experiment the id of the experiment whose file it stands in
     * @param faults where faults are noted, one or more exactly if nothing is returned
     */
    public static Optional<Read> read(JsonValue value, String experiment, List<Fault> faults) {
        int before = faults.size();
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.TRIAL);
        int width = (int) fields.integer("width", 1, GREATEST_WIDTH);
        Cell cell = new Cell(experiment, width, fields.text("strategy", 1, LONGEST_LABEL));
        long trial = fields.integer("trial", 0, JsonInteger.MAX);
        Optional<String> engine = fields.optionalText("engine", 1, LONGEST_LABEL);
        Optional<String> sight = fields.optionalText("sight", 1, LONGEST_LABEL);
        Optional<Outcome> outcome = outcome(fields);
        Counts counts = counts(fields.object("calls"));
        Usage usage = new Usage(
                fields.integer("equations", 0, JsonInteger.MAX), fields.integer("memory-words", 0, JsonInteger.MAX));
        Optional<Answer> hidden = answer(fields.object("hidden"), width);
        Optional<Answer> answer = Optional.empty();
        Optional<Certificate> certificate = Optional.empty();
        if (outcome.isPresent() && outcome.get() != Outcome.CENSORED) {
            answer = answer(fields.object("answer"), width);
            certificate = CertificateForm.read(fields.object("certificate"), width);
        }
        fields.end();
        if (faults.size() > before) {
            return Optional.empty();
        }
        TrialRecord record = new TrialRecord(
                cell, trial, hidden.orElseThrow(), outcome.orElseThrow(), answer, certificate, counts, usage);
        return Optional.of(new Read(record, engine, sight));
    }

    private static Optional<Outcome> outcome(Fields fields) {
        String word = fields.text("outcome", 1, 20);
        for (Outcome outcome : Outcome.values()) {
            if (outcome.word().equals(word)) {
                return Optional.of(outcome);
            }
        }
        fields.fault("outcome", Fields.quoted(word), "solved, wrong or censored is wanted");
        return Optional.empty();
    }

    private static JsonObject counts(Counts counts) {
        return JsonObject.builder()
                .put("classical", counts.classical())
                .put("confirming", counts.confirming())
                .put("inverse", counts.inverse())
                .put("quantum", counts.quantum())
                .build();
    }

    private static Counts counts(Fields fields) {
        long most = JsonInteger.MAX / 4;
        Counts counts = new Counts(
                fields.integer("classical", 0, most),
                fields.integer("quantum", 0, most),
                fields.integer("inverse", 0, most),
                fields.integer("confirming", 0, most));
        fields.end();
        return counts;
    }

    private static JsonObject answer(Answer answer) {
        Answer.Period period = (Answer.Period) answer;
        return JsonObject.builder().put("period", period.s().hex()).build();
    }

    private static Optional<Answer> answer(Fields fields, int width) {
        Optional<Word> s = CertificateForm.word(fields, "period", width);
        fields.end();
        if (s.isPresent() && s.get().isZero()) {
            fields.fault("period", "0", "a period is not 0");
            return Optional.empty();
        }
        return s.map(Answer.Period::new);
    }

    private static JsonObject certificate(Certificate certificate) {
        if (certificate instanceof Certificate.Collision collision) {
            return JsonObject.builder().put("collision", pair(collision.pair())).build();
        }
        Certificate.Equations equations = (Certificate.Equations) certificate;
        JsonObject body = JsonObject.builder()
                .put("confirmation", pair(equations.confirmation()))
                .put(
                        "words",
                        JsonArray.ofTexts(
                                equations.words().stream().map(Word::hex).toList()))
                .build();
        return JsonObject.builder().put("equations", body).build();
    }

    private static JsonObject pair(Pair pair) {
        return JsonObject.builder()
                .put("fx", pair.fx().hex())
                .put("fy", pair.fy().hex())
                .put("x", pair.x().hex())
                .put("y", pair.y().hex())
                .build();
    }
}
