package org.notchwork.strategy.classical;

import java.util.function.LongSupplier;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.Usage;

/** Queries different points until two values differ, which shows a balanced function, or so many are the same. */
final class FirstDifference {

    private static final Usage USAGE = new Usage(0, 2);

    private FirstDifference() {}

    static Attempt run(Oracle oracle, long most, LongSupplier points) {
        long first = points.getAsLong();
        long value = oracle.query(first);
        for (long asked = 1; asked < most; asked++) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(USAGE);
            }
            long point = points.getAsLong();
            long other = oracle.query(point);
            if (other != value) {
                int width = oracle.width();
                Pair pair = new Pair(
                        Word.of(width, first),
                        Word.of(width, point),
                        Word.of(oracle.valueWidth(), value),
                        Word.of(oracle.valueWidth(), other));
                return new Attempt.Answered(new Answer.Balance(true), new Certificate.Difference(pair), USAGE);
            }
        }
        return new Attempt.Answered(new Answer.Balance(false), new Certificate.Absent(most + " equal values"), USAGE);
    }
}
