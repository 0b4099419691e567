package org.notchwork.strategy.quantum;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.period.XorPeriodFamily;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Usage;

/**
 * Samples words orthogonal to the period until n − 1 of them are independent; one word is then left.
 *
 * <p>Each round uses U_f once and yields y uniform on {y : y·s = 0}, so the mean number of rounds is the sum over
 * i = 1 … n − 1 of 1/(1 − 2^−i), about n + 0.607. The word that is left is confirmed by f(0) = f(s), two classical
 * queries that are counted apart. If they differ, the promise is broken; the word is answered all the same with the
 * pair that fails, so that the record shows it.
 *
 * @see "D. R. Simon, On the power of quantum computation, SIAM J. Comput. 26 (1997), section 3"
 */
public final class FourierSampling implements QuantumStrategy {

    private static final int CONFIRMING = 2;

    @Override
    public String name() {
        return "fourier-sampling";
    }

    @Override
    public String description() {
        return "samples words orthogonal to the period until n - 1 are independent, then confirms by f(0) = f(s)";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return problem.kind().equals(XorPeriodFamily.KIND)
                ? Optional.empty()
                : Optional.of(name() + " names a period; " + problem.kind() + " asks for something else");
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 128L * width;
    }

    @Override
    public Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        EchelonBasis basis = new EchelonBasis(width);
        List<Word> independent = new ArrayList<>();
        long rounds = 0;
        while (basis.rank() < width - 1) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(new Usage(rounds, basis.rank()));
            }
            long y = simulation.fourierSample(stream);
            rounds++;
            if (basis.add(y)) {
                independent.add(Word.of(width, y));
            }
        }
        Usage usage = new Usage(rounds, width - 1L);
        if (oracle.remaining() < CONFIRMING) {
            return new Attempt.Censored(usage);
        }
        long candidate = basis.complement()[0];
        Pair confirmation = new Pair(
                Word.of(width, 0),
                Word.of(width, candidate),
                Word.of(oracle.valueWidth(), oracle.confirm(0)),
                Word.of(oracle.valueWidth(), oracle.confirm(candidate)));
        return new Attempt.Answered(
                new Answer.Period(confirmation.y()), new Certificate.Equations(independent, confirmation), usage);
    }
}
