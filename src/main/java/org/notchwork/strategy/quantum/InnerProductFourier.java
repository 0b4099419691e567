package org.notchwork.strategy.quantum;

import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Usage;

/**
 * Runs the phase circuit once; the measured word is a, with certainty, constant bit or not.
 *
 * @see "E. Bernstein, U. Vazirani, Quantum complexity theory, SIAM J. Comput. 26 (1997)"
 */
public final class InnerProductFourier implements QuantumStrategy {

    @Override
    public String name() {
        return "inner-product-fourier";
    }

    @Override
    public String description() {
        return "runs the phase circuit once and answers the measured word";
    }

    @Override
    public Circuit circuit() {
        return Circuit.PHASE;
    }

    @Override
    public boolean isZeroError() {
        return true;
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.MASK));
    }

    @Override
    public boolean deterministic() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 16;
    }

    @Override
    public Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream) {
        Word measured = Word.of(oracle.width(), simulation.phaseSample(stream));
        return new Attempt.Answered(
                new Answer.Mask(measured), new Certificate.Absent("one measured word"), new Usage(1, 1));
    }
}
