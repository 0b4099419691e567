package org.notchwork.json;

/**
 * How much a document may hold before it is refused.
 *
 * @param bytes the longest document, in bytes
 * @param depth the deepest nesting of arrays and objects
 * @param text the longest string or member name, in characters
 */
public record JsonLimits(int bytes, int depth, int text) {

    /** A whole small file: a study, a summary. 64 MiB, 64 levels, strings of 65 536 characters. */
    public static final JsonLimits FILE = new JsonLimits(64 << 20, 64, 1 << 16);

    /** One line of a file of trials: 1 MiB. */
    public static final JsonLimits LINE = new JsonLimits(1 << 20, 16, 1 << 16);
}
