package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.study.Cell;
import org.notchwork.trial.TrialRecord;

/** Gathers the paired records of two cells: exact sums, squares and products of their query counts. */
final class PairTally {

    private final Cell of;
    private final Cell to;
    private long pairs;
    private long censored;
    private BigInteger sumX = BigInteger.ZERO;
    private BigInteger sumY = BigInteger.ZERO;
    private BigInteger sumXx = BigInteger.ZERO;
    private BigInteger sumYy = BigInteger.ZERO;
    private BigInteger sumXy = BigInteger.ZERO;

    PairTally(Cell of, Cell to) {
        this.of = of;
        this.to = to;
    }

    void add(TrialRecord numerator, TrialRecord denominator) {
        BigInteger x = BigInteger.valueOf(numerator.counts().queries());
        BigInteger y = BigInteger.valueOf(denominator.counts().queries());
        pairs++;
        if (CellTally.isCut(numerator) || CellTally.isCut(denominator)) {
            censored++;
        }
        sumX = sumX.add(x);
        sumY = sumY.add(y);
        sumXx = sumXx.add(x.multiply(x));
        sumYy = sumYy.add(y.multiply(y));
        sumXy = sumXy.add(x.multiply(y));
    }

    RatioFigures figures() {
        BigDecimal ratio = sumY.signum() == 0 ? BigDecimal.ZERO : Decimals.quotient(sumX, sumY);
        return new RatioFigures(of, to, pairs, censored, ratio, interval());
    }

    private Optional<Interval> interval() {
        if (pairs < 2 || sumY.signum() == 0) {
            return Optional.empty();
        }
        BigInteger n = BigInteger.valueOf(pairs);
        return FiellerInterval.of(
                Decimals.quotient(sumX, n),
                Decimals.quotient(sumY, n),
                covariance(sumX, sumX, sumXx),
                covariance(sumX, sumY, sumXy),
                covariance(sumY, sumY, sumYy),
                pairs);
    }

    /** Returns the sample covariance, divisor N − 1. */
    private BigDecimal covariance(BigInteger sumA, BigInteger sumB, BigInteger sumAb) {
        BigInteger n = BigInteger.valueOf(pairs);
        BigInteger top = n.multiply(sumAb).subtract(sumA.multiply(sumB));
        return Decimals.quotient(top, n.multiply(n.subtract(BigInteger.ONE)));
    }
}
