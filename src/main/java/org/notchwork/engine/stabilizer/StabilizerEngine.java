package org.notchwork.engine.stabilizer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.notchwork.bits.Word;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Network;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/**
 * Follows a circuit of Hadamard, CNOT and X gates gate by gate on a stabilizer tableau: for functions that are given as a
 * circuit, at thousands of qubits. It sees the gates of U_f, as a machine that ran them would, and is not told the secret.
 *
 * @see "D. Gottesman, The Heisenberg representation of quantum computers (1998); S. Aaronson, D. Gottesman, Phys. Rev. A 70,
 *     052328 (2004)"
 */
public final class StabilizerEngine implements BlindEngine {

    /** The name in study files. */
    public static final String NAME = "stabilizer";

    private static final int WIDTH = 2048;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "follows the gates of the function's circuit on a stabilizer tableau; sees the gates, not the secret";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
        if (problem.promise().labels() != Promise.Labels.AFFINE) {
            return Optional.of("stabilizer follows circuits of CNOT and X gates, and functions of " + problem.kind()
                    + " are not given as such; engine weights takes any function");
        }
        if (circuit == Circuit.AMPLIFIED) {
            return Optional.of(
                    "stabilizer follows Hadamard, CNOT and X gates, and amplification has a gate controlled by"
                            + " all qubits; engine statevector takes it");
        }
        return width <= WIDTH
                ? Optional.empty()
                : Optional.of("stabilizer reaches width " + WIDTH + ", not " + width + "; no engine reaches it");
    }

    /** What stands in for a random function of an affine period is a circuit as well; for an inner product it is not. */
    @Override
    public boolean takesControlsOf(Problem problem) {
        return problem.promise().question() == Question.PERIOD;
    }

    @Override
    public long memoryBytes(int width) {
        return 4096 + 6L * width * width;
    }

    /**
     * Prepares to run circuits around one function.
     *
     * @throws IllegalArgumentException if the function is not given as a circuit
     */
    @Override
    public Simulation open(Unitary unitary) {
        return new Opened(
                unitary,
                unitary.network()
                        .orElseThrow(
                                () -> new IllegalArgumentException("stabilizer needs a function given as a circuit")));
    }

    /** The state before the measurement is the same in every run, so it is prepared once and measured as often as asked. */
    private static final class Opened implements Simulation {

        private final Unitary unitary;
        private final Network network;
        private Optional<OutcomeSpace> sampled = Optional.empty();
        private Optional<OutcomeSpace> signed = Optional.empty();

        Opened(Unitary unitary, Network network) {
            this.unitary = unitary;
            this.network = network;
        }

        @Override
        public long fourierSample(RandomStream stream) {
            return fourierWord(network.inputs(), stream).bits();
        }

        @Override
        public Word fourierWord(int width, RandomStream stream) {
            unitary.use();
            if (sampled.isEmpty()) {
                sampled = Optional.of(prepared(false));
            }
            return new Word(width, sampled.get().sample(stream));
        }

        @Override
        public long phaseSample(RandomStream stream) {
            unitary.use();
            if (signed.isEmpty()) {
                signed = Optional.of(prepared(true));
            }
            return signed.get().sample(stream).longValueExact();
        }

        @Override
        public Outcomes outcomes() {
            return outcomes(false);
        }

        @Override
        public Outcomes phaseOutcomes() {
            return outcomes(true);
        }

        private Outcomes outcomes(boolean isSigned) {
            Reach.requireListable(network.inputs());
            OutcomeSpace space = prepared(isSigned);
            long[] weights = new long[1 << network.inputs()];
            for (int y = 0; y < weights.length; y++) {
                weights[y] = space.contains(BigInteger.valueOf(y)) ? 1 : 0;
            }
            return new Outcomes(weights);
        }

        private OutcomeSpace prepared(boolean isSigned) {
            int inputs = network.inputs();
            Tableau state = new Tableau(inputs + network.values());
            if (isSigned) {
                state.x(inputs);
                state.hadamard(inputs);
            }
            IntStream.range(0, inputs).forEach(state::hadamard);
            for (int gate = 0; gate < network.size(); gate++) {
                if (network.control(gate) == Network.NO_CONTROL) {
                    state.x(network.target(gate));
                } else {
                    state.cnot(network.control(gate), network.target(gate));
                }
            }
            IntStream.range(0, inputs).forEach(state::hadamard);
            List<Integer> measured = IntStream.range(0, inputs).boxed().toList();
            return OutcomeSpace.of(state, measured);
        }
    }
}
