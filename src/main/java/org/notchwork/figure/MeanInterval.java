package org.notchwork.figure;

import java.math.BigDecimal;
import org.notchwork.exact.Decimals;

/** The 95 % interval of a mean by Student's t: mean ± t s / √N with N − 1 degrees of freedom. */
final class MeanInterval {

    private MeanInterval() {}

    /**
     * Returns the interval.
     *
     * @param mean the mean
     * @param deviation the sample standard deviation, divisor N − 1
     * @param size N, at least 2
     */
    static Interval of(BigDecimal mean, BigDecimal deviation, long size) {
        BigDecimal half = StudentT.quantile(size - 1)
                .multiply(deviation, Decimals.CONTEXT)
                .divide(Decimals.root(BigDecimal.valueOf(size)), Decimals.CONTEXT);
        return new Interval(mean.subtract(half, Decimals.CONTEXT), mean.add(half, Decimals.CONTEXT));
    }
}
