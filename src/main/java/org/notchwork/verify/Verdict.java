package org.notchwork.verify;

import java.util.List;
import java.util.Optional;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/**
 * What verification concludes.
 *
 * @param stages one report a stage, in order
 * @param seal the seal as computed, where it could be
 * @param failedChecks how many cross-checks the bundle itself reports as failed
 * @param notCovered the payload files that are not under the seal: of them only the digests were compared
 */
public record Verdict(List<StageReport> stages, Optional<String> seal, long failedChecks, List<String> notCovered) {

    /** Copies the lists. */
    public Verdict {
        stages = List.copyOf(stages);
        notCovered = List.copyOf(notCovered);
    }

    /** Returns the exit code of the design: 0, 10, 11 or 12. */
    public int exitCode() {
        if (any(StageOutcome.MALFORMED)) {
            return 12;
        }
        if (any(StageOutcome.FAILED) || failedChecks > 0) {
            return 10;
        }
        return any(StageOutcome.NOT_FINISHED) ? 11 : 0;
    }

    /** Returns the verdict in one plain sentence. */
    public String sentence() {
        Optional<StageReport> worst = first(StageOutcome.MALFORMED).or(() -> first(StageOutcome.FAILED));
        if (worst.isPresent()) {
            String word = worst.get().outcome() == StageOutcome.MALFORMED ? "MALFORMED" : "NO";
            return word + ": " + worst.get().stage().word() + ": " + worst.get().sentence();
        }
        if (failedChecks > 0) {
            return "NO: intact, but the bundle itself reports " + failedChecks + " failed cross-checks";
        }
        if (any(StageOutcome.NOT_FINISHED)) {
            return "NOT FINISHED: what was checked agrees, but the re-run or the fresh run was stopped";
        }
        Optional<StageReport> rerun = stage(Stage.RERUN).filter(r -> r.outcome() == StageOutcome.PASSED);
        Optional<StageReport> fresh = stage(Stage.FRESH).filter(r -> r.outcome() == StageOutcome.PASSED);
        String same = rerun.map(r -> "re-run " + r.sentence()).orElse("no trial was run again (--rerun 50 runs some)");
        return "YES: intact; figures follow from the lines; " + same
                + fresh.map(f -> "; fresh run " + f.sentence()).orElse("");
    }

    /** Returns the report of a stage. */
    public Optional<StageReport> stage(Stage stage) {
        return stages.stream().filter(s -> s.stage() == stage).findFirst();
    }

    /** Returns the verdict as JSON. */
    public JsonObject json() {
        return JsonObject.builder()
                .put("exit-code", exitCode())
                .put("failed-cross-checks", failedChecks)
                .put("format", "notchwork-verdict/1")
                .put("not-covered", JsonArray.ofTexts(notCovered))
                .put("seal", seal)
                .put(
                        "stages",
                        new JsonArray(stages.stream()
                                .<JsonValue>map(StageReport::json)
                                .toList()))
                .put("verdict", sentence())
                .build();
    }

    private boolean any(StageOutcome outcome) {
        return first(outcome).isPresent();
    }

    private Optional<StageReport> first(StageOutcome outcome) {
        return stages.stream().filter(s -> s.outcome() == outcome).findFirst();
    }
}
