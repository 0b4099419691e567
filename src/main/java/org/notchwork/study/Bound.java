package org.notchwork.study;

import java.math.BigDecimal;

/**
 * What a claim says about a quantity. A closed set.
 *
 * <p>A bound is the decimal that the author wrote, its digits after the point included: {@code "9.50"} and
 * {@code "9.5"} are the same number and different bounds. It is written back by {@link BigDecimal#toPlainString}, so
 * that a study is read back equal; {@code "-0"} is read as 0.
 */
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
    record Between(BigDecimal low, BigDecimal high) implements Bound {

        /** Checks that the bounds are in order. */
        public Between {
            if (low.compareTo(high) > 0) {
                throw new IllegalArgumentException(low + " is above " + high);
            }
        }
    }
}
