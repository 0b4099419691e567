package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.strategy.Usage;
import org.notchwork.study.Cell;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** One line of a file of trials: its writer and its reader. */
public final class TrialLine {

    /** The greatest width of any problem. */
    static final int GREATEST_WIDTH = 2048;
    /** The longest label of a strategy. */
    static final int LONGEST_LABEL = 121;

    private static final int MOST_FUNCTIONS = 8;

    private TrialLine() {}

    /** Returns the line of a record of a problem with one function as JSON. */
    public static JsonObject write(TrialRecord record, StrategyChoice choice) {
        return write(record, choice, List.of());
    }

    /**
     * Returns the line of a record as JSON.
     *
     * @param functions the names of the functions that are counted apart; empty if there is but one
     */
    public static JsonObject write(TrialRecord record, StrategyChoice choice, List<String> functions) {
        JsonObject.Builder line = JsonObject.builder()
                .put("calls", counts(record.counts()))
                .put("equations", record.usage().equations())
                .put("format", Formats.TRIAL)
                .put("hidden", AnswerForm.write(record.hidden()))
                .put("memory-words", record.usage().memoryWords())
                .put("outcome", record.outcome().word())
                .put("strategy", record.cell().label())
                .put("trial", record.trial())
                .put("width", record.cell().width())
                .put("engine", choice.engine().map(e -> e.name()))
                .put("sight", choice.sight());
        if (!record.byFunction().isEmpty()) {
            JsonArray each = new JsonArray(IntStream.range(0, functions.size())
                    .<JsonValue>mapToObj(
                            i -> named(functions.get(i), record.byFunction().get(i)))
                    .toList());
            line.put("calls-by-function", each);
        }
        record.answer().ifPresent(a -> line.put("answer", AnswerForm.write(a)));
        record.certificate().ifPresent(c -> line.put("certificate", CertificateForm.write(c)));
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
        List<Counts> byFunction = byFunction(fields, counts);
        Usage usage = new Usage(
                fields.integer("equations", 0, JsonInteger.MAX), fields.integer("memory-words", 0, JsonInteger.MAX));
        Optional<Answer> hidden = AnswerForm.read(fields.object("hidden"), width);
        Optional<Answer> answer = Optional.empty();
        Optional<Certificate> certificate = Optional.empty();
        if (outcome.isPresent() && (outcome.get() == Outcome.SOLVED || outcome.get() == Outcome.WRONG)) {
            answer = AnswerForm.read(fields.object("answer"), width);
            certificate = CertificateForm.read(fields.object("certificate"), width);
        }
        fields.end();
        if (faults.size() > before) {
            return Optional.empty();
        }
        TrialRecord record = new TrialRecord(
                cell,
                trial,
                hidden.orElseThrow(),
                outcome.orElseThrow(),
                answer,
                certificate,
                counts,
                byFunction,
                usage);
        return Optional.of(new Read(record, engine, sight));
    }

    private static Optional<Outcome> outcome(Fields fields) {
        String word = fields.text("outcome", 1, 20);
        for (Outcome outcome : Outcome.values()) {
            if (outcome.word().equals(word)) {
                return Optional.of(outcome);
            }
        }
        fields.fault("outcome", Fields.quoted(word), "solved, wrong, censored or unanswered is wanted");
        return Optional.empty();
    }

    private static JsonObject named(String function, Counts counts) {
        JsonObject.Builder json = JsonObject.builder().put("function", function);
        counts(counts).members().forEach(json::put);
        return json.build();
    }

    private static List<Counts> byFunction(Fields fields, Counts all) {
        List<Counts> each = new ArrayList<>();
        for (Fields.Item item :
                fields.optionalItems("calls-by-function", 2, MOST_FUNCTIONS).orElse(List.of())) {
            Fields one = item.object();
            one.text("function", 1, LONGEST_LABEL);
            each.add(counts(one));
        }
        Counts sum = each.stream().reduce(Counts.NONE, Counts::plus);
        if (!each.isEmpty() && !sum.equals(all)) {
            fields.fault("calls-by-function", "the functions do not add up to the calls", "their sum is wanted");
        }
        return each;
    }

    /** Returns the counts as the members that every list of calls has. */
    static JsonObject counts(Counts counts) {
        return JsonObject.builder()
                .put("classical", counts.classical())
                .put("confirming", counts.confirming())
                .put("inverse", counts.inverse())
                .put("quantum", counts.quantum())
                .build();
    }

    /** Reads the members that every list of calls has. */
    static Counts counts(Fields fields) {
        long most = JsonInteger.MAX / 4;
        Counts counts = new Counts(
                fields.integer("classical", 0, most),
                fields.integer("quantum", 0, most),
                fields.integer("inverse", 0, most),
                fields.integer("confirming", 0, most));
        fields.end();
        return counts;
    }
}
