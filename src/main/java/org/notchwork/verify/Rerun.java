package org.notchwork.verify;

/** Which trials are run again. A closed set. */
public sealed interface Rerun {

    /** None. */
    record None() implements Rerun {}

    /** All of them, and the exhaustive checks with them. */
    record All() implements Rerun {}

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
