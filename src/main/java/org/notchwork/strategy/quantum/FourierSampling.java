package org.notchwork.strategy.quantum;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.ReducedBasis;
import org.notchwork.strategy.Usage;

/**
 * Samples words orthogonal to what is hidden until n − k of them are independent, k being the dimension that is hidden; a
 * subspace of dimension k is then left.
 *
 * <p>Each round uses U_f once. For a period the mean number of rounds is the sum over i = 1 … n − 1 of 1/(1 − 2^−i), about
 * n + 0.607. The one word that is left is confirmed by f(0) = f(s), two classical queries that are counted apart; for a
 * subspace each word of a basis is. If they differ, the promise is broken, and the answer is given all the same with the
 * pair that fails, so that the record shows it; but where there may be no period, that is then the answer.
 *
 * @see "D. R. Simon, On the power of quantum computation, SIAM J. Comput. 26 (1997), section 3"
 */
public final class FourierSampling implements QuantumStrategy {

    /** Of wider words the n - 1 equations would fill more than a line: the pair alone is the certificate. */
    private static final int WIDEST_LISTED = 256;

    @Override
    public String name() {
        return "fourier-sampling";
    }

    @Override
    public String description() {
        return "samples words orthogonal to the hidden subspace until n - k are independent (k = 1 for a period), then"
                + " confirms what is left by classical queries";
    }

    @Override
    public Circuit circuit() {
        return Circuit.FOURIER;
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.PERIOD, Question.PERIOD_OR_NONE, Question.SUBSPACE));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return width * (128L + width / 2);
    }

    @Override
    public Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        int hidden = oracle.promise().dimension();
        Independent found = new Independent(width);
        long rounds = 0;
        while (found.rank() < width - hidden) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(new Usage(rounds, found.rank()));
            }
            found.add(simulation.fourierWord(width, stream));
            rounds++;
        }
        Usage usage = new Usage(rounds, (long) width - hidden);
        if (oracle.remaining() < hidden + 1L) {
            return new Attempt.Censored(usage);
        }
        return oracle.promise().question() == Question.SUBSPACE
                ? subspace(oracle, found, usage)
                : period(oracle, found, usage);
    }

    private static Attempt period(Oracle oracle, Independent found, Usage usage) {
        Word zero = new Word(oracle.width(), BigInteger.ZERO);
        Word candidate = found.complement().get(0);
        Pair confirmation = new Pair(zero, candidate, oracle.confirm(zero), oracle.confirm(candidate));
        if (oracle.width() > WIDEST_LISTED) {
            return new Attempt.Answered(new Answer.Period(candidate), new Certificate.Collision(confirmation), usage);
        }
        boolean isNone = oracle.promise().question() == Question.PERIOD_OR_NONE && !confirmation.collides();
        return new Attempt.Answered(
                isNone ? new Answer.NoPeriod() : new Answer.Period(candidate),
                new Certificate.Equations(found.words(), confirmation),
                usage);
    }

    private static Attempt subspace(Oracle oracle, Independent found, Usage usage) {
        int width = oracle.width();
        Word zero = new Word(width, BigInteger.ZERO);
        Word atZero = oracle.confirm(zero);
        Answer.Subspace answer = ReducedBasis.subspace(found.complement(), width);
        List<Pair> confirmations = new ArrayList<>();
        for (Word word : answer.basis()) {
            confirmations.add(new Pair(zero, word, atZero, oracle.confirm(word)));
        }
        return new Attempt.Answered(answer, new Certificate.Annihilators(found.words(), confirmations), usage);
    }
}
