package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * Uniformly random points with replacement until the first collision. With d distinct points seen, a draw repeats one
 * with probability d/N, collides with probability d/N, and is new otherwise. On average exactly one draw is a repeat.
 */
public final class RandomDrawsRepeatingLaw implements QueryLaw {

    /** Widest width whose chain of 2^(n−1) states is gone through. */
    private static final int WIDEST_CHAIN = 14;

    private final RandomDrawsLaw distinct = new RandomDrawsLaw();

    @Override
    public Prediction mean(int width) {
        return distinct.exactMean(width)
                .map(mean -> mean.plus(Fraction.ONE).prediction())
                .orElseGet(
                        () -> Prediction.decimal(distinct.mean(width).value().add(BigDecimal.ONE, Decimals.CONTEXT)));
    }

    /** From the last state back: T = G + I T′, G geometric, I whether a new point follows; widths to 14. */
    @Override
    public Optional<BigDecimal> variance(int width) {
        if (width > WIDEST_CHAIN) {
            return Optional.empty();
        }
        long points = 1L << width;
        BigDecimal mean = BigDecimal.ZERO;
        BigDecimal square = BigDecimal.ZERO;
        for (long d = points / 2; d >= 0; d--) {
            BigDecimal stay = Decimals.quotient(points, points - d);
            BigDecimal staySquare = stay.multiply(Decimals.quotient(points + d, points - d), Decimals.CONTEXT);
            BigDecimal further = Decimals.quotient(points - 2 * d, points - d);
            square = further.multiply(square, Decimals.CONTEXT)
                    .add(
                            further.multiply(mean, Decimals.CONTEXT)
                                    .multiply(stay, Decimals.CONTEXT)
                                    .multiply(BigDecimal.valueOf(2)),
                            Decimals.CONTEXT)
                    .add(staySquare, Decimals.CONTEXT);
            mean = further.multiply(mean, Decimals.CONTEXT).add(stay, Decimals.CONTEXT);
        }
        return Optional.of(square.subtract(mean.multiply(mean, Decimals.CONTEXT), Decimals.CONTEXT));
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.empty();
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    /** Counts the sequences of m draws without a collision by their distinct points; empty beyond 2^13 steps. */
    @Override
    public Optional<Prediction> within(int width, long queries) {
        long pairs = 1L << (width - 1);
        if (queries > Fraction.MOST_FACTORS || queries * Math.min(queries, pairs) > Fraction.MOST_FACTORS) {
            return Optional.empty();
        }
        int last = Math.toIntExact(Math.min(queries, pairs));
        List<BigInteger> counts = new ArrayList<>();
        counts.add(BigInteger.ONE);
        for (int d = 1; d <= last; d++) {
            counts.add(BigInteger.ZERO);
        }
        for (long m = 0; m < queries; m++) {
            for (int d = last; d >= 0; d--) {
                BigInteger kept = counts.get(d).multiply(BigInteger.valueOf(d));
                BigInteger grown = d == 0
                        ? BigInteger.ZERO
                        : counts.get(d - 1).multiply(BigInteger.valueOf(2 * pairs - 2 * (d - 1L)));
                counts.set(d, kept.add(grown));
            }
        }
        BigInteger without = counts.stream().reduce(BigInteger.ZERO, BigInteger::add);
        BigInteger all = BigInteger.ONE.shiftLeft(Math.toIntExact(width * queries));
        return Optional.of(new Fraction(without, all).complement().prediction());
    }

    @Override
    public String formula() {
        return "4^M / C(2M, M) + 1, M = 2^(n-1)";
    }

    @Override
    public String source() {
        return "derived: first matching pair among M pairs, and on average one repeated draw";
    }
}
