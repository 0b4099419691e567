package org.notchwork.verify;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Which trials are run again. A closed set. */
public sealed interface Rerun {

    /** None. */
    record None() implements Rerun {}

    /** All of them, and the exhaustive checks with them. */
    record All() implements Rerun {}

    /**
     * Returns the smallest sample that would hold at least one forged trial with a probability.
     *
     * @param all how many trials there are, at least 1
     * @param caught the probability, above 0 and at most 1
     * @param share which part of the trials is forged, above 0 and at most 1
     */
    static int until(long all, BigDecimal caught, BigDecimal share) {
        long forged = Math.max(
                1,
                share.multiply(BigDecimal.valueOf(all))
                        .setScale(0, RoundingMode.CEILING)
                        .longValueExact());
        long low = 1;
        long high = all - forged + 1;
        while (low < high) {
            long middle = (low + high) >>> 1;
            if (SpotCheck.caught(all, forged, middle).compareTo(caught) >= 0) {
                high = middle;
            } else {
                low = middle + 1;
            }
        }
        return (int) Math.min(low, Integer.MAX_VALUE);
    }

    /**
     * As many as are wanted for a probability of catching a forger.
     *
     * @param caught the probability
     * @param share which part of the trials is forged
     */
    record Until(BigDecimal caught, BigDecimal share) implements Rerun {

        /** Checks the ranges. */
        public Until {
            if (caught.signum() <= 0
                    || caught.compareTo(BigDecimal.ONE) > 0
                    || share.signum() <= 0
                    || share.compareTo(BigDecimal.ONE) > 0) {
                throw new IllegalArgumentException("probability " + caught + ", share " + share);
            }
        }
    }

    /**
     * Some, drawn without replacement from the referee's own seed.
     *
     * @param trials how many trial lines, at least 1
     */
    record Sample(int trials) implements Rerun {

        /** Checks the number. */
        public Sample {
            if (trials < 1) {
                throw new IllegalArgumentException(trials + " trials");
            }
        }
    }
}
