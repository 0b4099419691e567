package org.notchwork.claim;

import java.math.BigDecimal;
import java.util.Optional;
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
            return decide(
                    interval, trust, belowOrAt(interval, atMost.high(), trust), above(interval, atMost.high(), trust));
        }
        if (bound instanceof Bound.AtLeast atLeast) {
            return decide(
                    interval, trust, aboveOrAt(interval, atLeast.low(), trust), below(interval, atLeast.low(), trust));
        }
        Bound.Between between = (Bound.Between) bound;
        Optional<String> inside = belowOrAt(interval, between.high(), trust)
                .flatMap(high -> aboveOrAt(interval, between.low(), trust).map(low -> low + " and " + high));
        Optional<String> outside =
                above(interval, between.high(), trust).or(() -> below(interval, between.low(), trust));
        return decide(interval, trust, inside, outside);
    }

    private static Optional<String> belowOrAt(Interval interval, BigDecimal bound, Trust trust) {
        return when(trust == Trust.BOTH_ENDS && interval.high().compareTo(bound) <= 0, "at or below", bound);
    }

    private static Optional<String> below(Interval interval, BigDecimal bound, Trust trust) {
        return when(trust == Trust.BOTH_ENDS && interval.high().compareTo(bound) < 0, "below", bound);
    }

    private static Optional<String> aboveOrAt(Interval interval, BigDecimal bound, Trust trust) {
        return when(trust != Trust.NEITHER_END && interval.low().compareTo(bound) >= 0, "at or above", bound);
    }

    private static Optional<String> above(Interval interval, BigDecimal bound, Trust trust) {
        return when(trust != Trust.NEITHER_END && interval.low().compareTo(bound) > 0, "above", bound);
    }

    private static Optional<String> when(boolean holds, String side, BigDecimal bound) {
        return holds ? Optional.of(side + " " + bound.toPlainString()) : Optional.empty();
    }

    private static BoundTest decide(Interval interval, Trust trust, Optional<String> inside, Optional<String> outside) {
        String where = "the 95 % interval " + Decimals.text(interval.low()) + " to " + Decimals.text(interval.high());
        String cut = trust == Trust.BOTH_ENDS ? "" : "; trials were censored, so not every end of it is a bound";
        if (inside.isPresent()) {
            return new BoundTest(ClaimVerdict.SUPPORTED, where + " lies wholly " + inside.get() + cut);
        }
        if (outside.isPresent()) {
            return new BoundTest(ClaimVerdict.REFUTED, where + " lies wholly " + outside.get() + cut);
        }
        return new BoundTest(ClaimVerdict.UNDECIDED, where + " does not decide it" + cut);
    }
}
