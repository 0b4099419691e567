package org.notchwork.law;

/**
 * A fixed number of Fourier rounds for a hidden subspace: right exactly if the words span its annihilator, with
 * probability ∏_{i&lt;r} (1 − 2^(i−m)), r = n − k.
 *
 * @param fromRank whether the rounds are counted from the rank r on
 * @param rounds m, or m − r
 * @param dimension k, the dimension of the hidden subspace, at least 1; 1 for a period
 */
public record FixedRoundsSuccess(boolean fromRank, long rounds, int dimension) implements SuccessLaw {

    private static final FourierRoundsLaw ROUNDS = new FourierRoundsLaw();

    public FixedRoundsSuccess {
        if (dimension < 1 || rounds < 0) {
            throw new IllegalArgumentException("dimension " + dimension + " or rounds " + rounds + " out of range");
        }
    }

    /** Returns the law of m rounds at every width. */
    public static FixedRoundsSuccess absolute(long rounds, int dimension) {
        return new FixedRoundsSuccess(false, rounds, dimension);
    }

    /** Returns the law of n − k rounds and some extra. */
    public static FixedRoundsSuccess extra(long extra, int dimension) {
        return new FixedRoundsSuccess(true, extra, dimension);
    }

    /** @param width n, at least the dimension */
    @Override
    public Prediction success(int width) {
        int rank = width - dimension;
        if (rank < 0) {
            throw new IllegalArgumentException("width " + width + " is below the dimension " + dimension);
        }
        return ROUNDS.within(rank + 1, fromRank ? rank + rounds : rounds).orElseThrow();
    }

    @Override
    public String formula() {
        String count = fromRank ? "r + " + rounds : Long.toString(rounds);
        return "prod_{i<r} (1 - 2^(i - m)), r = n - " + dimension + ", m = " + count;
    }

    @Override
    public String source() {
        return "Simon, SIAM J. Comput. 26 (1997) for the words; number of spanning sequences derived";
    }
}
