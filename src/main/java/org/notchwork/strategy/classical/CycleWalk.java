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
 * Walks x → f(x) ⊕ c until it comes round, by R. P. Brent's method (BIT 20 (1980)), in constant memory. The two points
 * before the entrance of the cycle have one value, and their sum is the period.
 *
 * <p>The start is {@code bits(n)} and c = 0 at first. A walk that starts on its cycle has no entrance; then c and the
 * start are drawn anew, in this order, {@code bits(n)} each, which keeps period and collisions and gives another walk.
 * Every evaluation counts, those that repeat earlier ones included.
 */
public final class CycleWalk implements ClassicalStrategy {

    private static final int MEMORY_WORDS = 7;
    private static final int GREATEST = 63;

    @Override
    public String name() {
        return "cycle-walk";
    }

    @Override
    public String description() {
        return "walks x to f(x) until the walk comes round and takes the two points before the entrance of the cycle, in"
                + " constant memory; walks x to f(x) xor c anew if it starts on its cycle";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.exactly(name(), problem, Set.of(Question.PERIOD))
                .or(() -> PeriodByCollision.tooWide(name(), width));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 8L * MEMORY_WORDS;
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        if (width > GREATEST || oracle.valueWidth() != width) {
            throw new IllegalArgumentException("a walk on " + width + " bits with values of " + oracle.valueWidth());
        }
        long start = stream.bits(width);
        long constant = 0;
        while (true) {
            Walk walk = new Walk(oracle, constant);
            if (!walk.run(start)) {
                return new Attempt.Censored(new Usage(0, MEMORY_WORDS));
            }
            if (walk.before != walk.beside) {
                return found(oracle, walk);
            }
            constant = stream.bits(width);
            start = stream.bits(width);
        }
    }

    private static Attempt found(Oracle oracle, Walk walk) {
        int width = oracle.width();
        Word shared = Word.of(width, walk.value);
        Pair pair = new Pair(Word.of(width, walk.before), Word.of(width, walk.beside), shared, shared);
        return new Attempt.Answered(
                new Answer.Period(pair.x().xor(pair.y())), new Certificate.Collision(pair), new Usage(0, MEMORY_WORDS));
    }

    /** One walk: after {@link #run} the two points with one value, or one and the same if it started on its cycle. */
    private static final class Walk {

        private final Oracle oracle;
        private final long constant;
        private boolean cut;
        private long before;
        private long beside;
        private long value;

        Walk(Oracle oracle, long constant) {
            this.oracle = oracle;
            this.constant = constant;
        }

        private long step(long x) {
            if (cut || oracle.remaining() == 0) {
                cut = true;
                return x;
            }
            value = oracle.query(x);
            return value ^ constant;
        }

        /** Returns false if the query limit was reached. */
        boolean run(long start) {
            long length = cycle(start);
            long slow = start;
            long fast = start;
            for (long i = 0; i < length && !cut; i++) {
                fast = step(fast);
            }
            while (slow != fast && !cut) {
                before = slow;
                beside = fast;
                slow = step(slow);
                fast = step(fast);
            }
            return !cut;
        }

        private long cycle(long start) {
            long power = 1;
            long length = 1;
            long slow = start;
            long fast = step(start);
            while (slow != fast && !cut) {
                if (power == length) {
                    slow = fast;
                    power *= 2;
                    length = 0;
                }
                fast = step(fast);
                length++;
            }
            return length;
        }
    }
}
