package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.study.Cell;

/**
 * Mean queries of one cell divided by mean queries of another, on paired trials.
 *
 * @param of the numerator
 * @param to the denominator
 * @param pairs how many trials were paired
 * @param censored how many of the pairs hold a censored trial; if any, the ratio bounds nothing
 * @param ratio the ratio of the means
 * @param interval its 95 % interval by Fieller (1954); absent where there is none or it is unbounded
 */
public record RatioFigures(
        Cell of, Cell to, long pairs, long censored, BigDecimal ratio, Optional<Interval> interval) {}
