package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.exact.Decimals;

/**
 * Uniformly random points without replacement until the first collision: the first matching pair of M = 2^(n−1)
 * pairs. Mean E = 4^M / C(2M, M), variance 4M + 2 − E − E².
 */
public final class RandomDrawsLaw implements QueryLaw {

    /** Above this width the series is right to 50 digits and the product is long. */
    private static final int EXACT = 12;

    /** Ratio of a circle's circumference to its diameter; OEIS A000796, 70 digits. */
    private static final BigDecimal PI =
            new BigDecimal("3.141592653589793238462643383279502884197169399375105820974944592307816");

    @Override
    public Prediction mean(int width) {
        return exactMean(width).map(Fraction::prediction).orElseGet(() -> Prediction.decimal(series(width)));
    }

    /** Returns the mean as a fraction where its product is short. */
    Optional<Fraction> exactMean(int width) {
        return width <= EXACT ? Optional.of(exact(width)) : Optional.empty();
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        BigDecimal mean = mean(width).value();
        BigDecimal pairs = new BigDecimal(BigInteger.ONE.shiftLeft(width + 1)).add(BigDecimal.valueOf(2));
        return Optional.of(pairs.subtract(mean).subtract(mean.multiply(mean, Decimals.CONTEXT), Decimals.CONTEXT));
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of((1L << (width - 1)) + 1);
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    /**
     * Returns 1 − ∏_{i&lt;m} (N − 2i)/(N − i), N = 2^n; empty where it takes more than 2^13 factors.
     */
    @Override
    public Optional<Prediction> within(int width, long queries) {
        if (queries > 1L << (width - 1)) {
            return Optional.of(Fraction.ONE.prediction());
        }
        if (queries > Fraction.MOST_FACTORS) {
            return Optional.empty();
        }
        BigInteger points = BigInteger.ONE.shiftLeft(width);
        return Optional.of(
                Fraction.falling(points, 2, points, queries).complement().prediction());
    }

    @Override
    public String formula() {
        return "4^M / C(2M, M), M = 2^(n-1)";
    }

    @Override
    public String source() {
        return "first matching pair among M pairs drawn without replacement; variance derived";
    }

    /** The product over i = 1 … M of 2i / (2i − 1). */
    private static Fraction exact(int width) {
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        for (long i = 1; i <= 1L << (width - 1); i++) {
            top = top.multiply(BigInteger.valueOf(2 * i));
            bottom = bottom.multiply(BigInteger.valueOf(2 * i - 1));
        }
        return new Fraction(top, bottom);
    }

    /**
     * √(πM) (1 + c₁/M + c₂/M² + …), the expansion of √π Γ(M+1)/Γ(M+½). The coefficients follow from
     * Γ(M+1)/Γ(M+½) = g(M), g(M) g(M−½) = M, matched term by term; the first are 1/8, 1/128, −5/1024, −21/32768
     * (F. G. Tricomi, A. Erdélyi, Pacific J. Math. 1 (1951)).
     */
    private static BigDecimal series(int width) {
        BigDecimal pairs = new BigDecimal(BigInteger.ONE.shiftLeft(width - 1));
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal power = BigDecimal.ONE;
        for (BigDecimal coefficient : GammaRatioSeries.coefficients()) {
            sum = sum.add(coefficient.multiply(power, Decimals.CONTEXT), Decimals.CONTEXT);
            power = power.divide(pairs, Decimals.CONTEXT);
        }
        return Decimals.root(PI.multiply(pairs, Decimals.CONTEXT)).multiply(sum, Decimals.CONTEXT);
    }
}
