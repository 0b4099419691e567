package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * Uniformly random points without replacement until the differences of colliding points span a hidden subspace S.
 *
 * <p>P(span = S after m points) = Σ_j (−1)^(k−j) 2^C(k−j, 2) [k choose j]₂ A_j(m) / C(N, m), by Möbius inversion over
 * the subspaces of S. A_j(m) counts the sets of m points whose differences stay in one subspace of dimension j: the
 * coefficient of z^m in (1 + 2^(k−j) ((1 + z)^(2^j) − 1))^M, M = 2^(n−k). Widths k to 10: see {@link #reaches}.
 *
 * @param dimension k, the dimension of the hidden subspace, 1 to n
 */
public record SubspaceCollisionsLaw(int dimension) implements QueryLaw {

    private static final int WIDEST = 10;

    private static final int WIDEST_FIRST = 24;

    /** The fractions of the terms fit together up to this width. */
    private static final int EXACT = 4;

    private static final BigDecimal NEGLIGIBLE = new BigDecimal("1e-55");

    public SubspaceCollisionsLaw {
        if (dimension < 1) {
            throw new IllegalArgumentException("dimension " + dimension + " is below 1");
        }
    }

    /** Returns whether the law gives figures for a width; it throws IllegalArgumentException where not. */
    public boolean reaches(int width) {
        return width >= dimension && width <= WIDEST;
    }

    @Override
    public Prediction mean(int width) {
        List<Fraction> spanned = spanned(width);
        if (width <= EXACT) {
            Fraction sum = Fraction.ZERO;
            for (Fraction share : spanned) {
                sum = sum.plus(share.complement());
            }
            return sum.prediction();
        }
        return Prediction.decimal(weighted(spanned, false));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        List<Fraction> spanned = spanned(width);
        BigDecimal mean = weighted(spanned, false);
        return Optional.of(weighted(spanned, true).subtract(mean.multiply(mean, Decimals.CONTEXT), Decimals.CONTEXT));
    }

    /** N/2 + 1: N/2 points can all differ, where they collide, by words of one hyperplane of S. */
    @Override
    public OptionalLong worst(int width) {
        check(width, WIDEST);
        return OptionalLong.of((1L << (width - 1)) + 1);
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public Optional<Prediction> within(int width, long queries) {
        check(width, WIDEST);
        if (queries > 1L << (width - 1)) {
            return Optional.of(Fraction.ONE.prediction());
        }
        return Optional.of(spanned(width).get(Math.toIntExact(queries)).prediction());
    }

    /**
     * Returns the exact mean number of points until the first collision, Σ_m ∏_{i&lt;m} (N − K i)/(N − i), K = 2^k.
     *
     * @param width n, k to 24
     */
    public Prediction firstCollision(int width) {
        check(width, WIDEST_FIRST);
        long points = 1L << width;
        long cosets = points >> dimension;
        if (width <= EXACT) {
            Fraction sum = Fraction.ZERO;
            for (long m = 0; m <= cosets; m++) {
                sum = sum.plus(
                        Fraction.falling(BigInteger.valueOf(points), 1L << dimension, BigInteger.valueOf(points), m));
            }
            return sum.prediction();
        }
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal more = BigDecimal.ONE;
        for (long m = 0; m <= cosets && more.compareTo(NEGLIGIBLE) > 0; m++) {
            sum = sum.add(more, Decimals.CONTEXT);
            more = more.multiply(BigDecimal.valueOf(points - (m << dimension)), Decimals.CONTEXT)
                    .divide(BigDecimal.valueOf(points - m), Decimals.CONTEXT);
        }
        return Prediction.decimal(sum);
    }

    @Override
    public String formula() {
        return "sum_m (1 - sum_j (-1)^(k-j) 2^C(k-j,2) [k,j]_2 A_j(m) / C(2^n, m)), k = " + dimension;
    }

    @Override
    public String source() {
        return "derived: Moebius inversion over the subspaces of the hidden one";
    }

    private void check(int width, int widest) {
        if (width < dimension || width > widest) {
            throw new IllegalArgumentException("width " + width + " is not in " + dimension + " to " + widest);
        }
    }

    /** Σ P(Q &gt; m), or Σ (2m + 1) P(Q &gt; m). */
    private static BigDecimal weighted(List<Fraction> spanned, boolean square) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int m = 0; m < spanned.size(); m++) {
            BigDecimal more = spanned.get(m).complement().value();
            sum = sum.add(more.multiply(BigDecimal.valueOf(square ? 2L * m + 1 : 1)), Decimals.CONTEXT);
        }
        return sum;
    }

    /** P(span = S after m points) for m = 0 … N/2; after one more it is 1. */
    private List<Fraction> spanned(int width) {
        check(width, WIDEST);
        int most = 1 << (width - 1);
        List<BigInteger> sums = new ArrayList<>();
        for (int j = 0; j <= dimension; j++) {
            int lost = dimension - j;
            BigInteger weight = subspaces(j).shiftLeft(lost * (lost - 1) / 2);
            List<BigInteger> sets = staying(width, j, most);
            for (int m = 0; m <= most; m++) {
                BigInteger term = sets.get(m).multiply(lost % 2 == 0 ? weight : weight.negate());
                if (j == 0) {
                    sums.add(term);
                } else {
                    sums.set(m, sums.get(m).add(term));
                }
            }
        }
        List<Fraction> shares = new ArrayList<>();
        BigInteger choices = BigInteger.ONE;
        for (int m = 0; m <= most; m++) {
            shares.add(new Fraction(sums.get(m), choices));
            choices = choices.multiply(BigInteger.valueOf(2L * most - m)).divide(BigInteger.valueOf(m + 1L));
        }
        return shares;
    }

    /** The number of subspaces of dimension j of S. */
    private BigInteger subspaces(int j) {
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        for (int i = 0; i < j; i++) {
            top = top.multiply(BigInteger.ONE.shiftLeft(dimension - i).subtract(BigInteger.ONE));
            bottom = bottom.multiply(BigInteger.ONE.shiftLeft(i + 1).subtract(BigInteger.ONE));
        }
        return top.divide(bottom);
    }

    /** A_j(0), …, A_j(most), by m q_m = Σ_i (i M − (m − i)) p_i q_(m−i) for the power q = p^M with p_0 = 1. */
    private List<BigInteger> staying(int width, int j, int most) {
        long power = 1L << (width - dimension);
        int degree = 1 << j;
        List<BigInteger> base = new ArrayList<>();
        BigInteger binomial = BigInteger.ONE;
        for (int i = 0; i <= degree; i++) {
            base.add(i == 0 ? BigInteger.ONE : binomial.shiftLeft(dimension - j));
            binomial = binomial.multiply(BigInteger.valueOf(degree - i)).divide(BigInteger.valueOf(i + 1L));
        }
        List<BigInteger> result = new ArrayList<>(List.of(BigInteger.ONE));
        for (int m = 1; m <= most; m++) {
            BigInteger sum = BigInteger.ZERO;
            for (int i = 1; i <= Math.min(m, degree); i++) {
                BigInteger factor = base.get(i).multiply(BigInteger.valueOf(i * power - (m - i)));
                sum = sum.add(factor.multiply(result.get(m - i)));
            }
            result.add(sum.divide(BigInteger.valueOf(m)));
        }
        return result;
    }
}
