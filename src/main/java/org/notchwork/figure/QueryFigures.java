package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * The number of queries of a cell's trials, confirmation not included.
 *
 * <p>A censored trial counts with what it had spent when it was cut off, so with censored trials the mean is a lower
 * bound of the mean without a limit.
 *
 * @param mean the mean
 * @param deviation the sample standard deviation, divisor N − 1; absent for one trial
 * @param interval the 95 % interval of the mean by Student's t; absent for one trial
 * @param min the least
 * @param lowerQuartile the least count that at least a quarter of the trials do not exceed
 * @param median the least count that at least half of the trials do not exceed
 * @param upperQuartile the least count that at least three quarters of the trials do not exceed
 * @param max the greatest
 */
public record QueryFigures(
        BigDecimal mean,
        Optional<BigDecimal> deviation,
        Optional<Interval> interval,
        long min,
        long lowerQuartile,
        long median,
        long upperQuartile,
        long max) {}
