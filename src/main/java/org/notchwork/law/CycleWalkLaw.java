package org.notchwork.law;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * Evaluations of Brent's cycle finding on a function with a period and random labels, for widths 1 to 24.
 *
 * <p>With S_i = ∏_{k≤i} (N − 2k)/(N − k + 1), a tail l ≥ 1 and a cycle m have probability S_{l+m−2}/(N − l − m + 2), a
 * start on a cycle of m points S_{m−1}/(N − m + 1). An attempt costs 2^k − 1 + 2m + 2l, 2^k the least power of two not
 * below l + 1 and m. It fails where l = 0.
 */
public final class CycleWalkLaw implements QueryLaw {

    private static final int NARROWEST_APART = 6;
    private static final int WIDEST_QUICK = 20;

    private static final int WIDEST = 24;

    private static final BigDecimal NEGLIGIBLE = new BigDecimal("1e-65");

    /** Returns the mean of one attempt over the chance of success: the mean total if attempts were independent. */
    /** Narrow functions are too few for restarts to be independent; wide ones take long. */
    @Override
    public boolean reaches(int width) {
        return width >= NARROWEST_APART && width <= WIDEST_QUICK;
    }

    @Override
    public Prediction mean(int width) {
        Attempt attempt = attempt(width);
        BigDecimal success = BigDecimal.ONE.subtract(attempt.failure());
        return Prediction.decimal(attempt.cost().divide(success, Decimals.CONTEXT));
    }

    /** Returns the exact mean number of evaluations of one attempt, failed or not. */
    public Prediction attemptMean(int width) {
        return Prediction.decimal(attempt(width).cost());
    }

    /** Returns the exact probability that the start lies on the cycle, so that the attempt fails. */
    public Prediction failure(int width) {
        return Prediction.decimal(attempt(width).failure());
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        return Optional.empty();
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.empty();
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public String formula() {
        return "E[cost of an attempt] / (1 - P(start on the cycle))";
    }

    @Override
    public String source() {
        return "Brent, BIT 20 (1980) for the method; law of tail and cycle derived; an approximation: it takes restarts"
                + " as independent";
    }

    private record Attempt(BigDecimal cost, BigDecimal failure) {}

    private static Attempt attempt(int width) {
        if (width < 1 || width > WIDEST) {
            throw new IllegalArgumentException("width " + width + " is not in 1 to " + WIDEST);
        }
        long points = 1L << width;
        BigDecimal cost = BigDecimal.ZERO;
        BigDecimal failure = BigDecimal.ZERO;
        BigDecimal walk = BigDecimal.ONE;
        for (long i = 0; i < points / 2 && walk.compareTo(NEGLIGIBLE) > 0; i++) {
            BigDecimal share = walk.divide(BigDecimal.valueOf(points - i), Decimals.CONTEXT);
            long failed = power(i + 1) - 1 + 2 * (i + 1);
            long found = powers(i + 2) + (i + 1) * (2 * (i + 2) - 1);
            cost = cost.add(share.multiply(BigDecimal.valueOf(failed + found)), Decimals.CONTEXT);
            failure = failure.add(share, Decimals.CONTEXT);
            walk = share.multiply(BigDecimal.valueOf(points - 2 * (i + 1)), Decimals.CONTEXT);
        }
        return new Attempt(cost, failure);
    }

    /** Σ 2^k over all tails and cycles, l + m = r. */
    private static long powers(long r) {
        long h = (r + 1) / 2;
        return upTo(r) - upTo(r - h) + upTo(r - 1) - upTo(h);
    }

    /** Σ_{v=1}^{x} of the least power of two not below v. */
    private static long upTo(long x) {
        long sum = 0;
        long below = 0;
        for (long p = 1; below < x; p *= 2) {
            sum += p * (Math.min(p, x) - below);
            below = Math.min(p, x);
        }
        return sum;
    }

    private static long power(long v) {
        return v == 1 ? 1 : 2 * Long.highestOneBit(v - 1);
    }
}
