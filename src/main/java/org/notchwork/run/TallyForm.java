package org.notchwork.run;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.notchwork.check.Comparison;
import org.notchwork.check.InstanceTally;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/** Writes and reads what exhaustive checks of one instance found, for the journal. */
final class TallyForm {

    private static final int LONGEST = 60_000;
    private static final int MOST = 100;
    private static final int BOUND_PLACES = 30;

    private TallyForm() {}

    static JsonObject write(InstanceTally tally) {
        JsonObject.Builder bounds = JsonObject.builder();
        tally.samplingBounds().forEach((label, bound) -> bounds.put(label, Decimals.text(bound, BOUND_PLACES)));
        return JsonObject.builder()
                .put("accidents", tally.accidents())
                .put(
                        "ambiguous",
                        new JsonArray(tally.ambiguous().stream()
                                .<JsonValue>map(JsonInteger::new)
                                .toList()))
                .put("answers", comparison(tally.answers()))
                .put("engines", comparison(tally.engines()))
                .put("promise", comparison(tally.promise()))
                .put("sampling-bounds", bounds.build())
                .build();
    }

    /** Returns the tally; empty if the form is another. */
    static Optional<InstanceTally> read(JsonValue value) {
        List<Fault> faults = new ArrayList<>();
        Fields fields = Fields.of(value, "", faults);
        List<Long> ambiguous = fields.items("ambiguous", 0, MOST).stream()
                .map(item -> item.integer(0, JsonInteger.MAX))
                .toList();
        Map<String, BigDecimal> bounds = new TreeMap<>();
        fields.object("sampling-bounds").whole().members().forEach((label, bound) -> {
            if (bound instanceof JsonText text) {
                bounds.put(label, new BigDecimal(text.value()));
            }
        });
        long accidents = fields.integer("accidents", 0, JsonInteger.MAX);
        Comparison promise = comparison(fields.object("promise"));
        Comparison answers = comparison(fields.object("answers"));
        Comparison engines = comparison(fields.object("engines"));
        fields.end();
        return faults.isEmpty()
                ? Optional.of(new InstanceTally(promise, answers, engines, accidents, bounds, ambiguous))
                : Optional.empty();
    }

    private static JsonObject comparison(Comparison comparison) {
        return JsonObject.builder()
                .put("compared", comparison.compared())
                .put("differing", comparison.differing())
                .put("first", comparison.first())
                .build();
    }

    private static Comparison comparison(Fields fields) {
        Comparison comparison = new Comparison(
                fields.integer("compared", 0, JsonInteger.MAX),
                fields.integer("differing", 0, JsonInteger.MAX),
                fields.optionalText("first", 0, LONGEST));
        fields.end();
        return comparison;
    }
}
