package org.notchwork.report;

import java.math.BigDecimal;
import org.notchwork.exact.Decimals;

/** How a report writes numbers. */
final class Numbers {

    private static final int PLACES = 3;

    /** Numbers with more digits before the point are set with fewer after it, so that a column holds them. */
    private static final int THREE_DIGITS = 3;

    private static final int FIVE_DIGITS = 5;

    private Numbers() {}

    /** Returns a decimal with three places, one place from a thousand on, none from a hundred thousand on. */
    static String decimal(BigDecimal value) {
        int whole = value.precision() - value.scale();
        return Decimals.text(value, whole > FIVE_DIGITS ? 0 : whole > THREE_DIGITS ? 1 : PLACES);
    }

    /** Returns a count with its noun, for example {@code 1 claim} or {@code 3 claims}. */
    static String count(long count, String noun) {
        return count + " " + noun + (count == 1 ? "" : "s");
    }
}
