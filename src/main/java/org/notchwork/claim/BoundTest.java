package org.notchwork.claim;

import java.math.BigDecimal;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.Interval;
import org.notchwork.study.Bound;

/**
 * Where an interval lies relative to a bound.
 *
 * @param verdict what follows for the claim
 * @param reason why, in one sentence
 */
record BoundTest(ClaimVerdict verdict, String reason) {

    /** Compares an interval with a bound, believing only the ends that can be trusted. */
    static BoundTest of(Bound bound, Interval interval, Trust trust) {
        if (bound instanceof Bound.AtMost atMost) {
            return of(
                    interval,
                    trust,
                    isBelow(interval, atMost.high(), trust),
                    isAbove(interval, atMost.high(), trust),
                    "at most " + atMost.high().toPlainString());
        }
        if (bound instanceof Bound.AtLeast atLeast) {
            boolean inside = trust != Trust.NEITHER_END && interval.low().compareTo(atLeast.low()) >= 0;
            boolean outside = trust == Trust.BOTH_ENDS && interval.high().compareTo(atLeast.low()) < 0;
            return of(
                    interval,
                    trust,
                    inside,
                    outside,
                    "at least " + atLeast.low().toPlainString());
        }
        Bound.Between between = (Bound.Between) bound;
        boolean inside =
                isBelow(interval, between.high(), trust) && interval.low().compareTo(between.low()) >= 0;
        boolean outside = isAbove(interval, between.high(), trust)
                || (trust == Trust.BOTH_ENDS && interval.high().compareTo(between.low()) < 0);
        return of(
                interval,
                trust,
                inside,
                outside,
                "between " + between.low().toPlainString() + " and "
                        + between.high().toPlainString());
    }

    private static boolean isBelow(Interval interval, BigDecimal bound, Trust trust) {
        return trust == Trust.BOTH_ENDS && interval.high().compareTo(bound) <= 0;
    }

    private static boolean isAbove(Interval interval, BigDecimal bound, Trust trust) {
        return trust != Trust.NEITHER_END && interval.low().compareTo(bound) > 0;
    }

    private static BoundTest of(Interval interval, Trust trust, boolean inside, boolean outside, String claimed) {
        String where = "the 95 % interval " + Decimals.text(interval.low()) + " to " + Decimals.text(interval.high());
        String cut = trust == Trust.BOTH_ENDS ? "" : "; trials were censored, so not every end of it is a bound";
        if (inside) {
            return new BoundTest(ClaimVerdict.SUPPORTED, where + " lies wholly " + claimed + cut);
        }
        if (outside) {
            return new BoundTest(ClaimVerdict.REFUTED, where + " lies wholly outside \"" + claimed + "\"" + cut);
        }
        return new BoundTest(ClaimVerdict.UNDECIDED, where + " does not decide \"" + claimed + "\"" + cut);
    }
}
