package org.notchwork.strategy.quantum;

import java.util.Optional;
import java.util.Set;
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
 * Runs the phase circuit once: a constant function gives 0 with certainty, a balanced one never does.
 *
 * @see "D. Deutsch, R. Jozsa, Proc. R. Soc. A 439 (1992); one exact use: R. Cleve, A. Ekert, C. Macchiavello, M. Mosca, Proc.
 *     R. Soc. A 454 (1998)"
 */
public final class PhaseQuery implements QuantumStrategy {

    @Override
    public String name() {
        return "phase-query";
    }

    @Override
    public String description() {
        return "runs the phase circuit once and answers constant exactly if 0 is measured";
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
        return Answering.only(name(), problem, Set.of(Question.CONSTANT_OR_BALANCED));
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
        boolean isBalanced = simulation.phaseSample(stream) != 0;
        return new Attempt.Answered(
                new Answer.Balance(isBalanced), new Certificate.Absent("one measured word"), new Usage(1, 1));
    }
}
