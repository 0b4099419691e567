package org.notchwork.study;

import java.math.BigDecimal;

/** What a claim says about a quantity. A closed set. */
public sealed interface Bound {

    /**
     * The quantity is at most this.
     *
     * @param high the bound
     */
    record AtMost(BigDecimal high) implements Bound {}

    /**
     * The quantity is at least this.
     *
     * @param low the bound
     */
    record AtLeast(BigDecimal low) implements Bound {}

    /**
     * The quantity lies between these.
     *
     * @param low the lower bound
     * @param high the upper bound, at least the lower
     */
    record Between(BigDecimal low, BigDecimal high) implements Bound {}
}
