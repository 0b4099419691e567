package org.notchwork.study;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * What a cell will probably cost.
 *
 * @param cell the cell
 * @param trials how many trials
 * @param queries the expected queries of a trial, the query limit taken into account
 * @param nanosPerTrial the expected time of a trial on one core, its share of drawing the instance included
 * @param memoryBytes the most memory of a trial
 * @param remark what the author should know before running, if anything
 */
public record CellForecast(
        Cell cell, long trials, BigDecimal queries, double nanosPerTrial, long memoryBytes, Optional<String> remark) {

    /** Returns the expected time of all trials on one core, in nanoseconds. */
    public double nanos() {
        return trials * nanosPerTrial;
    }
}
