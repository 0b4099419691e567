package org.notchwork.report;

import java.nio.charset.StandardCharsets;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;

/** TEMP. */
public final class Report {
    private Report() {}

    /** TEMP. */
    public static byte[] pdf(Results results, String seal, Environment environment) {
        return (results.study().title() + seal + environment.java()).getBytes(StandardCharsets.UTF_8);
    }
}
