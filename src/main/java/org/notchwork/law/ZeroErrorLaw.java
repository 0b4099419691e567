package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * Calls of the oracle by amplitude amplification from 1/2 to 1, three calls a round, at most n − 1 rounds. A round
 * tests one candidate: P(rounds &gt; r) = 2^r (2^(n−r) − 1)/(2^n − 1) for r ≤ n − 2.
 */
public final class ZeroErrorLaw implements QueryLaw {

    private static final int CALLS = 3;

    @Override
    public Prediction mean(int width) {
        BigInteger size = BigInteger.ONE.shiftLeft(width);
        BigInteger rounds = size.multiply(BigInteger.valueOf(width - 1L))
                .subtract(size.shiftRight(1))
                .add(BigInteger.ONE);
        return Prediction.ratio(rounds.multiply(BigInteger.valueOf(CALLS)), size.subtract(BigInteger.ONE));
    }

    /** From E[R²] = Σ (2r + 1) P(R &gt; r). */
    @Override
    public Optional<BigDecimal> variance(int width) {
        Fraction first = Fraction.ZERO;
        Fraction second = Fraction.ZERO;
        for (int r = 0; r < width - 1; r++) {
            first = first.plus(more(width, r));
            second = second.plus(more(width, r).times(2L * r + 1));
        }
        return Optional.of(
                second.minus(first.times(first)).times((long) CALLS * CALLS).value());
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of(CALLS * (width - 1L));
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public Optional<Prediction> within(int width, long queries) {
        long rounds = queries / CALLS;
        if (rounds >= width - 1) {
            return Optional.of(Fraction.ONE.prediction());
        }
        return Optional.of(more(width, (int) rounds).complement().prediction());
    }

    private static Fraction more(int width, int r) {
        BigInteger size = BigInteger.ONE.shiftLeft(width);
        return new Fraction(size.subtract(BigInteger.ONE.shiftLeft(r)), size.subtract(BigInteger.ONE));
    }

    @Override
    public String formula() {
        return "3 ((n - 1) 2^n - 2^(n-1) + 1) / (2^n - 1)";
    }

    @Override
    public String source() {
        return "Brassard and Hoyer, Proc. 5th Israeli Symp. Theory of Computing and Systems (1997), for the"
                + " algorithm; calls derived";
    }
}
