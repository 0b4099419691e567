package org.notchwork.law;

/**
 * So many rounds at every width, or so many above the rank that is wanted.
 *
 * @param fromRank whether the rounds are counted from n − 1 on
 * @param rounds m, or m − (n − 1)
 */
public record FixedRoundsLaw(boolean fromRank, long rounds) implements ConstantCountLaw {

    @Override
    public long count(int width) {
        return fromRank ? width - 1 + rounds : rounds;
    }

    @Override
    public String formula() {
        return fromRank ? "n - 1 + " + rounds : Long.toString(rounds);
    }

    @Override
    public String source() {
        return "by definition";
    }
}
