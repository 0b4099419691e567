package org.notchwork.problem.affine;

import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code affine-period}: there are none. */
public final class AffinePeriodFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "affine-period";

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        return Optional.of(new AffinePeriod());
    }
}
