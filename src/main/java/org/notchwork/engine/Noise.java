package org.notchwork.engine;

import java.math.BigDecimal;
import org.notchwork.seed.RandomStream;

/**
 * What disturbs the samples of a circuit.
 *
 * @param readoutFlip p, the probability that a measured bit is flipped, each bit on its own; at least 0 and below 1/2
 * @param uniformMix q, the probability that a sample is replaced by a uniform word; at least 0 and below 1
 */
public record Noise(BigDecimal readoutFlip, BigDecimal uniformMix) {

    /** Nothing is disturbed. */
    public static final Noise NONE = new Noise(BigDecimal.ZERO, BigDecimal.ZERO);

    /** Checks the ranges. */
    public Noise {
        if (readoutFlip.signum() < 0
                || readoutFlip.compareTo(new BigDecimal("0.5")) >= 0
                || uniformMix.signum() < 0
                || uniformMix.compareTo(BigDecimal.ONE) >= 0) {
            throw new IllegalArgumentException("readout flip " + readoutFlip + ", uniform mix " + uniformMix);
        }
    }

    /** Returns whether nothing is disturbed. */
    public boolean isNone() {
        return readoutFlip.signum() == 0 && uniformMix.signum() == 0;
    }

    boolean isFlipped(RandomStream stream) {
        return happens(readoutFlip, stream);
    }

    boolean isMixed(RandomStream stream) {
        return happens(uniformMix, stream);
    }

    /** A decimal with d places is a whole number of 10^d parts, so that the draw is exact. */
    private static boolean happens(BigDecimal probability, RandomStream stream) {
        BigDecimal plain = probability.setScale(Math.max(0, probability.scale()));
        long parts = plain.unscaledValue().longValueExact();
        long all = BigDecimal.ONE.scaleByPowerOfTen(plain.scale()).longValueExact();
        return stream.below(all) < parts;
    }
}
