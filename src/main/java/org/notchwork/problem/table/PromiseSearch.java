package org.notchwork.problem.table;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;

/** Checks a declared promise on the whole domain, and finds what the table hides or two inputs that break it. */
final class PromiseSearch {

    private static final int NOWHERE = -1;

    private final int[] values;
    private final int width;

    private PromiseSearch(int[] values, int width) {
        this.values = values;
        this.width = width;
    }

    /**
     * What the search found.
     *
     * @param hidden what the table hides; where the promise is broken, that it has no period
     * @param broken how the promise is broken, with two inputs
     */
    record Found(Answer hidden, Optional<String> broken) {}

    static Found search(int[] values, int width, Declared declared) {
        PromiseSearch search = new PromiseSearch(values, width);
        return switch (declared.kind()) {
            case XOR_PERIOD -> search.subspace(1, true);
            case HIDDEN_SUBSPACE -> search.subspace(declared.dimension(), false);
            case XOR_PERIOD_OR_NONE ->
                search.isInjective() ? new Found(new Answer.NoPeriod(), Optional.empty()) : search.subspace(1, true);
            case INNER_PRODUCT -> search.mask();
            case CONSTANT_OR_BALANCED -> search.balance();
        };
    }

    private boolean isInjective() {
        return Arrays.stream(values).distinct().count() == values.length;
    }

    /** The sums with 0 of all points that have its value must be the subspace, and every other point's as well. */
    private Found subspace(int dimension, boolean isPeriod) {
        EchelonBasis basis = new EchelonBasis(width);
        for (int x = 1; x < values.length; x++) {
            if (values[x] == values[0]) {
                basis.add(x);
            }
        }
        if (basis.rank() != dimension) {
            return basis.rank() < dimension
                    ? broken("the inputs with the value of x = 0 span dimension " + basis.rank() + ", not " + dimension
                            + " (compare x = 0 and x = " + (values.length - 1) + ")")
                    : broken(tooMany(dimension));
        }
        long[] rows = rows(basis);
        int[] first = new int[values.length];
        Arrays.fill(first, NOWHERE);
        for (int x = 0; x < values.length; x++) {
            for (long shift : rows) {
                if (values[x] != values[(int) (x ^ shift)]) {
                    return broken("x = " + x + " and x = " + (x ^ shift) + " differ by a word of the subspace and have"
                            + " different values");
                }
            }
            int representative = (int) basis.reduce(x);
            int earlier = first[values[x]];
            if (earlier != NOWHERE && earlier != representative) {
                return broken("x = " + earlier + " and x = " + x + " have one value and are in different cosets");
            }
            first[values[x]] = representative;
        }
        return new Found(answer(basis, isPeriod), Optional.empty());
    }

    private String tooMany(int dimension) {
        EchelonBasis basis = new EchelonBasis(width);
        for (int x = 1; x < values.length; x++) {
            if (values[x] == values[0] && basis.add(x) && basis.rank() > dimension) {
                return "x = 0 and x = " + x + " have one value, which is too many for dimension " + dimension;
            }
        }
        throw new IllegalStateException("the rank fell");
    }

    private long[] rows(EchelonBasis basis) {
        List<Long> rows = new ArrayList<>();
        for (int lead = width - 1; lead >= 0; lead--) {
            if (basis.row(lead) != 0) {
                rows.add(basis.row(lead));
            }
        }
        return rows.stream().mapToLong(r -> r).toArray();
    }

    private Answer answer(EchelonBasis basis, boolean isPeriod) {
        List<Word> words = new ArrayList<>();
        for (long row : rows(basis)) {
            words.add(Word.of(width, row));
        }
        return isPeriod ? new Answer.Period(words.get(0)) : new Answer.Subspace(words);
    }

    private Found mask() {
        int a = 0;
        for (int i = 0; i < width; i++) {
            a |= (values[1 << i] ^ values[0]) << i;
        }
        for (int x = 0; x < values.length; x++) {
            int wanted = (Integer.bitCount(a & x) & 1) ^ values[0];
            if (values[x] > 1 || values[x] != wanted) {
                return broken("by x = 0 and the unit vectors the value at x = " + x + " should be " + wanted + ", not "
                        + values[x]);
            }
        }
        return new Found(new Answer.Mask(Word.of(width, a)), Optional.empty());
    }

    private Found balance() {
        int ones = 0;
        for (int x = 0; x < values.length; x++) {
            if (values[x] > 1) {
                return broken("the value at x = " + x + " is " + values[x] + ", not 0 or 1");
            }
            ones += values[x];
        }
        if (ones == 0 || ones == values.length) {
            return new Found(new Answer.Balance(false), Optional.empty());
        }
        if (2 * ones == values.length) {
            return new Found(new Answer.Balance(true), Optional.empty());
        }
        int other = 0;
        while (values[other] == values[0]) {
            other++;
        }
        return broken("x = 0 and x = " + other + " have different values, and " + ones + " of " + values.length
                + " values are 1");
    }

    private static Found broken(String why) {
        return new Found(new Answer.NoPeriod(), Optional.of(why));
    }
}
