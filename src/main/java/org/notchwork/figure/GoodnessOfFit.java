package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedMap;
import org.notchwork.exact.Decimals;

/**
 * Pearson's chi-squared test of counts against a law that is given in full (K. Pearson, Philos. Mag. 50 (1900)).
 *
 * @param bins the bins, at least one and at most 200; they depend on the law and the number of observations alone
 * @param statistic the sum of (observed − expected)² / expected over the bins, to 30 places
 * @param degrees the degrees of freedom: bins − 1
 * @param p the probability of a statistic at least as large under the law, with 50 digits; 0 if an observation is
 *     impossible, whatever the statistic
 * @param impossible the least observed value to which the law gives probability 0, if there is one
 */
public record GoodnessOfFit(List<Bin> bins, BigDecimal statistic, int degrees, BigDecimal p, OptionalLong impossible) {

    private static final int STATISTIC_PLACES = 30;

    /**
     * A law's values are rounded, so less than this counts as 0. It is no loss: that one of 10^9 observations should
     * have such a probability is itself less probable than 10^−30.
     */
    private static final BigDecimal NO_PROBABILITY = new BigDecimal("1e-40");

    /** Copies the bins. */
    public GoodnessOfFit {
        bins = List.copyOf(bins);
    }

    /**
     * Compares observations with a law; empty if the law fills less than two bins and no observation is impossible,
     * so that there is nothing to test. The law is asked for about 2 log2(width) values a bin, and for the two values
     * that enclose each different observation.
     *
     * @param observed how often each value, from 0, was observed
     * @param size the number of observations, at least 1
     * @param law the law's cumulative function
     */
    public static Optional<GoodnessOfFit> of(SortedMap<Long, Long> observed, long size, Cumulative law) {
        check(observed, size);
        List<Bin> bins = Binning.of(law, size);
        OptionalLong impossible = impossible(observed, law);
        int degrees = bins.size() - 1;
        if (degrees == 0 && impossible.isEmpty()) {
            return Optional.empty();
        }
        BigDecimal statistic = statistic(bins, observed);
        BigDecimal p = impossible.isPresent() ? BigDecimal.ZERO : ChiSquared.pValue(statistic, degrees);
        return Optional.of(new GoodnessOfFit(bins, statistic, degrees, p, impossible));
    }

    private static void check(SortedMap<Long, Long> observed, long size) {
        long all = 0;
        for (Map.Entry<Long, Long> entry : observed.entrySet()) {
            if (entry.getKey() < 0 || entry.getValue() < 0) {
                throw new IllegalArgumentException("value " + entry.getKey() + ", " + entry.getValue() + " times");
            }
            all = Math.addExact(all, entry.getValue());
        }
        if (all != size || size < 1) {
            throw new IllegalArgumentException(all + " observations, not " + size);
        }
    }

    private static OptionalLong impossible(SortedMap<Long, Long> observed, Cumulative law) {
        long last = -1;
        BigDecimal upToLast = BigDecimal.ZERO;
        for (Map.Entry<Long, Long> entry : observed.entrySet()) {
            if (entry.getValue() > 0) {
                long value = entry.getKey();
                BigDecimal below = value == last + 1 ? upToLast : law.atMost(value - 1);
                BigDecimal upTo = law.atMost(value);
                if (upTo.subtract(below).compareTo(NO_PROBABILITY) < 0) {
                    return OptionalLong.of(value);
                }
                last = value;
                upToLast = upTo;
            }
        }
        return OptionalLong.empty();
    }

    private static BigDecimal statistic(List<Bin> bins, SortedMap<Long, Long> observed) {
        BigDecimal sum = BigDecimal.ZERO;
        for (Bin bin : bins) {
            BigDecimal excess = BigDecimal.valueOf(count(bin, observed)).subtract(bin.expected());
            sum = sum.add(excess.multiply(excess).divide(bin.expected(), Decimals.CONTEXT));
        }
        return sum.setScale(STATISTIC_PLACES, RoundingMode.HALF_EVEN);
    }

    private static long count(Bin bin, SortedMap<Long, Long> observed) {
        SortedMap<Long, Long> inside = bin.greatest() == Long.MAX_VALUE
                ? observed.tailMap(bin.least())
                : observed.subMap(bin.least(), bin.greatest() + 1);
        return inside.values().stream().mapToLong(Long::longValue).sum();
    }
}
