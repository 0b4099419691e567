package org.notchwork.verify;

import java.time.LocalDate;
import org.notchwork.json.JsonObject;

/**
 * What a referee attaches to a report: the verdict, the day, what it was made with. Names nobody and no machine.
 *
 * @param verdict the verdict
 * @param day the day of the check
 * @param program the program and its version
 * @param asked what the referee asked for, in one line
 */
public record VerdictRecord(Verdict verdict, LocalDate day, String program, String asked) {

    /** Returns the record as JSON. */
    public JsonObject json() {
        return JsonObject.builder()
                .put("asked", asked)
                .put("day", day.toString())
                .put("format", "notchwork-record/1")
                .put("program", program)
                .put("verdict", verdict.json())
                .build();
    }
}
