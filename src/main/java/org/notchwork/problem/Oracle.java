package org.notchwork.problem;

/**
 * The instance as a strategy sees it: it answers and counts, nothing else.
 *
 * <p>There is no road from here to the hidden answer other than asking. Not for use by several threads.
 */
public final class Oracle {

    private final BitFunction function;
    private final Meter meter;

    /** Puts a meter in front of a function. */
    public Oracle(BitFunction function, Meter meter) {
        this.function = function;
        this.meter = meter;
    }

    /** Returns the number of input bits, 1 to 63. */
    public int width() {
        return function.width();
    }

    /** Returns the number of bits of a value, 1 to 63. */
    public int valueWidth() {
        return function.valueWidth();
    }

    /** Returns how many more calls the query limit allows. */
    public long remaining() {
        return meter.remaining();
    }

    /** Returns the value at a point, 0 ≤ x &lt; 2^width; counts one classical query. */
    public long query(long x) {
        meter.count(CallKind.CLASSICAL);
        return function.at(x);
    }

    /** Returns the value at a point, to confirm a candidate; counts one confirming query. */
    public long confirm(long x) {
        meter.count(CallKind.CONFIRMING);
        return function.at(x);
    }
}
