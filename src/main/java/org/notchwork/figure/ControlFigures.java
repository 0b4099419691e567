package org.notchwork.figure;

import java.math.BigDecimal;

/**
 * What came of a cell's controls: its strategy on functions that hide nothing.
 *
 * @param trials how many controls
 * @param named how many named what their trial hides, which they cannot have found
 * @param claimed how many named something else with a certificate that holds
 * @param failed how many named something else with a certificate that does not hold
 * @param chance the rate at which a guess names what the trial hides
 * @param p the probability that guesses would name it so often or more often
 */
public record ControlFigures(long trials, long named, long claimed, long failed, BigDecimal chance, BigDecimal p) {

    private static final BigDecimal LIMIT = new BigDecimal("0.001");

    /** Returns whether the cell names what it cannot have found, beyond chance: it has been told. */
    public boolean isFlagged() {
        return p.compareTo(LIMIT) < 0;
    }
}
