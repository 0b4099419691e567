package org.notchwork.strategy.quantum.decoder;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.bits.WalshHadamard;
import org.notchwork.engine.Noise;
import org.notchwork.seed.RandomStream;

/**
 * The most likely period: one Walsh-Hadamard transform of the histogram gives, for every candidate t at once, how many of
 * the m words are orthogonal to it, c(t) = (m + H(t))/2; with δ(t) = (1 − q)(1 − 2p)^weight(t) the log-likelihood is
 * c ln(1 + δ) + (m − c) ln(1 − δ). Ties are broken by {@code below}.
 *
 * <p>The logarithms are whole multiples of 2^−40, so that the same candidate wins on every machine; ln 0 is taken as
 * −2^12, below anything that words could make up for.
 *
 * @param noise what is known of the noise
 */
public record Likelihood(Noise noise) implements Decoder {

    private static final int GREATEST = 20;
    private static final int SCALE = 40;
    private static final long NEVER = -(1L << (SCALE + 12));

    @Override
    public String name() {
        return "likelihood";
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 8L << width;
    }

    @Override
    public Optional<Long> decode(int width, long[] words, RandomStream stream) {
        long[] histogram = new long[1 << width];
        for (long word : words) {
            histogram[(int) word]++;
        }
        WalshHadamard.transform(histogram);
        long[] even = new long[width + 1];
        long[] odd = new long[width + 1];
        for (int weight = 1; weight <= width; weight++) {
            BigDecimal delta = bias(weight);
            even[weight] = scaledLog(BigDecimal.ONE.add(delta));
            odd[weight] = scaledLog(BigDecimal.ONE.subtract(delta));
        }
        long best = Long.MIN_VALUE;
        int ties = 0;
        for (int t = 1; t < histogram.length; t++) {
            long score = score(histogram[t], words.length, even[Integer.bitCount(t)], odd[Integer.bitCount(t)]);
            ties = score > best ? 1 : ties + (score == best ? 1 : 0);
            best = Math.max(best, score);
        }
        long chosen = stream.below(ties);
        for (int t = 1; t < histogram.length; t++) {
            long score = score(histogram[t], words.length, even[Integer.bitCount(t)], odd[Integer.bitCount(t)]);
            if (score == best && chosen-- == 0) {
                return Optional.of((long) t);
            }
        }
        throw new IllegalStateException("the best candidate is gone");
    }

    private static long score(long transform, long m, long even, long odd) {
        long orthogonal = (m + transform) / 2;
        return Math.addExact(Math.multiplyExact(orthogonal, even), Math.multiplyExact(m - orthogonal, odd));
    }

    private BigDecimal bias(int weight) {
        BigDecimal each = BigDecimal.ONE.subtract(noise.readoutFlip().multiply(BigDecimal.valueOf(2)));
        return BigDecimal.ONE.subtract(noise.uniformMix()).multiply(each.pow(weight));
    }

    private static long scaledLog(BigDecimal x) {
        return x.signum() == 0 ? NEVER : NaturalLogarithm.scaled(x, SCALE);
    }
}
