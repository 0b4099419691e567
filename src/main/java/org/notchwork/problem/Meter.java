package org.notchwork.problem;

import java.util.ArrayList;
import java.util.List;

/**
 * Counts the calls of one trial, each function apart, and knows how many more the query limit allows. Not for use by
 * several threads.
 *
 * <p>A strategy asks {@link Oracle#remaining} before it calls; a call beyond the limit is a fault of the strategy,
 * not an outcome, and throws.
 */
public final class Meter {

    private final long limit;
    private final List<Counter> counters = new ArrayList<>();
    private long total;

    /** Creates a meter for one function that allows {@code limit} calls of all kinds together. */
    public Meter(long limit) {
        this(limit, 1);
    }

    /**
     * Creates a meter.
     *
     * @param limit how many calls of all kinds and all functions together are allowed, at least 1
     * @param functions how many functions have a counter, at least 1
     */
    public Meter(long limit, int functions) {
        if (limit < 1 || functions < 1) {
            throw new IllegalArgumentException("a limit of " + limit + " calls of " + functions + " functions");
        }
        this.limit = limit;
        for (int function = 0; function < functions; function++) {
            counters.add(new Counter());
        }
    }

    /** Returns how many more calls are allowed. */
    public long remaining() {
        return limit - total;
    }

    /** Returns how many functions have a counter. */
    int functions() {
        return counters.size();
    }

    /** Counts one call of every function: what one value of a function made of all of them costs. */
    void count(CallKind kind) {
        for (int function = 0; function < counters.size(); function++) {
            count(kind, function);
        }
    }

    /** Counts one call of one function. */
    void count(CallKind kind, int function) {
        if (remaining() == 0) {
            throw new IllegalStateException("a call beyond the limit of " + limit);
        }
        counters.get(function).count(kind);
        total++;
    }

    /** Returns the counts so far, all functions together. */
    public Counts counts() {
        return byFunction().stream().reduce(Counts.NONE, Counts::plus);
    }

    /** Returns the counts so far, one a function. */
    public List<Counts> byFunction() {
        return counters.stream().map(Counter::counts).toList();
    }

    /** The counts of one function. */
    private static final class Counter {

        private long classical;
        private long quantum;
        private long inverse;
        private long confirming;

        void count(CallKind kind) {
            switch (kind) {
                case CLASSICAL -> classical++;
                case QUANTUM -> quantum++;
                case INVERSE -> inverse++;
                case CONFIRMING -> confirming++;
            }
        }

        Counts counts() {
            return new Counts(classical, quantum, inverse, confirming);
        }
    }
}
