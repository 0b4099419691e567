package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.problem.Family;
import org.notchwork.problem.period.XorPeriodFamily;

/** The families of problems there are. */
public final class Problems {

    private static final List<Family> ALL = List.of(new XorPeriodFamily());

    private Problems() {}

    /** Returns the kinds, in the order of the documentation. */
    public static List<String> kinds() {
        return ALL.stream().map(Family::kind).toList();
    }

    /** Returns the family of a kind. */
    public static Optional<Family> family(String kind) {
        return ALL.stream().filter(f -> f.kind().equals(kind)).findFirst();
    }
}
