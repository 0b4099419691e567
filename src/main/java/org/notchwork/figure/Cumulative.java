package org.notchwork.figure;

import java.math.BigDecimal;

/** The cumulative function of a law on 0, 1, 2, …. */
@FunctionalInterface
public interface Cumulative {

    /**
     * Returns P(X ≤ m), right to 45 places after the point at least; it never falls, and it is 1 above a bounded
     * support.
     *
     * @param m any number from 0
     */
    BigDecimal atMost(long m);
}
