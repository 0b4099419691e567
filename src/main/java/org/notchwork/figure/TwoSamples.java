package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeSet;
import org.notchwork.exact.Decimals;

/** Whether two samples can come from one distribution, by exact computation. */
public final class TwoSamples {

    /** The least expected count of a bin in either sample. */
    private static final long LEAST = 5;

    private static final int MOST_BINS = 50;

    private TwoSamples() {}

    /**
     * Returns the p-value of R. A. Fisher's exact test of two rates, two-sided: the probability, given the totals, of
     * tables no likelier than the observed one.
     *
     * @param solved successes of the first sample
     * @param trials its size, at least 1
     * @param otherSolved successes of the second sample
     * @param otherTrials its size, at least 1
     */
    public static BigDecimal rates(long solved, long trials, long otherSolved, long otherTrials) {
        long all = Math.addExact(trials, otherTrials);
        long successes = Math.addExact(solved, otherSolved);
        long least = Math.max(0, successes - otherTrials);
        long greatest = Math.min(trials, successes);
        // Weights relative to the observed table, going outwards by ratios of neighbouring hypergeometric terms.
        BigDecimal total = BigDecimal.ONE;
        BigDecimal extreme = BigDecimal.ONE;
        BigDecimal slack = BigDecimal.ONE.add(new BigDecimal("1e-30"));
        BigDecimal weight = BigDecimal.ONE;
        for (long k = solved; k < greatest; k++) {
            weight = weight.multiply(
                    Decimals.quotient(
                            BigInteger.valueOf(trials - k).multiply(BigInteger.valueOf(successes - k)),
                            BigInteger.valueOf(k + 1).multiply(BigInteger.valueOf(all - trials - successes + k + 1))),
                    Decimals.CONTEXT);
            total = total.add(weight, Decimals.CONTEXT);
            extreme = weight.compareTo(slack) <= 0 ? extreme.add(weight, Decimals.CONTEXT) : extreme;
        }
        weight = BigDecimal.ONE;
        for (long k = solved; k > least; k--) {
            weight = weight.multiply(
                    Decimals.quotient(
                            BigInteger.valueOf(k).multiply(BigInteger.valueOf(all - trials - successes + k)),
                            BigInteger.valueOf(trials - k + 1).multiply(BigInteger.valueOf(successes - k + 1))),
                    Decimals.CONTEXT);
            total = total.add(weight, Decimals.CONTEXT);
            extreme = weight.compareTo(slack) <= 0 ? extreme.add(weight, Decimals.CONTEXT) : extreme;
        }
        return extreme.divide(total, Decimals.CONTEXT);
    }

    /**
     * Returns the p-value of K. Pearson's chi-squared test that two samples of counts have one distribution. Values are
     * pooled from the smallest up into bins that expect at least 5 (or 1/50 of the smaller sample) in either; 1 if that
     * leaves one bin.
     *
     * @param first how often each value occurred, not empty
     * @param second likewise
     */
    public static BigDecimal counts(SortedMap<Long, Long> first, SortedMap<Long, Long> second) {
        long n = size(first);
        long m = size(second);
        long least = Math.max(LEAST, Math.min(n, m) / MOST_BINS);
        List<long[]> bins = new ArrayList<>();
        long[] open = new long[2];
        TreeSet<Long> values = new TreeSet<>(first.keySet());
        values.addAll(second.keySet());
        for (long value : values) {
            open[0] += first.getOrDefault(value, 0L);
            open[1] += second.getOrDefault(value, 0L);
            // Expected in the smaller sample: its share of the bin's total.
            long pooled = Math.multiplyExact(open[0] + open[1], Math.min(n, m));
            if (pooled >= Math.multiplyExact(least, n + m)) {
                bins.add(open);
                open = new long[2];
            }
        }
        if (bins.isEmpty()) {
            return BigDecimal.ONE;
        }
        bins.get(bins.size() - 1)[0] += open[0];
        bins.get(bins.size() - 1)[1] += open[1];
        if (bins.size() == 1) {
            return BigDecimal.ONE;
        }
        return ChiSquared.pValue(statistic(bins, n, m), bins.size() - 1);
    }

    /** Σ (m a − n b)² / (n m (a + b)) over the bins. */
    private static BigDecimal statistic(List<long[]> bins, long n, long m) {
        BigDecimal sum = BigDecimal.ZERO;
        for (long[] bin : bins) {
            BigInteger difference = BigInteger.valueOf(m)
                    .multiply(BigInteger.valueOf(bin[0]))
                    .subtract(BigInteger.valueOf(n).multiply(BigInteger.valueOf(bin[1])));
            BigInteger bottom =
                    BigInteger.valueOf(n).multiply(BigInteger.valueOf(m)).multiply(BigInteger.valueOf(bin[0] + bin[1]));
            sum = sum.add(Decimals.quotient(difference.pow(2), bottom), Decimals.CONTEXT);
        }
        return sum;
    }

    private static long size(SortedMap<Long, Long> sample) {
        return sample.values().stream().mapToLong(Long::longValue).sum();
    }
}
