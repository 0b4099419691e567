package org.notchwork.bundle;

import java.util.List;
import org.notchwork.claim.ClaimResult;
import org.notchwork.exact.Decimals;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.study.StudyJson;

/** The file of claims: {@code claims.json}. */
public final class ClaimsFile {

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
}
