package org.notchwork.problem;

import org.notchwork.bits.Word;

/**
 * Two points and the values a strategy saw there.
 *
 * @param x one point
 * @param y another point of the same width
 * @param fx the value at x
 * @param fy the value at y
 */
public record Pair(Word x, Word y, Word fx, Word fy) {

    /** Checks that the widths fit. */
    public Pair {
        if (x.width() != y.width() || fx.width() != fy.width()) {
            throw new IllegalArgumentException("points or values of different widths");
        }
    }

    /** Returns whether the points differ and the values are the same. */
    public boolean collides() {
        return !x.equals(y) && fx.equals(fy);
    }
}
