package org.notchwork.engine.fibre;

import java.util.Optional;
import org.notchwork.bits.WalshHadamard;
import org.notchwork.engine.Amplification;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Farther;
import org.notchwork.engine.Fibres;
import org.notchwork.engine.Measurement;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.SignedTransform;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/**
 * Measures the value register first. Its outcome v = f(x₀), x₀ uniform, leaves the input register in the uniform
 * superposition of the fibre F = f⁻¹(v); Hadamards then give y with probability |Σ_{x∈F} (−1)^(x·y)|² / (2^n |F|).
 */
public final class FibreEngine implements BlindEngine {

    /** The name in study files. */
    public static final String NAME = "fibre";

    private static final int WIDTH = 26;

    /** A value and a point share one word when the fibres are sorted. */
    private static final int VALUE_WIDTH = 31;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "the value register is measured first; the fibre that is left is found by evaluating the function"
                + " everywhere and then transformed";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
        return width <= WIDTH
                ? Optional.empty()
                : Optional.of("fibre evaluates all 2^n points and reaches width " + WIDTH + ", not " + width + "; "
                        + Farther.than(problem, width));
    }

    @Override
    public long memoryBytes(int width) {
        return 8L << width;
    }

    /**
     * Prepares to run circuits around one function.
     *
     * @throws IllegalArgumentException if the input register has more than 26 qubits or the value register more than 31
     */
    @Override
    public Simulation open(Unitary unitary) {
        if (unitary.width() > WIDTH || unitary.valueWidth() > VALUE_WIDTH) {
            throw new IllegalArgumentException("fibre reaches width " + WIDTH + " with values of " + VALUE_WIDTH
                    + " bits, not width " + unitary.width() + " with " + unitary.valueWidth());
        }
        return new Opened(unitary);
    }

    private static final class Opened implements Simulation {

        private final Unitary unitary;
        private Optional<Fibres> fibres = Optional.empty();
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
            if (fibres.isEmpty()) {
                fibres = Optional.of(new Fibres(unitary));
            }
            int[] fibre = fibres.get().of(unitary.image(stream.bits(unitary.width())));
            return isSmall(fibre.length, unitary.width())
                    ? byRejection(fibre, stream)
                    : new Measurement(squares(fibre)).draw(stream);
        }

        @Override
        public Outcomes outcomes() {
            Reach.requireListable(unitary.width());
            Fibres all = new Fibres(unitary);
            long[] weights = new long[all.size()];
            for (int start = 0; start < all.size(); ) {
                int[] fibre = all.startingAt(start);
                addSquares(fibre, weights);
                start += fibre.length;
            }
            return new Outcomes(weights);
        }

        /** Rejection takes about |F|² steps, a transform n · 2^n: the cheaper one is used. */
        @Override
        public long phaseSample(RandomStream stream) {
            unitary.use();
            if (signed.isEmpty()) {
                signed = Optional.of(new Measurement(SignedTransform.weights(unitary)));
            }
            return signed.get().draw(stream);
        }

        @Override
        public Outcomes phaseOutcomes() {
            Reach.requireListable(unitary.width());
            return new Outcomes(SignedTransform.weights(unitary));
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

        @Override
        public Outcomes amplifiedOutcomes(long test) {
            return amplification(test).outcomes(outcomes(), test);
        }

        private Amplification amplification(long test) {
            long equal = 0;
            for (long x = 0; x < 1L << unitary.width(); x++) {
                equal += unitary.image(x) == unitary.image(x ^ test) ? 1 : 0;
            }
            return new Amplification(unitary.width(), equal);
        }

        private static boolean isSmall(int size, int width) {
            return (long) size * size <= (long) width << width;
        }

        /** Draws y uniformly and keeps it with probability amplitude² / |F|²; one round in |F| is kept. */
        private long byRejection(int[] fibre, RandomStream stream) {
            long all = (long) fibre.length * fibre.length;
            while (true) {
                long y = stream.bits(unitary.width());
                long amplitude = amplitude(fibre, y);
                if (stream.below(all) < amplitude * amplitude) {
                    return y;
                }
            }
        }

        private long[] squares(int[] fibre) {
            long[] amplitudes = new long[1 << unitary.width()];
            for (int x : fibre) {
                amplitudes[x] = 1;
            }
            WalshHadamard.transform(amplitudes);
            for (int y = 0; y < amplitudes.length; y++) {
                amplitudes[y] *= amplitudes[y];
            }
            return amplitudes;
        }

        private void addSquares(int[] fibre, long[] weights) {
            if (fibre.length > unitary.width()) {
                long[] squares = squares(fibre);
                for (int y = 0; y < weights.length; y++) {
                    weights[y] += squares[y];
                }
                return;
            }
            for (int y = 0; y < weights.length; y++) {
                long amplitude = amplitude(fibre, y);
                weights[y] += amplitude * amplitude;
            }
        }

        private static long amplitude(int[] fibre, long y) {
            long amplitude = 0;
            for (int x : fibre) {
                amplitude += 1L - 2L * (Long.bitCount(x & y) & 1);
            }
            return amplitude;
        }
    }
}
