package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/** The file of cross-checks: {@code cross-checks.json}. */
public final class CrossChecksFile {

    private static final int MOST = 100_000;
    private static final int LONGEST = 1000;

    private CrossChecksFile() {}

    /** Returns the file as JSON. */
    public static JsonObject write(List<CrossCheck> checks) {
        return JsonObject.builder()
                .put("attention", SummaryFile.attention(checks))
                .put(
                        "checks",
                        new JsonArray(checks.stream()
                                .<JsonValue>map(CrossChecksFile::write)
                                .toList()))
                .put("format", Formats.CROSS_CHECKS)
                .build();
    }

    /** Returns one check as JSON. */
    public static JsonObject write(CrossCheck check) {
        return JsonObject.builder()
                .put("compared", check.compared())
                .put("expected", check.expected())
                .put("kind", check.kind().word())
                .put("observed", check.observed())
                .put("outcome", check.outcome().word())
                .put("source", check.kind().source())
                .put("standard-errors", check.standardErrors())
                .put("statement", check.kind().statement())
                .put("subject", check.subject())
                .build();
    }

    /** Reads the file; what is returned must not be used if faults were noted. */
    public static List<CrossCheck> read(JsonValue value, List<Fault> faults) {
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.CROSS_CHECKS);
        List<CrossCheck> checks = new ArrayList<>();
        for (Fields.Item item : fields.items("checks", 0, MOST)) {
            read(item.object()).ifPresent(checks::add);
        }
        fields.require("attention", new JsonText(SummaryFile.attention(checks)));
        fields.end();
        return checks;
    }

    private static Optional<CrossCheck> read(Fields fields) {
        String word = fields.text("kind", 1, 40);
        Optional<CheckKind> kind = Arrays.stream(CheckKind.values())
                .filter(k -> k.word().equals(word))
                .findFirst();
        String outcomeWord = fields.text("outcome", 1, 40);
        Optional<CheckOutcome> outcome = Arrays.stream(CheckOutcome.values())
                .filter(o -> o.word().equals(outcomeWord))
                .findFirst();
        if (kind.isEmpty()) {
            fields.fault("kind", Fields.quoted(word), "a kind of check that this program knows is wanted");
        }
        if (outcome.isEmpty()) {
            fields.fault("outcome", Fields.quoted(outcomeWord), "agrees, differs or not-comparable is wanted");
        }
        kind.ifPresent(k -> {
            fields.require("source", new JsonText(k.source()));
            fields.require("statement", new JsonText(k.statement()));
        });
        String subject = fields.text("subject", 1, LONGEST);
        long compared = fields.integer("compared", 0, JsonInteger.MAX);
        String expected = fields.text("expected", 1, LONGEST);
        String observed = fields.text("observed", 1, LONGEST);
        Optional<String> errors = fields.optionalText("standard-errors", Decimals.FORM, "a decimal is wanted");
        fields.end();
        return kind.isPresent() && outcome.isPresent()
                ? Optional.of(new CrossCheck(kind.get(), subject, compared, expected, observed, errors, outcome.get()))
                : Optional.empty();
    }
}
