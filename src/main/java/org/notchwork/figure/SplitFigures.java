package org.notchwork.figure;

import java.math.BigDecimal;

/**
 * The success of a cell on the instances with one answer to the question "which of two?", so that each error rate stands
 * alone.
 *
 * @param hidden {@code none}, {@code period}, {@code constant} or {@code balanced}
 * @param trials how many trials
 * @param solved how many were answered right
 * @param success the fraction
 * @param interval its 95 % interval by Clopper and Pearson (1934)
 */
public record SplitFigures(String hidden, long trials, long solved, BigDecimal success, Interval interval) {}
