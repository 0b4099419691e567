package org.notchwork.check;

import java.util.Optional;

/**
 * How many things were compared, how many differed, and the first that did.
 *
 * @param compared how many were compared
 * @param differing how many of them differed
 * @param first what the first difference was; present exactly if there is one
 */
public record Comparison(long compared, long differing, Optional<String> first) {

    /** Nothing compared yet. */
    public static final Comparison NONE = new Comparison(0, 0, Optional.empty());

    /** Checks that the first difference is there exactly if there is one. */
    public Comparison {
        if (differing > 0 != first.isPresent() || differing > compared || differing < 0) {
            throw new IllegalArgumentException(differing + " of " + compared + " differ, first: " + first);
        }
    }

    /** Returns one comparison that agreed. */
    public static Comparison agreed() {
        return new Comparison(1, 0, Optional.empty());
    }

    /** Returns one comparison that differed. */
    public static Comparison differed(String what) {
        return new Comparison(1, 1, Optional.of(what));
    }

    /** Returns both together; the first difference of this one goes before that of the other. */
    public Comparison plus(Comparison other) {
        return new Comparison(compared + other.compared, differing + other.differing, first.or(() -> other.first));
    }

    /** Returns the outcome of a check that is this comparison. */
    public CheckOutcome outcome() {
        if (compared == 0) {
            return CheckOutcome.NOT_COMPARABLE;
        }
        return differing == 0 ? CheckOutcome.AGREES : CheckOutcome.DIFFERS;
    }

    /** Returns the observation in one line. */
    public String text() {
        return differing + " of " + compared + " differ"
                + first.map(f -> "; first: " + f).orElse("");
    }
}
