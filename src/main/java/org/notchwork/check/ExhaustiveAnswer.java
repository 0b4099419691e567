package org.notchwork.check;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Promise;

/**
 * Finds the answer to a problem's question by looking at the whole domain, or two inputs that break the promise. Written
 * apart from strategies and problems. Widths of at most 20 bits.
 */
public final class ExhaustiveAnswer {

    private final BitFunction function;
    private final int width;
    private final long[] values;

    private ExhaustiveAnswer(BitFunction function) {
        this.function = function;
        this.width = function.width();
        this.values = new long[1 << width];
        for (int x = 0; x < values.length; x++) {
            values[x] = function.at(x);
        }
    }

    /** What the search found. A closed set. */
    public sealed interface Found {

        /**
         * The promise holds, exactly or nearly.
         *
         * @param answers every right answer: one where the promise holds exactly; every exact period where it holds nearly
         * @param accidents how many pairs of different inputs have one value and do not differ by such a period
         */
        record Right(List<Answer> answers, long accidents) implements Found {

            /** Copies the list. */
            public Right {
                answers = List.copyOf(answers);
            }
        }

        /**
         * The promise is broken.
         *
         * @param why two inputs, and how they break it
         */
        record Broken(String why) implements Found {}
    }

    /** Searches the whole domain. */
    public static Found search(BitFunction function, Promise promise) {
        ExhaustiveAnswer search = new ExhaustiveAnswer(function);
        return switch (promise.question()) {
            case PERIOD -> promise.isExact() ? search.period() : search.periods();
            case PERIOD_OR_NONE -> promise.isExact() ? search.periodOrNone() : search.periods();
            case SUBSPACE -> search.subspace(promise.dimension());
            case MASK -> search.mask(promise.offset());
            case CONSTANT_OR_BALANCED -> search.balance();
        };
    }

    private static Found right(Answer answer) {
        return new Found.Right(List.of(answer), 0);
    }

    private Found period() {
        ExhaustiveSearch.Found found = ExhaustiveSearch.search(function);
        if (found instanceof ExhaustiveSearch.Found.Broken broken) {
            return new Found.Broken("inputs " + broken.x() + " and " + broken.y() + ": " + broken.why());
        }
        long s = ((ExhaustiveSearch.Found.Period) found).s();
        return right(new Answer.Period(Word.of(width, s)));
    }

    private Found periodOrNone() {
        long different = Arrays.stream(values).distinct().count();
        return different == values.length ? right(new Answer.NoPeriod()) : period();
    }

    private Found periods() {
        List<Answer> periods = new ArrayList<>();
        for (int t = 1; t < values.length; t++) {
            if (isPeriod(t)) {
                periods.add(new Answer.Period(Word.of(width, t)));
            }
        }
        long explained = (long) values.length * periods.size() / 2;
        long accidents = equalPairs() - explained;
        return new Found.Right(periods.isEmpty() ? List.of(new Answer.NoPeriod()) : periods, accidents);
    }

    private boolean isPeriod(int t) {
        for (int x = 0; x < values.length; x++) {
            if (values[x] != values[x ^ t]) {
                return false;
            }
        }
        return true;
    }

    private long equalPairs() {
        long[] sorted = values.clone();
        Arrays.sort(sorted);
        long pairs = 0;
        int run = 0;
        for (int i = 1; i < sorted.length; i++) {
            run = sorted[i] == sorted[i - 1] ? run + 1 : 0;
            pairs += run;
        }
        return pairs;
    }

    /** The inputs that share the value of each input must be that input plus one and the same set, closed under sums. */
    private Found subspace(int dimension) {
        List<Integer> members = new ArrayList<>();
        for (int d = 0; d < values.length; d++) {
            if (values[d] == values[0]) {
                members.add(d);
            }
        }
        if (members.size() != 1 << dimension) {
            return new Found.Broken("inputs 0 and " + members.get(members.size() - 1) + ": " + members.size()
                    + " inputs have the value of 0");
        }
        boolean[] isMember = new boolean[values.length];
        members.forEach(d -> isMember[d] = true);
        for (int x = 0; x < values.length; x++) {
            for (int d = 0; d < values.length; d++) {
                if ((values[x] == values[x ^ d]) != isMember[d]) {
                    return new Found.Broken("inputs " + x + " and " + (x ^ d) + ": "
                            + (isMember[d] ? "one coset, two values" : "one value, two cosets"));
                }
            }
        }
        return right(new Answer.Subspace(reduced(members)));
    }

    /** In each set of members with one leading bit exactly one has no other leading bit set: the least of them. */
    private List<Word> reduced(List<Integer> members) {
        List<Integer> leads = new ArrayList<>();
        for (int bit = width - 1; bit >= 0; bit--) {
            int lead = 1 << bit;
            if (members.stream().anyMatch(m -> Integer.highestOneBit(m) == lead)) {
                leads.add(lead);
            }
        }
        int mask = leads.stream().mapToInt(Integer::intValue).sum();
        List<Word> rows = new ArrayList<>();
        for (int lead : leads) {
            members.stream().filter(m -> (m & mask) == lead).forEach(m -> rows.add(Word.of(width, m)));
        }
        return rows;
    }

    private Found mask(boolean mayHaveConstant) {
        long constant = values[0];
        if (constant != 0 && !mayHaveConstant) {
            return new Found.Broken("input 0 has the value " + constant);
        }
        for (int a = 0; a < values.length; a++) {
            int x = 0;
            while (x < values.length && (values[x] ^ constant) == (Integer.bitCount(a & x) & 1)) {
                x++;
            }
            if (x == values.length) {
                return right(new Answer.Mask(Word.of(width, a)));
            }
        }
        return new Found.Broken("inputs 0 and 1 and others: no inner product has these values");
    }

    private Found balance() {
        long ones = Arrays.stream(values).filter(v -> v == 1).count();
        long zeros = Arrays.stream(values).filter(v -> v == 0).count();
        if (ones + zeros != values.length) {
            return new Found.Broken("a value has more than one bit");
        }
        if (ones == 0 || zeros == 0) {
            return right(new Answer.Balance(false));
        }
        return ones == zeros
                ? right(new Answer.Balance(true))
                : new Found.Broken(ones + " values are 1 and " + zeros + " are 0");
    }
}
