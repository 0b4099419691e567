package org.notchwork.support;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;

/**
 * Pearson's chi-squared test of goodness of fit (K. Pearson, Philos. Mag. 50 (1900)). Neighbouring classes are pooled
 * until each expects at least five.
 *
 * @param statistic the sum of (observed − expected)² / expected over the pooled classes
 * @param degrees the degrees of freedom: pooled classes − 1
 */
public record ChiSquared(double statistic, int degrees) {

    private static final double LEAST_EXPECTED = 5;
    private static final double IMPROBABLE = 1e-4;

    /** Compares counts with weights; the weights need not sum to anything in particular. */
    public static ChiSquared of(long[] observed, double[] weights) {
        double factor = Arrays.stream(observed).sum() / Arrays.stream(weights).sum();
        double statistic = 0;
        int classes = 0;
        double pooledObserved = 0;
        double pooledExpected = 0;
        double rest = Arrays.stream(observed).sum();
        for (int i = 0; i < observed.length; i++) {
            if (weights[i] == 0) {
                assertEquals(0, observed[i], "class " + i + " is impossible");
                continue;
            }
            pooledObserved += observed[i];
            pooledExpected += weights[i] * factor;
            double left = rest - pooledExpected;
            boolean last = Arrays.stream(weights, i + 1, weights.length).sum() == 0;
            if (last || (pooledExpected >= LEAST_EXPECTED && left >= LEAST_EXPECTED)) {
                statistic += (pooledObserved - pooledExpected) * (pooledObserved - pooledExpected) / pooledExpected;
                classes++;
                rest = left;
                pooledObserved = 0;
                pooledExpected = 0;
            }
        }
        return new ChiSquared(statistic, classes - 1);
    }

    /** Compares counts with equal weights. */
    public static ChiSquared even(long[] observed) {
        double[] weights = new double[observed.length];
        Arrays.fill(weights, 1);
        return of(observed, weights);
    }

    /** Returns the probability of a statistic as large by chance. */
    public double p() {
        return ChiSquaredDistribution.of(degrees).survivalProbability(statistic);
    }

    /** Asserts that chance explains the difference. */
    public void assertFits() {
        assertTrue(p() > IMPROBABLE, () -> "p = " + p() + " for " + this);
    }
}
