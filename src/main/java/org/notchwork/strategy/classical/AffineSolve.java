package org.notchwork.strategy.classical;

import java.math.BigInteger;
import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.Usage;

/**
 * Queries 0 and the n unit vectors of a function known to be affine, which gives its matrix, and solves Mx = 0: n + 1
 * queries. The solution is confirmed at 0, one query more that is counted apart.
 */
public final class AffineSolve implements ClassicalStrategy {

    @Override
    public String name() {
        return "affine-solve";
    }

    @Override
    public String description() {
        return "queries 0 and the unit vectors of a function known to be affine and solves for the period";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(name(), problem, Set.of(Question.PERIOD))
                .or(() -> problem.promise().labels() == Promise.Labels.AFFINE
                        ? Optional.empty()
                        : Optional.of(name() + " needs functions that are known to be affine, and those of "
                                + problem.kind() + " are not"));
    }

    @Override
    public boolean deterministic() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return width * (width / 4L + 128);
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        Usage usage = new Usage(width, 2L * width * ((width + 63) / 64));
        if (oracle.remaining() < width + 2L) {
            while (oracle.remaining() > 0) {
                oracle.query(new Word(width, BigInteger.ZERO));
            }
            return new Attempt.Censored(usage);
        }
        Word constant = oracle.query(new Word(width, BigInteger.ZERO));
        // For each leading bit the column with that bit and which unit vectors it is the sum of.
        BigInteger[] columns = new BigInteger[oracle.valueWidth()];
        BigInteger[] sums = new BigInteger[oracle.valueWidth()];
        BigInteger kernel = BigInteger.ZERO;
        for (int i = 0; i < width; i++) {
            BigInteger sum = BigInteger.ONE.shiftLeft(i);
            BigInteger column = oracle.query(new Word(width, sum)).xor(constant).value();
            while (column.signum() != 0 && columns[column.bitLength() - 1] != null) {
                int lead = column.bitLength() - 1;
                column = column.xor(columns[lead]);
                sum = sum.xor(sums[lead]);
            }
            if (column.signum() == 0) {
                kernel = sum;
            } else {
                columns[column.bitLength() - 1] = column;
                sums[column.bitLength() - 1] = sum;
            }
        }
        if (kernel.signum() == 0) {
            return new Attempt.Unanswered(usage);
        }
        Word period = new Word(width, kernel);
        Pair pair = new Pair(new Word(width, BigInteger.ZERO), period, constant, oracle.confirm(period));
        return new Attempt.Answered(new Answer.Period(period), new Certificate.Collision(pair), usage);
    }
}
