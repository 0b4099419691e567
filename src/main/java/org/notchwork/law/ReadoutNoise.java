package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.function.IntFunction;
import org.notchwork.exact.Decimals;

/**
 * Fourier rounds whose words are read with every bit flipped independently. With δ = (1 − 2p)^wt(s) a word is
 * orthogonal to the period with probability (1 + δ)/2, and uniform on either half.
 *
 * @param flip p, 0 to below 1/2
 */
public record ReadoutNoise(BigDecimal flip) {

    private static final BigDecimal TWO = BigDecimal.valueOf(2);

    /** More rounds than these are not looked for. */
    private static final int MOST_ROUNDS = 1 << 29;

    public ReadoutNoise {
        if (flip.signum() < 0 || flip.multiply(TWO).compareTo(BigDecimal.ONE) >= 0) {
            throw new IllegalArgumentException("flip probability " + flip + " is not in 0 to below 1/2");
        }
    }

    /** Returns δ for a period of a weight. */
    public BigDecimal bias(int weight) {
        return BigDecimal.ONE.subtract(flip.multiply(TWO)).pow(weight, Decimals.CONTEXT);
    }

    /** Returns the probability that a word that is read is orthogonal to a period of a weight. */
    public Prediction orthogonal(int weight) {
        return Prediction.decimal(
                BigDecimal.ONE.add(bias(weight), Decimals.CONTEXT).divide(TWO, Decimals.CONTEXT));
    }

    /**
     * Returns the least number of rounds m after which the highest peak of the transformed histogram misses the period
     * with at most a given probability, by (2^n − 2) ((1 + √(1 − δ²))/2)^m.
     */
    public int peakRounds(int width, int weight, BigDecimal failure) {
        BigDecimal delta = bias(weight);
        BigDecimal root =
                Decimals.root(BigDecimal.ONE.subtract(delta.multiply(delta, Decimals.CONTEXT), Decimals.CONTEXT));
        BigDecimal base = BigDecimal.ONE.add(root).divide(TWO, Decimals.CONTEXT);
        BigDecimal others = new BigDecimal(BigInteger.ONE.shiftLeft(width).subtract(BigInteger.TWO));
        return least(m -> others.multiply(base.pow(m, Decimals.CONTEXT)), failure);
    }

    /**
     * Returns the least number of rounds m after which maximum likelihood misses the period with at most a given
     * probability, by Σ_{t ≠ 0, s} (g(δ_s) g(δ_t))^m, g(d) = (√(1 + d) + √(1 − d))/2.
     */
    public int likelihoodRounds(int width, int weight, BigDecimal failure) {
        return least(m -> likelihoodBound(width, weight, m), failure);
    }

    /** Returns the mean number of draws of n − 1 words until they are independent and all orthogonal to the period. */
    public Prediction pooledDraws(int width, int weight) {
        BigDecimal right = orthogonal(weight).value().pow(width - 1, Decimals.CONTEXT);
        BigDecimal independent = FixedRoundsSuccess.extra(0, 1).success(width).value();
        return Prediction.decimal(
                BigDecimal.ONE.divide(right.multiply(independent, Decimals.CONTEXT), Decimals.CONTEXT));
    }

    /**
     * Returns the number of rounds below which no decoder can be sure, log₂(2^n − 1)/(1 − h(τ)), h the binary entropy
     * and τ = (1 − δ)/2.
     */
    public Prediction informationBound(int width, int weight) {
        BigDecimal tau = BigDecimal.ONE.subtract(bias(weight)).divide(TWO, NaturalLogarithm.DIGITS);
        BigDecimal told = NaturalLogarithm.of(TWO).add(entropyTerm(tau)).add(entropyTerm(BigDecimal.ONE.subtract(tau)));
        BigDecimal words = new BigDecimal(BigInteger.ONE.shiftLeft(width).subtract(BigInteger.ONE));
        return Prediction.decimal(NaturalLogarithm.of(words).divide(told, Decimals.CONTEXT));
    }

    /** q ln q, 0 at 0. */
    private static BigDecimal entropyTerm(BigDecimal q) {
        return q.signum() == 0 ? BigDecimal.ZERO : q.multiply(NaturalLogarithm.of(q), NaturalLogarithm.DIGITS);
    }

    private BigDecimal likelihoodBound(int width, int weight, int rounds) {
        BigDecimal own = overlap(bias(weight));
        BigDecimal sum = BigDecimal.ZERO;
        BigInteger words = BigInteger.ONE;
        for (int w = 1; w <= width; w++) {
            words = words.multiply(BigInteger.valueOf(width - w + 1L)).divide(BigInteger.valueOf(w));
            BigInteger others = w == weight ? words.subtract(BigInteger.ONE) : words;
            BigDecimal base = own.multiply(overlap(bias(w)), Decimals.CONTEXT);
            sum = sum.add(
                    new BigDecimal(others).multiply(base.pow(rounds, Decimals.CONTEXT), Decimals.CONTEXT),
                    Decimals.CONTEXT);
        }
        return sum;
    }

    private static BigDecimal overlap(BigDecimal d) {
        return Decimals.root(BigDecimal.ONE.add(d))
                .add(Decimals.root(BigDecimal.ONE.subtract(d)))
                .divide(TWO, Decimals.CONTEXT);
    }

    /** The least m whose bound, which falls as m grows, is at most the failure allowed. */
    private static int least(IntFunction<BigDecimal> bound, BigDecimal failure) {
        int high = 1;
        while (bound.apply(high).compareTo(failure) > 0) {
            if (high >= MOST_ROUNDS) {
                throw new IllegalArgumentException("more than " + MOST_ROUNDS + " rounds for failure " + failure);
            }
            high *= 2;
        }
        int low = high / 2;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (bound.apply(middle).compareTo(failure) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }
}
