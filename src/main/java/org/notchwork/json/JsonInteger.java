package org.notchwork.json;

/**
 * A whole number that every JSON reader holds exactly.
 *
 * @param value at most 2^53 − 1 in magnitude (RFC 7493, section 2.2)
 */
public record JsonInteger(long value) implements JsonValue {

    /** The largest magnitude, 2^53 − 1. */
    public static final long MAX = (1L << 53) - 1;

    /** Checks the range. */
    public JsonInteger {
        if (value > MAX || value < -MAX) {
            throw new IllegalArgumentException(value + " is beyond 2^53 - 1 in magnitude");
        }
    }

    @Override
    public String kind() {
        return "a whole number";
    }
}
