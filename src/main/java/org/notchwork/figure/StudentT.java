package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * The two-sided 95 % quantile of Student's t distribution (Student, Biometrika 6 (1908)), to six places.
 *
 * <p>The library's doubles are right to about 10^−14, but two machines could still round a value on a boundary
 * to different sides. Where a value lies within 10^−9 of one, the exact distribution at the boundary decides; so the
 * six places are the same everywhere.
 */
final class StudentT {

    private static final double PROBABILITY = 0.975;
    private static final BigDecimal CENTRAL = new BigDecimal("0.95");
    private static final int PLACES = 6;
    private static final BigDecimal HALF_STEP = new BigDecimal("0.0000005");
    private static final BigDecimal STEP = new BigDecimal("0.000001");
    private static final BigDecimal DOUBT = new BigDecimal("1e-9");

    private StudentT() {}

    /** Returns t with P(|T| ≤ t) = 0.95, rounded to six places. */
    static BigDecimal quantile(long degreesOfFreedom) {
        BigDecimal value = new BigDecimal(exact(degreesOfFreedom));
        BigDecimal floor = value.setScale(PLACES, RoundingMode.FLOOR);
        BigDecimal boundary = floor.add(HALF_STEP);
        if (value.subtract(boundary).abs().compareTo(DOUBT) > 0) {
            return value.setScale(PLACES, RoundingMode.HALF_EVEN);
        }
        boolean above = StudentCentral.probability(boundary, degreesOfFreedom).compareTo(CENTRAL) < 0;
        return above ? floor.add(STEP) : floor;
    }

    /** Returns the quantile as the library computes it, not rounded. */
    static double exact(long degreesOfFreedom) {
        return TDistribution.of((double) degreesOfFreedom).inverseCumulativeProbability(PROBABILITY);
    }
}
