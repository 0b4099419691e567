package org.notchwork.bundle;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.notchwork.claim.ClaimResult;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.Interval;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Claim;
import org.notchwork.study.Study;
import org.notchwork.study.StudyJson;

/** The file of claims: {@code claims.json}. */
public final class ClaimsFile {

    private static final int LONGEST = 1000;

    private ClaimsFile() {}

    /** Returns the file as JSON. */
    public static JsonObject write(List<ClaimResult> claims) {
        return JsonObject.builder()
                .put(
                        "claims",
                        new JsonArray(claims.stream()
                                .<JsonValue>map(ClaimsFile::write)
                                .toList()))
                .put("format", Formats.CLAIMS)
                .build();
    }

    private static JsonObject write(ClaimResult result) {
        JsonObject.Builder json = JsonObject.builder()
                .put("claim", StudyJson.claim(result.claim()))
                .put("reason", result.reason())
                .put("value", Decimals.text(result.value()))
                .put("verdict", result.verdict().word());
        result.interval().ifPresent(i -> json.put("interval", SummaryFile.interval(i)));
        return json.build();
    }

    /**
     * Reads the file; the claims must be those of the study, in its order.
     *
     * @param value the file
     * @param study the study that it should be about
     * @param faults where faults are noted; what is returned must not be used if there are any
     */
    public static List<ClaimResult> read(JsonValue value, Study study, List<Fault> faults) {
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.CLAIMS);
        List<ClaimResult> results = new ArrayList<>();
        List<Claim> claims = study.claims();
        List<Fields.Item> items = fields.items("claims", claims.size(), claims.size());
        for (int i = 0; i < Math.min(items.size(), claims.size()); i++) {
            read(items.get(i).object(), claims.get(i)).ifPresent(results::add);
        }
        fields.end();
        return results;
    }

    private static Optional<ClaimResult> read(Fields fields, Claim claim) {
        fields.require("claim", StudyJson.claim(claim));
        String word = fields.text("verdict", 1, LONGEST);
        Optional<ClaimVerdict> verdict = Arrays.stream(ClaimVerdict.values())
                .filter(v -> v.word().equals(word))
                .findFirst();
        if (verdict.isEmpty()) {
            fields.fault("verdict", Fields.quoted(word), "supported, refuted or undecided is wanted");
        }
        BigDecimal value = SummaryReader.decimal(fields, "value");
        Optional<Interval> interval = fields.optionalObject("interval").map(SummaryReader::interval);
        String reason = fields.text("reason", 1, LONGEST);
        fields.end();
        return verdict.map(v -> new ClaimResult(claim, value, interval, v, reason));
    }
}
