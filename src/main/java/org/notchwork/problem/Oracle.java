package org.notchwork.problem;

import java.util.List;
import org.notchwork.bits.Word;

/**
 * The instance as a strategy sees it: it answers and counts, nothing else.
 *
 * <p>There is no road from here to the hidden answer other than asking. Not for use by several threads.
 */
public final class Oracle {

    private static final int ALL = -1;

    private final BitFunction function;
    private final Promise promise;
    private final Meter meter;
    private final List<Part> parts;
    private final int counter;

    /** Puts a meter in front of a function of which a promise is known. */
    public Oracle(BitFunction function, Promise promise, Meter meter) {
        this(function, promise, meter, List.of(), ALL);
    }

    /** Puts a meter in front of a function made of parts, which can be called on their own as well. */
    public Oracle(BitFunction function, Promise promise, Meter meter, List<Part> parts) {
        this(function, promise, meter, List.copyOf(parts), ALL);
    }

    private Oracle(BitFunction function, Promise promise, Meter meter, List<Part> parts, int counter) {
        this.function = function;
        this.promise = promise;
        this.meter = meter;
        this.parts = parts;
        this.counter = counter;
    }

    /** Returns what everybody is told about the function. */
    public Promise promise() {
        return promise;
    }

    /** Returns the number of input bits, at least 1. */
    public int width() {
        return function.width();
    }

    /** Returns the number of bits of a value, at least 1. */
    public int valueWidth() {
        return function.valueWidth();
    }

    /** Returns how many more values can be had within the query limit. */
    public long remaining() {
        return counter == ALL ? meter.remaining() / meter.functions() : meter.remaining();
    }

    /** Returns the value at a point, 0 ≤ x &lt; 2^width; counts one classical query. */
    public long query(long x) {
        count(CallKind.CLASSICAL);
        return function.at(x);
    }

    /** Returns the value at a point of any width; counts one classical query. */
    public Word query(Word x) {
        count(CallKind.CLASSICAL);
        return function.at(x);
    }

    /** Returns the value at a point, to confirm a candidate; counts one confirming query. */
    public long confirm(long x) {
        count(CallKind.CONFIRMING);
        return function.at(x);
    }

    /** Returns the value at a point of any width, to confirm a candidate; counts one confirming query. */
    public Word confirm(Word x) {
        count(CallKind.CONFIRMING);
        return function.at(x);
    }

    /**
     * Returns one of the functions that this one is made of, counted on its own.
     *
     * @param name the name of the part
     * @throws IllegalArgumentException if there is no such part
     */
    public Oracle part(String name) {
        for (int i = 0; i < parts.size(); i++) {
            if (parts.get(i).name().equals(name)) {
                return new Oracle(parts.get(i).function(), promise, meter, List.of(), i);
            }
        }
        throw new IllegalArgumentException("no part " + name);
    }

    private void count(CallKind kind) {
        if (counter == ALL) {
            meter.count(kind);
        } else {
            meter.count(kind, counter);
        }
    }
}
