package org.notchwork.strategy.quantum;

import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Simulation;
import org.notchwork.json.JsonObject;
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
import org.notchwork.strategy.quantum.decoder.Decoder;

/**
 * Samples m words, no more and no fewer, and lets a decoder name the period. By plain elimination that succeeds with
 * probability ∏_{i=0}^{n−2} (1 − 2^(i−m)). What is named is confirmed by f(0) = f(s), two classical queries that are
 * counted apart and change nothing; where the words name nothing, there is no answer.
 *
 * <p>Where there may be no period: rank n of the m words answers that, rank n − 1 answers the period that is left, a lower
 * rank gives no answer. So a function with a period is never called injective.
 *
 * @param rounds m
 * @param decoder what names the period
 */
public record FourierSamplingFixed(Rounds rounds, Decoder decoder) implements QuantumStrategy {

    /** The name in study files. */
    static final String NAME = "fourier-sampling-fixed";

    private static final int CONFIRMING = 2;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public JsonObject settings() {
        return rounds.write(JsonObject.builder()).put("decoder", decoder.name()).build();
    }

    @Override
    public String description() {
        return "samples " + rounds.text() + " words and names the period by " + decoder.name();
    }

    @Override
    public Circuit circuit() {
        return Circuit.FOURIER;
    }

    @Override
    public OptionalInt samples(int width) {
        return OptionalInt.of(rounds.at(width));
    }

    @Override
    public boolean bearsNoise() {
        return true;
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(NAME, problem, Set.of(Question.PERIOD, Question.PERIOD_OR_NONE))
                .or(() -> problem.promise().question() == Question.PERIOD_OR_NONE
                                && !decoder.name().equals("elimination")
                        ? Optional.of("decoder " + decoder.name() + " always names a period; where there may be none,"
                                + " elimination decides")
                        : Optional.empty())
                .or(() -> width <= decoder.greatestWidth()
                        ? Optional.empty()
                        : Optional.of("decoder " + decoder.name() + " reaches width " + decoder.greatestWidth()
                                + ", not " + width));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public boolean mayErr() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 16L * rounds.at(width) + decoder.memoryBytes(width);
    }

    @Override
    public Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        long[] words = new long[rounds.at(width)];
        Independent independent = new Independent(width);
        for (int i = 0; i < words.length; i++) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(new Usage(i, i));
            }
            words[i] = simulation.fourierSample(stream);
            independent.add(Word.of(width, words[i]));
        }
        Usage usage = new Usage(words.length, words.length);
        if (oracle.promise().question() == Question.PERIOD_OR_NONE && independent.rank() == width) {
            return new Attempt.Answered(new Answer.NoPeriod(), new Certificate.Spanning(independent.words()), usage);
        }
        Optional<Long> period = decoder.decode(width, words, stream);
        if (period.isEmpty()) {
            return new Attempt.Unanswered(usage);
        }
        if (oracle.remaining() < CONFIRMING) {
            return new Attempt.Censored(usage);
        }
        Word zero = Word.of(width, 0);
        Word named = Word.of(width, period.get());
        Pair pair = new Pair(
                zero,
                named,
                Word.of(oracle.valueWidth(), oracle.confirm(0)),
                Word.of(oracle.valueWidth(), oracle.confirm(period.get())));
        return new Attempt.Answered(new Answer.Period(named), new Certificate.Collision(pair), usage);
    }
}
