package org.notchwork.bundle;

import java.util.regex.Pattern;
import org.notchwork.json.Fields;

/** The names and versions of the files in a bundle. */
public final class Formats {

    /** A line of trials. */
    public static final String TRIAL = "notchwork-trial/1";

    /** A line of controls. */
    public static final String CONTROL = "notchwork-control/1";

    /** The file of figures. */
    public static final String SUMMARY = "notchwork-summary/1";

    /** The file of cross-checks. */
    public static final String CROSS_CHECKS = "notchwork-cross-checks/1";

    /** The file of claims. */
    public static final String CLAIMS = "notchwork-claims/1";

    /** The seal. */
    public static final String SEAL = "notchwork-seal/1";

    /** Where and when the study ran. */
    public static final String ENVIRONMENT = "notchwork-environment/1";

    private Formats() {}

    /** Notes a fault unless the member {@code format} names this format. */
    static void require(Fields fields, String format) {
        fields.text("format", Pattern.compile(Pattern.quote(format)), "\"" + format + "\" is wanted");
    }
}
