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

    private static final CallKind[] KINDS = CallKind.values();

    private final long limit;
    private final long[][] counts;
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
        this.counts = new long[functions][KINDS.length];
    }

    /** Returns how many more calls are allowed. */
    public long remaining() {
        return limit - total;
    }

    /** Returns how many functions have a counter. */
    int functions() {
        return counts.length;
    }

    /** Counts one call of every function: what one value of a function made of all of them costs. */
    void count(CallKind kind) {
        for (int function = 0; function < counts.length; function++) {
            count(kind, function);
        }
    }

    /** Counts one call of one function. */
    void count(CallKind kind, int function) {
        if (remaining() == 0) {
            throw new IllegalStateException("a call beyond the limit of " + limit);
        }
        counts[function][kind.ordinal()]++;
        total++;
    }

    /** Returns the counts so far, all functions together. */
    public Counts counts() {
        return byFunction().stream().reduce(Counts.NONE, Counts::plus);
    }

    /** Returns the counts so far, one a function. */
    public List<Counts> byFunction() {
        List<Counts> list = new ArrayList<>();
        for (long[] one : counts) {
            list.add(new Counts(
                    one[CallKind.CLASSICAL.ordinal()],
                    one[CallKind.QUANTUM.ordinal()],
                    one[CallKind.INVERSE.ordinal()],
                    one[CallKind.CONFIRMING.ordinal()]));
        }
        return list;
    }
}
