package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.Usage;

/**
 * Queries the n unit vectors, and 0 first where there may be a constant bit: as many queries as are necessary for
 * certainty, each value telling one bit.
 *
 * @see "E. Bernstein, U. Vazirani, Quantum complexity theory, SIAM J. Comput. 26 (1997)"
 */
public final class UnitVectors implements ClassicalStrategy {

    @Override
    public String name() {
        return "unit-vectors";
    }

    @Override
    public String description() {
        return "queries the n unit vectors, and 0 where there may be a constant bit";
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
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        Usage usage = new Usage(0, 2);
        long constant = 0;
        if (oracle.promise().offset()) {
            constant = oracle.query(0);
        }
        long a = 0;
        for (int i = 0; i < width; i++) {
            if (oracle.remaining() == 0) {
                return new Attempt.Censored(usage);
            }
            a |= (oracle.query(1L << i) ^ constant) << i;
        }
        return new Attempt.Answered(
                new Answer.Mask(Word.of(width, a)), new Certificate.Absent("the values at the unit vectors"), usage);
    }
}
