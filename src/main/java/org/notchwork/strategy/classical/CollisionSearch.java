package org.notchwork.strategy.classical;

import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Question;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.Usage;

/**
 * Queries points in a given order until two have one value; their sum is the period.
 *
 * <p>Ends censored when the query limit is reached, and also when the order is exhausted without a collision, which
 * happens only where the promise is broken.
 */
final class CollisionSearch {

    private CollisionSearch() {}

    /** An order of points. */
    interface Order {

        /** Returns whether the points so far meet every period: every non-zero word is the sum of two of them. */
        default boolean isDone() {
            return false;
        }

        /** Returns the next point, or {@link SeenValues#NONE} after the last. */
        long next();
    }

    /**
     * Queries in this order until a collision or the end of the query limit. Where there may be no period, so many
     * different values that a period would have shown, or the end of an order that meets every period, answer that.
     */
    static Attempt run(Oracle oracle, Order order) {
        SeenValues seen = new SeenValues();
        boolean mayBeNone = oracle.promise().question() == Question.PERIOD_OR_NONE;
        long sure = (1L << (oracle.width() - 1)) + 1;
        for (long x = order.next(); x != SeenValues.NONE && oracle.remaining() > 0; x = order.next()) {
            long value = oracle.query(x);
            long earlier = seen.noteOrFind(value, x);
            if (earlier != SeenValues.NONE && earlier != x) {
                return found(oracle, earlier, x, value, seen.memoryWords());
            }
            if (mayBeNone && (seen.size() == sure || order.isDone())) {
                return new Attempt.Answered(
                        new Answer.NoPeriod(),
                        new Certificate.Absent(seen.size() + " different points have different values"),
                        new Usage(0, seen.memoryWords()));
            }
        }
        return new Attempt.Censored(new Usage(0, seen.memoryWords()));
    }

    private static Attempt found(Oracle oracle, long x, long y, long value, long memoryWords) {
        int width = oracle.width();
        Word shared = Word.of(oracle.valueWidth(), value);
        Pair pair = new Pair(Word.of(width, x), Word.of(width, y), shared, shared);
        return new Attempt.Answered(
                new Answer.Period(pair.x().xor(pair.y())), new Certificate.Collision(pair), new Usage(0, memoryWords));
    }
}
