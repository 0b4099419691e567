package org.notchwork.problem.subspace;

import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code hidden-subspace}: {@code dimension}, from 1 to 62. */
public final class HiddenSubspaceFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "hidden-subspace";

    private static final int MOST = 62;

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        return Optional.of(new HiddenSubspace((int) settings.integer("dimension", 1, MOST)));
    }
}
