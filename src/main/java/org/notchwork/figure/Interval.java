package org.notchwork.figure;

import java.math.BigDecimal;

/**
 * A confidence interval, both ends included.
 *
 * @param low the lower end
 * @param high the upper end, at least the lower
 */
public record Interval(BigDecimal low, BigDecimal high) {

    /** Checks the order. */
    public Interval {
        if (low.compareTo(high) > 0) {
            throw new IllegalArgumentException(low + " is above " + high);
        }
    }
}
