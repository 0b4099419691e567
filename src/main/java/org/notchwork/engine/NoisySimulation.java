package org.notchwork.engine;

import java.math.BigInteger;
import org.notchwork.bits.Word;
import org.notchwork.seed.RandomStream;

/**
 * Another simulation seen through noise: with probability q a sample is replaced by a uniform word; then each of its bits
 * is flipped with probability p.
 *
 * <p>Chance is drawn in this order, which is a rule of the format: the sample's own; with q above 0, {@code below} of q's
 * denominator and, if that is less than the numerator, the uniform word as {@code bits(n)} (in pieces of 63, lowest
 * first); with p above 0, {@code below} of p's denominator for each bit, lowest first.
 */
public final class NoisySimulation implements Simulation {

    private static final int PIECE = 63;

    private final Simulation clean;
    private final int width;
    private final Noise noise;

    /** Puts noise in front of a simulation of {@code width} input qubits. */
    public NoisySimulation(Simulation clean, int width, Noise noise) {
        this.clean = clean;
        this.width = width;
        this.noise = noise;
    }

    @Override
    public long fourierSample(RandomStream stream) {
        return disturbed(Word.of(width, clean.fourierSample(stream)), stream).bits();
    }

    @Override
    public Word fourierWord(int ofWidth, RandomStream stream) {
        return disturbed(clean.fourierWord(ofWidth, stream), stream);
    }

    @Override
    public long phaseSample(RandomStream stream) {
        return disturbed(Word.of(width, clean.phaseSample(stream)), stream).bits();
    }

    /** The distribution without noise: what the engine is responsible for. */
    @Override
    public Outcomes outcomes() {
        return clean.outcomes();
    }

    private Word disturbed(Word sample, RandomStream stream) {
        BigInteger word = sample.value();
        if (noise.uniformMix().signum() > 0 && noise.isMixed(stream)) {
            word = uniform(stream);
        }
        if (noise.readoutFlip().signum() > 0) {
            for (int bit = 0; bit < width; bit++) {
                if (noise.isFlipped(stream)) {
                    word = word.flipBit(bit);
                }
            }
        }
        return new Word(width, word);
    }

    private BigInteger uniform(RandomStream stream) {
        BigInteger word = BigInteger.ZERO;
        for (int from = 0; from < width; from += PIECE) {
            long piece = stream.bits(Math.min(PIECE, width - from));
            word = word.or(BigInteger.valueOf(piece).shiftLeft(from));
        }
        return word;
    }
}
