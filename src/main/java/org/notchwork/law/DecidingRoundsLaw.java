package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * Rounds until n − 1 independent words are held, where f has a period or is injective with probability 1/2 each: the words
 * are uniform on a space of n − 1 or of n bits.
 */
public final class DecidingRoundsLaw implements QueryLaw {

    private static final FourierRoundsLaw WITH_PERIOD = new FourierRoundsLaw();
    private static final BigInteger TWO = BigInteger.TWO;

    @Override
    public Prediction mean(int width) {
        Fraction sum = Fraction.ZERO;
        for (int i = 1; i < width; i++) {
            sum = sum.plus(wait(i)).plus(wait(i + 1));
        }
        return sum.times(new Fraction(BigInteger.ONE, TWO)).prediction();
    }

    /** The wait for a word outside a space whose complement has i bits: 1/(1 − 2^−i). */
    private static Fraction wait(int i) {
        BigInteger all = BigInteger.ONE.shiftLeft(i);
        return new Fraction(all, all.subtract(BigInteger.ONE));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        return Optional.empty();
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.empty();
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public Optional<Prediction> within(int width, long queries) {
        BigDecimal both = WITH_PERIOD
                .within(width, queries)
                .orElseThrow()
                .value()
                .add(RankLaw.atLeastOneShort(queries, width).prediction().value());
        return Optional.of(Prediction.decimal(both.divide(BigDecimal.valueOf(2))));
    }

    @Override
    public String formula() {
        return "[sum_{i=1}^{n-1} 1/(1 - 2^-i) + sum_{i=2}^{n} 1/(1 - 2^-i)] / 2";
    }

    @Override
    public String source() {
        return "Simon, SIAM J. Comput. 26 (1997) for the words; the waits are geometric, derived";
    }
}
