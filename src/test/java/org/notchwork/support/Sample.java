package org.notchwork.support;

import static org.junit.jupiter.api.Assertions.assertTrue;

/** Numbers observed, for a comparison of their mean with what theory says. Not for use by several threads. */
public final class Sample {

    private long size;
    private double sum;
    private double squares;

    /** Adds a number. */
    public void add(double number) {
        size++;
        sum += number;
        squares += number * number;
    }

    /** Adds a count. */
    public void add(long count) {
        add((double) count);
    }

    /** Adds 1 for what happened, 0 for what did not. */
    public void add(boolean happened) {
        add(happened ? 1.0 : 0.0);
    }

    /** Returns the mean. */
    public double mean() {
        return sum / (double) size;
    }

    /** Returns the standard error of the mean, from the numbers themselves. */
    public double error() {
        double variance = (squares - sum * sum / (double) size) / (double) (size - 1);
        return Math.sqrt(Math.max(0, variance) / (double) size);
    }

    /** Asserts that the mean is within so many of its own standard errors of an exact one. */
    public void assertMean(double expected, int errors) {
        assertNear(expected, errors * error());
    }

    /** Asserts that the mean is within so many standard errors of a rate that is known exactly. */
    public void assertRate(double rate, int errors) {
        assertNear(rate, errors * Math.sqrt(rate * (1 - rate) / (double) size));
    }

    /** Asserts that the mean is within so many standard errors of both of one that was measured elsewhere. */
    public void assertMean(double expected, double itsError, int errors) {
        assertNear(expected, errors * Math.hypot(error(), itsError));
    }

    private void assertNear(double expected, double allowed) {
        assertTrue(
                Math.abs(mean() - expected) <= allowed,
                () -> "mean " + mean() + " of " + size + ", not within " + allowed + " of " + expected);
    }
}
