package org.notchwork.engine.weights;

import java.util.Optional;
import org.notchwork.engine.Amplification;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Farther;
import org.notchwork.engine.Measurement;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.SignedTransform;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/**
 * Counts N(d) = #{x : f(x) = f(x ⊕ d)} and transforms: P(y) = 2^(−2n) Σ_d N(d) (−1)^(d·y), for any function, promise
 * kept or not. Whole numbers from the function to the sample.
 *
 * <p>Why: after U_f the value z leaves Σ_{x ∈ f⁻¹(z)} |x⟩; the squared transforms of the fibres add up to the transform
 * of their autocorrelations, which are N.
 */
public final class WeightsEngine implements BlindEngine {

    /** The name in study files. */
    public static final String NAME = "weights";

    private static final int WIDTH = 24;
    private static final int VALUE_WIDTH = 31;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "counts for every shift how many values stay the same, by evaluating the function everywhere, and"
                + " transforms the counts; whole numbers throughout";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
        return width <= WIDTH
                ? Optional.empty()
                : Optional.of("weights evaluates all 2^n points and reaches width " + WIDTH + ", not " + width + "; "
                        + Farther.than(problem, width));
    }

    @Override
    public long memoryBytes(int width) {
        return 24L << width;
    }

    /**
     * Prepares to run circuits around one function.
     *
     * @throws IllegalArgumentException if the input register has more than 24 qubits or the value register more than 31
     */
    @Override
    public Simulation open(Unitary unitary) {
        if (unitary.width() > WIDTH || unitary.valueWidth() > VALUE_WIDTH) {
            throw new IllegalArgumentException("weights reaches width " + WIDTH + " with values of " + VALUE_WIDTH
                    + " bits, not width " + unitary.width() + " with " + unitary.valueWidth());
        }
        return new Opened(unitary);
    }

    private static final class Opened implements Simulation {

        private final Unitary unitary;
        private Optional<Measurement> prepared = Optional.empty();
        private Optional<Measurement> signed = Optional.empty();

        Opened(Unitary unitary) {
            this.unitary = unitary;
        }

        @Override
        public long fourierSample(RandomStream stream) {
            unitary.use();
            return drawn(stream);
        }

        private long drawn(RandomStream stream) {
            if (prepared.isEmpty()) {
                prepared = Optional.of(new Measurement(OutcomeWeights.of(unitary)));
            }
            return prepared.get().draw(stream);
        }

        @Override
        public long phaseSample(RandomStream stream) {
            unitary.use();
            if (signed.isEmpty()) {
                signed = Optional.of(new Measurement(SignedTransform.weights(unitary)));
            }
            return signed.get().draw(stream);
        }

        /** Whether the test accepts is drawn first; then samples are drawn until one is on that side. */
        @Override
        public long amplifiedSample(long test, RandomStream stream) {
            unitary.use();
            unitary.useInverse();
            unitary.use();
            int wanted = amplification(test).isAccepted(stream) ? 1 : 0;
            long y = drawn(stream);
            while ((Long.bitCount(y & test) & 1) != wanted) {
                y = drawn(stream);
            }
            return y;
        }

        private Amplification amplification(long test) {
            long equal = 0;
            for (long x = 0; x < 1L << unitary.width(); x++) {
                equal += unitary.image(x) == unitary.image(x ^ test) ? 1 : 0;
            }
            return new Amplification(unitary.width(), equal);
        }

        @Override
        public Outcomes outcomes() {
            Reach.requireListable(unitary.width());
            return new Outcomes(OutcomeWeights.of(unitary));
        }

        @Override
        public Outcomes phaseOutcomes() {
            Reach.requireListable(unitary.width());
            return new Outcomes(SignedTransform.weights(unitary));
        }

        @Override
        public Outcomes amplifiedOutcomes(long test) {
            return amplification(test).outcomes(outcomes(), test);
        }
    }
}
