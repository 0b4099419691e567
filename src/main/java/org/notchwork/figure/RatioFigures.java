package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.exact.Decimals;
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
public record RatioFigures(Cell of, Cell to, long pairs, long censored, BigDecimal ratio, Optional<Interval> interval) {

    /**
     * Returns the ratio the other way round. The set of ratios that Fieller's test does not reject turns into the set
     * of their inverses, an interval where it does not reach 0.
     */
    public RatioFigures inverse() {
        BigDecimal inverse = ratio.signum() == 0 ? BigDecimal.ZERO : inverse(ratio);
        Optional<Interval> inverted =
                interval.filter(i -> i.low().signum() > 0).map(i -> new Interval(inverse(i.high()), inverse(i.low())));
        return new RatioFigures(to, of, pairs, censored, inverse, inverted);
    }

    private static BigDecimal inverse(BigDecimal value) {
        return BigDecimal.ONE.divide(value, Decimals.CONTEXT);
    }
}
