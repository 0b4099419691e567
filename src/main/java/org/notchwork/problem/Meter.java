package org.notchwork.problem;

/**
 * Counts the calls of one trial and knows how many more the query limit allows. Not for use by several threads.
 *
 * <p>A strategy asks {@link Oracle#remaining} before it calls; a call beyond the limit is a fault of the strategy,
 * not an outcome, and throws.
 */
public final class Meter {

    private final long limit;
    private long classical;
    private long quantum;
    private long inverse;
    private long confirming;

    /** Creates a meter that allows {@code limit} calls of all kinds together. */
    public Meter(long limit) {
        if (limit < 1) {
            throw new IllegalArgumentException("a limit of " + limit + " calls");
        }
        this.limit = limit;
    }

    /** Returns how many more calls are allowed. */
    public long remaining() {
        return limit - classical - quantum - inverse - confirming;
    }

    /** Counts one call. */
    void count(CallKind kind) {
        if (remaining() == 0) {
            throw new IllegalStateException("a call beyond the limit of " + limit);
        }
        switch (kind) {
            case CLASSICAL -> classical++;
            case QUANTUM -> quantum++;
            case INVERSE -> inverse++;
            case CONFIRMING -> confirming++;
        }
    }

    /** Returns the counts so far. */
    public Counts counts() {
        return new Counts(classical, quantum, inverse, confirming);
    }
}
