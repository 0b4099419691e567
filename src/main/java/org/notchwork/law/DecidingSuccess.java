package org.notchwork.law;

import java.math.BigDecimal;

/**
 * A fixed number of rounds, where f has a period or is injective with probability 1/2 each, and an answer only for rank n
 * ("none") or n − 1 (the period that is left): right with a period if the words have rank n − 1, without one if they have
 * rank n.
 *
 * @param fromRank whether the rounds are counted from n − 1 on
 * @param rounds m, or m − (n − 1)
 */
public record DecidingSuccess(boolean fromRank, long rounds) implements SuccessLaw {

    private static final FourierRoundsLaw ROUNDS = new FourierRoundsLaw();

    @Override
    public Prediction success(int width) {
        BigDecimal both = withPeriod(width).value().add(withoutPeriod(width).value());
        return Prediction.decimal(both.divide(BigDecimal.valueOf(2)));
    }

    /** Returns the probability of a right answer where there is a period: one minus its error rate. */
    public Prediction withPeriod(int width) {
        return ROUNDS.within(width, count(width)).orElseThrow();
    }

    /** Returns the probability of a right answer where there is none. */
    public Prediction withoutPeriod(int width) {
        return ROUNDS.within(width + 1, count(width)).orElseThrow();
    }

    private long count(int width) {
        return fromRank ? width - 1 + rounds : rounds;
    }

    @Override
    public String formula() {
        return "[prod_{i<n-1} (1 - 2^(i-m)) + prod_{i<n} (1 - 2^(i-m))] / 2, m = " + (fromRank ? "n - 1 + " : "")
                + rounds;
    }

    @Override
    public String source() {
        return "Simon, SIAM J. Comput. 26 (1997) for the words; number of spanning sequences derived";
    }
}
