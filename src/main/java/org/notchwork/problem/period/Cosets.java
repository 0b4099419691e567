package org.notchwork.problem.period;

/**
 * The cosets {x, x ⊕ s} of a period, each named by its member whose bit h is clear, h being the top set bit of s.
 *
 * @param width the number of bits
 * @param period s, not 0, below 2^width
 */
record Cosets(int width, long period) {

    Cosets {
        if (period <= 0 || period >>> width != 0) {
            throw new IllegalArgumentException("period " + period + " is not in 1 to 2^" + width + " - 1");
        }
    }

    /** Returns h, the position of the top set bit of the period. */
    int top() {
        return 63 - Long.numberOfLeadingZeros(period);
    }

    /** Returns the member of x's coset whose bit h is clear. */
    long representative(long x) {
        return (x >>> top() & 1) == 0 ? x : x ^ period;
    }
}
