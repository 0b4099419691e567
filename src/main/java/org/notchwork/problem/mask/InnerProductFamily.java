package org.notchwork.problem.mask;

import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code inner-product}: {@code constant-bit}, true or false (the default). */
public final class InnerProductFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "inner-product";

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        return Optional.of(
                new InnerProduct(settings.optionalTruth("constant-bit").orElse(false)));
    }
}
