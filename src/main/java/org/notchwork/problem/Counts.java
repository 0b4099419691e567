package org.notchwork.problem;

/**
 * How often one function was called, by kind.
 *
 * @param classical evaluations while searching
 * @param quantum uses of U_f
 * @param inverse uses of the inverse of U_f
 * @param confirming evaluations that confirm a candidate
 */
public record Counts(long classical, long quantum, long inverse, long confirming) {

    /** Nothing called yet. */
    public static final Counts NONE = new Counts(0, 0, 0, 0);

    /** Checks that no count is negative. */
    public Counts {
        if (classical < 0 || quantum < 0 || inverse < 0 || confirming < 0) {
            throw new IllegalArgumentException("a negative count");
        }
    }

    /** Returns the calls spent on finding the answer: the headline count, confirmation not included. */
    public long queries() {
        return Math.addExact(Math.addExact(classical, quantum), inverse);
    }

    /** Returns all calls, confirmation included; the query limit of a study bounds this. */
    public long total() {
        return Math.addExact(queries(), confirming);
    }

    /** Returns both counts together. */
    public Counts plus(Counts other) {
        return new Counts(
                Math.addExact(classical, other.classical),
                Math.addExact(quantum, other.quantum),
                Math.addExact(inverse, other.inverse),
                Math.addExact(confirming, other.confirming));
    }

    /** Returns these counts with one more call of a kind. */
    public Counts plus(CallKind kind) {
        return switch (kind) {
            case CLASSICAL -> new Counts(classical + 1, quantum, inverse, confirming);
            case QUANTUM -> new Counts(classical, quantum + 1, inverse, confirming);
            case INVERSE -> new Counts(classical, quantum, inverse + 1, confirming);
            case CONFIRMING -> new Counts(classical, quantum, inverse, confirming + 1);
        };
    }
}
