package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.notchwork.exact.Decimals;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;

/** How often a guess names what is hidden. */
final class GuessRate {

    private GuessRate() {}

    /** Returns 1/(2^n − 1) for a period, 2^−n for a word, and one over the number of subspaces. */
    static BigDecimal of(Promise promise, int width) {
        if (promise.question() == Question.MASK) {
            return Decimals.quotient(BigInteger.ONE, BigInteger.ONE.shiftLeft(width));
        }
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        for (int i = 0; i < promise.dimension(); i++) {
            top = top.multiply(BigInteger.ONE.shiftLeft(width - i).subtract(BigInteger.ONE));
            bottom = bottom.multiply(BigInteger.ONE.shiftLeft(i + 1).subtract(BigInteger.ONE));
        }
        return Decimals.quotient(bottom, top);
    }
}
