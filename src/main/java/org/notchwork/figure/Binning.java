package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;

/**
 * Bins from the smallest value up, each as narrow as its expectation allows; they depend on the law and the number of
 * observations alone.
 *
 * <p>An edge is found by steps that double, then by halving, so that a law is asked some 2 log2(width) times a bin.
 */
final class Binning {

    /** The rule that expectations should be 5 at least (W. G. Cochran, Ann. Math. Statist. 23 (1952)). */
    private static final BigDecimal LEAST_EXPECTED = BigDecimal.valueOf(5);

    /** With many observations bins are wider, so that there are no more than this many. */
    static final int MOST_BINS = 200;

    /** What the rounded values of a law may lack of an expectation that is 5 exactly. */
    private static final BigDecimal SLACK = new BigDecimal("1e-30");

    /** No edge is sought beyond. */
    private static final long FARTHEST = 1L << 62;

    private final Cumulative law;
    private final BigDecimal size;
    private final BigDecimal enough;

    private Binning(Cumulative law, long size) {
        this.law = law;
        this.size = BigDecimal.valueOf(size);
        this.enough = LEAST_EXPECTED
                .max(this.size.divide(BigDecimal.valueOf(MOST_BINS)))
                .subtract(SLACK);
    }

    /** Returns at least one bin and at most 200, without gaps from 0 on; together they expect all observations. */
    static List<Bin> of(Cumulative law, long size) {
        return new Binning(law, size).bins();
    }

    private List<Bin> bins() {
        List<Bin> bins = new ArrayList<>();
        long edge = -1;
        BigDecimal below = BigDecimal.ZERO;
        long width = 1;
        while (true) {
            OptionalLong next = edge(edge, below, width);
            BigDecimal reached = next.isPresent() ? law.atMost(next.getAsLong()) : BigDecimal.ONE;
            if (!suffices(reached, BigDecimal.ONE)) {
                bins.add(new Bin(edge + 1, Long.MAX_VALUE, expected(below, BigDecimal.ONE)));
                return List.copyOf(bins);
            }
            bins.add(new Bin(edge + 1, next.getAsLong(), expected(below, reached)));
            width = next.getAsLong() - edge;
            edge = next.getAsLong();
            below = reached;
        }
    }

    /** Returns the least m above the edge at which the bin expects enough; none if no m up to 2^62 does. */
    private OptionalLong edge(long edge, BigDecimal below, long width) {
        if (!suffices(below, BigDecimal.ONE)) {
            return OptionalLong.empty();
        }
        long low = edge;
        long step = Math.min(width, (FARTHEST - edge) / 2);
        while (!suffices(below, law.atMost(edge + step))) {
            low = edge + step;
            if (low >= FARTHEST - 1) {
                return OptionalLong.empty();
            }
            step = Math.min(step, (FARTHEST - edge) / 2) * 2;
        }
        long high = edge + step;
        while (high - low > 1) {
            long middle = low + ((high - low) / 2);
            if (suffices(below, law.atMost(middle))) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return OptionalLong.of(high);
    }

    private boolean suffices(BigDecimal below, BigDecimal reached) {
        return expected(below, reached).compareTo(enough) >= 0;
    }

    private BigDecimal expected(BigDecimal below, BigDecimal reached) {
        return reached.subtract(below).multiply(size);
    }
}
