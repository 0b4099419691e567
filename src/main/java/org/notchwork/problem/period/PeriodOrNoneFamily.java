package org.notchwork.problem.period;

import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code xor-period-or-none}: {@code instances}, as for {@code xor-period}. */
public final class PeriodOrNoneFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "xor-period-or-none";

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        return Optional.of(new PeriodOrNone(Labelling.read(settings)));
    }
}
