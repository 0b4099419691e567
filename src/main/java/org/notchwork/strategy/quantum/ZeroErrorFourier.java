package org.notchwork.strategy.quantum;

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
import org.notchwork.strategy.Usage;

/**
 * Finds a new orthogonal word in every round with certainty, by one round of amplitude amplification.
 *
 * <p>A round picks a word w orthogonal to the words so far, the first of the basis of their complement. Unless w is the
 * period, the measured y has y·w = 1 and is thus new; y·w = 0 proves that w is the period. Each round uses U_f twice and
 * its inverse once, 3 calls; at most n − 1 rounds. The answer is confirmed by f(0) = f(s), two classical queries that are
 * counted apart.
 *
 * @see "G. Brassard, P. Høyer, An exact quantum polynomial-time algorithm for Simon's problem (1997); G. Cai, D. Qiu, J.
 *     Comput. Syst. Sci. 97 (2018)"
 */
public final class ZeroErrorFourier implements QuantumStrategy {

    private static final int CALLS_A_ROUND = 3;
    private static final int CONFIRMING = 2;

    @Override
    public String name() {
        return "zero-error-fourier";
    }

    @Override
    public String description() {
        return "finds a new orthogonal word in every round for certain by amplitude amplification, 3 calls a round, at"
                + " most n - 1 rounds, then confirms by f(0) = f(s)";
    }

    @Override
    public Circuit circuit() {
        return Circuit.AMPLIFIED;
    }

    @Override
    public boolean isZeroError() {
        return true;
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.PERIOD))
                .or(() -> problem.promise().isExact() && !problem.isPromiseBroken()
                        ? Optional.empty()
                        : Optional.of(name() + " is certain only where the promise holds exactly; fourier-sampling"
                                + " takes " + problem.kind()))
                .or(() ->
                        width <= 63 ? Optional.empty() : Optional.of(name() + " keeps words of 63 bits, not " + width));
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
        Independent found = new Independent(width);
        long rounds = 0;
        while (found.rank() < width - 1) {
            if (oracle.remaining() < CALLS_A_ROUND) {
                return new Attempt.Censored(new Usage(rounds, found.rank()));
            }
            Word test = found.complement().get(0);
            Word measured = Word.of(width, simulation.amplifiedSample(test.bits(), stream));
            rounds++;
            if (measured.dot(test) == 0) {
                return confirmed(oracle, test, new Usage(rounds, found.rank()));
            }
            if (!found.add(measured)) {
                // It passes a test that all words before it fail, so it is new; if not, the engine is at fault.
                throw new IllegalStateException("a word that passes the test depends on words that do not");
            }
        }
        return confirmed(oracle, found.complement().get(0), new Usage(rounds, found.rank()));
    }

    private static Attempt confirmed(Oracle oracle, Word period, Usage usage) {
        if (oracle.remaining() < CONFIRMING) {
            return new Attempt.Censored(usage);
        }
        Word zero = Word.of(period.width(), 0);
        Pair pair = new Pair(zero, period, oracle.confirm(zero), oracle.confirm(period));
        return new Attempt.Answered(new Answer.Period(period), new Certificate.Collision(pair), usage);
    }
}
