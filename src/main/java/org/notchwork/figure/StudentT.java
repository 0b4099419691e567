package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * The two-sided 95 % quantile of Student's t distribution (Student, Biometrika 6 (1908)).
 *
 * <p>It is rounded to six places before use: the last digits of a computed quantile may differ between machines, and
 * no quantile of up to 20 000 degrees of freedom lies so near a rounding boundary that this could matter.
 */
final class StudentT {

    private static final double PROBABILITY = 0.975;
    private static final int PLACES = 6;

    private StudentT() {}

    /** Returns t with P(|T| ≤ t) = 0.95, rounded to six places. */
    static BigDecimal quantile(long degreesOfFreedom) {
        return new BigDecimal(exact(degreesOfFreedom)).setScale(PLACES, RoundingMode.HALF_EVEN);
    }

    /** Returns the quantile as computed, not rounded. */
    static double exact(long degreesOfFreedom) {
        return TDistribution.of((double) degreesOfFreedom).inverseCumulativeProbability(PROBABILITY);
    }
}
