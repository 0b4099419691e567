package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * S. Holm's correction for many tests at once (Scand. J. Statist. 6 (1979) 65–70): whatever hypotheses are true, the
 * chance that any true one has an adjusted p-value of at most α is at most α. The tests need not be independent.
 */
public final class Holm {

    private Holm() {}

    /**
     * Returns the adjusted p-values in the order given. The i-th smallest of m is multiplied by m − i + 1, raised to
     * the adjusted value before it and cut at 1; so equal p-values stay equal.
     *
     * @param p values from 0 to 1
     */
    public static List<BigDecimal> adjust(List<BigDecimal> p) {
        for (BigDecimal value : p) {
            if (value.signum() < 0 || value.compareTo(BigDecimal.ONE) > 0) {
                throw new IllegalArgumentException("p = " + value);
            }
        }
        List<Integer> rising = IntStream.range(0, p.size())
                .boxed()
                .sorted(Comparator.comparing(p::get))
                .toList();
        List<BigDecimal> adjusted = new ArrayList<>(p);
        BigDecimal before = BigDecimal.ZERO;
        for (int rank = 0; rank < rising.size(); rank++) {
            int place = rising.get(rank);
            BigDecimal multiple = p.get(place).multiply(BigDecimal.valueOf((long) rising.size() - rank));
            before = before.max(multiple.min(BigDecimal.ONE));
            adjusted.set(place, before);
        }
        return List.copyOf(adjusted);
    }
}
