package org.notchwork.verify;

import java.util.List;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.json.Printable;

/**
 * What one stage found.
 *
 * @param stage the stage
 * @param outcome how it ended
 * @param sentence what was done and found, in one sentence
 * @param findings the first differences
 * @param differences how many differences there are
 */
public record StageReport(
        Stage stage, StageOutcome outcome, String sentence, List<Finding> findings, long differences) {

    /** Copies the findings. */
    public StageReport {
        findings = List.copyOf(findings);
    }

    /** Returns a report without findings. */
    static StageReport of(Stage stage, StageOutcome outcome, String sentence) {
        return new StageReport(stage, outcome, Printable.escape(sentence), List.of(), 0);
    }

    /** Returns a report that passes if nothing was found. */
    static StageReport of(Stage stage, Findings findings, String good, String bad) {
        return findings.isEmpty()
                ? of(stage, StageOutcome.PASSED, good)
                : new StageReport(
                        stage, StageOutcome.FAILED, Printable.escape(bad), findings.first(), findings.count());
    }

    /** Returns the report as JSON. */
    JsonObject json() {
        return JsonObject.builder()
                .put("differences", differences)
                .put("does-not-prove", stage.doesNotProve())
                .put(
                        "findings",
                        new JsonArray(
                                findings.stream().<JsonValue>map(Finding::json).toList()))
                .put("outcome", outcome.word())
                .put("proves", stage.proves())
                .put("sentence", sentence)
                .put("stage", stage.word())
                .build();
    }
}
