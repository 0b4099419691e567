package org.notchwork.engine.annihilator;

import java.util.Optional;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/**
 * Samples uniformly from {y : y·s = 0}, the distribution that theory gives for a function with period s. It is TOLD
 * s: its figures show what theory says, not that a circuit would find it.
 */
public final class AnnihilatorEngine implements SightedEngine {

    /** The name in study files. */
    public static final String NAME = "annihilator";

    private static final int WIDTH = 63;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "told the secret: samples uniformly from the words orthogonal to it, as theory says a circuit would";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return width <= WIDTH
                ? Optional.empty()
                : Optional.of("annihilator reaches width " + WIDTH + ", not " + width + "; no engine reaches it");
    }

    @Override
    public long memoryBytes(int width) {
        return 64;
    }

    @Override
    public Simulation open(Unitary unitary, Answer hidden) {
        if (hidden instanceof Answer.Period period && period.s().width() == unitary.width()) {
            return new Opened(unitary, period.s().bits());
        }
        throw new IllegalArgumentException("annihilator needs a period of " + unitary.width() + " bits: " + hidden);
    }

    private record Opened(Unitary unitary, long period) implements Simulation {

        /** Draws y uniformly; if y·s = 1, flips in y the top set bit of s, which pairs the two halves one to one. */
        @Override
        public long fourierSample(RandomStream stream) {
            unitary.use();
            long y = stream.bits(unitary.width());
            return (Long.bitCount(y & period) & 1) == 0 ? y : y ^ Long.highestOneBit(period);
        }

        @Override
        public Outcomes outcomes() {
            Reach.requireListable(unitary.width());
            long[] weights = new long[1 << unitary.width()];
            for (int y = 0; y < weights.length; y++) {
                weights[y] = 1L - (Long.bitCount(y & period) & 1);
            }
            return new Outcomes(weights);
        }
    }
}
