package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.Usage;

/**
 * Queries uniformly random points, none twice; the sum of each two with one value is a candidate, which is verified by
 * f(r) = f(r ⊕ s) at two random points r, {@code bits(n)} each. Where there may be no period, 4 · 2^⌈n/2⌉ points without a candidate that
 * holds, or all points, answer that.
 *
 * <p>A point is {@code bits(n)}, drawn again while it has been asked before. With P points a period stays unseen with
 * probability about e^(−P²/2^(n+1)), here e^(−8). Verification counts as searching.
 *
 * @see "H. Kuwakado, M. Morii, ISIT 2010, for the function; the birthday bound for the count"
 */
public final class CollisionCounting implements ClassicalStrategy {

    private static final int PATIENCE = 4;
    private static final int TESTS = 2;

    @Override
    public String name() {
        return "collision-counting";
    }

    @Override
    public String description() {
        return "queries random points, none twice, and verifies the sum of each two with one value at two random points";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.PERIOD, Question.PERIOD_OR_NONE));
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
        return 2 * SeenValues.bytes(Math.min(queryLimit, 1L << width));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        long all = 1L << width;
        boolean mayBeNone = oracle.promise().question() == Question.PERIOD_OR_NONE;
        long most = mayBeNone ? Math.min(all, (long) PATIENCE << ((width + 1) / 2)) : all;
        SeenValues seen = new SeenValues();
        SeenValues asked = new SeenValues();
        while (asked.size() < most) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(new Usage(0, seen.memoryWords()));
            }
            long x = stream.bits(width);
            if (asked.noteOrFind(x, x) != SeenValues.NONE) {
                continue;
            }
            long value = oracle.query(x);
            long earlier = seen.noteOrFind(value, x);
            if (earlier == SeenValues.NONE) {
                continue;
            }
            Optional<Boolean> holds = holds(oracle, earlier ^ x, stream);
            if (holds.isEmpty()) {
                return new Attempt.Censored(new Usage(0, seen.memoryWords()));
            }
            if (holds.get()) {
                Word shared = Word.of(oracle.valueWidth(), value);
                Pair pair = new Pair(Word.of(width, earlier), Word.of(width, x), shared, shared);
                return new Attempt.Answered(
                        new Answer.Period(pair.x().xor(pair.y())),
                        new Certificate.Collision(pair),
                        new Usage(0, seen.memoryWords()));
            }
        }
        Usage usage = new Usage(0, seen.memoryWords());
        return mayBeNone
                ? new Attempt.Answered(
                        new Answer.NoPeriod(), new Certificate.Absent(most + " points show no period"), usage)
                : new Attempt.Unanswered(usage);
    }

    /** Two random points and their partners: four queries, fewer if the first pair differs; empty if the limit is nearer. */
    private static Optional<Boolean> holds(Oracle oracle, long candidate, RandomStream stream) {
        for (int test = 0; test < TESTS; test++) {
            if (oracle.remaining() < 2) {
                return Optional.empty();
            }
            long r = stream.bits(oracle.width());
            if (oracle.query(r) != oracle.query(r ^ candidate)) {
                return Optional.of(false);
            }
        }
        return Optional.of(true);
    }
}
