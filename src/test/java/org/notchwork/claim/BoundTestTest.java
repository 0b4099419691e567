package org.notchwork.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.Interval;
import org.notchwork.study.Bound;

class BoundTestTest {

    private static final BigDecimal TWO = BigDecimal.valueOf(2);
    private static final BigDecimal FOUR = BigDecimal.valueOf(4);

    private static ClaimVerdict verdict(Bound bound, String low, String high, Trust trust) {
        return BoundTest.of(bound, new Interval(new BigDecimal(low), new BigDecimal(high)), trust)
                .verdict();
    }

    /** An interval, then the verdicts with both ends, the lower end and neither end trusted. */
    @ParameterizedTest
    @CsvSource({
        "1, 3.9, SUPPORTED, UNDECIDED",
        "1, 4, SUPPORTED, UNDECIDED",
        "1, 4.000001, UNDECIDED, UNDECIDED",
        "4, 4, SUPPORTED, UNDECIDED",
        "4, 5, UNDECIDED, UNDECIDED",
        "4.000001, 5, REFUTED, REFUTED"
    })
    void atMostFour(String low, String high, ClaimVerdict both, ClaimVerdict lower) {
        Bound bound = new Bound.AtMost(FOUR);
        assertEquals(both, verdict(bound, low, high, Trust.BOTH_ENDS));
        assertEquals(lower, verdict(bound, low, high, Trust.LOWER_END));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(bound, low, high, Trust.NEITHER_END));
    }

    @ParameterizedTest
    @CsvSource({
        "2.000001, 3, SUPPORTED, SUPPORTED",
        "2, 3, SUPPORTED, SUPPORTED",
        "1.999999, 3, UNDECIDED, UNDECIDED",
        "1, 2, UNDECIDED, UNDECIDED",
        "1, 1.999999, REFUTED, UNDECIDED"
    })
    void atLeastTwo(String low, String high, ClaimVerdict both, ClaimVerdict lower) {
        Bound bound = new Bound.AtLeast(TWO);
        assertEquals(both, verdict(bound, low, high, Trust.BOTH_ENDS));
        assertEquals(lower, verdict(bound, low, high, Trust.LOWER_END));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(bound, low, high, Trust.NEITHER_END));
    }

    @ParameterizedTest
    @CsvSource({
        "2, 4, SUPPORTED, UNDECIDED",
        "3, 3, SUPPORTED, UNDECIDED",
        "1.999999, 4, UNDECIDED, UNDECIDED",
        "2, 4.000001, UNDECIDED, UNDECIDED",
        "1, 5, UNDECIDED, UNDECIDED",
        "1, 2, UNDECIDED, UNDECIDED",
        "4, 5, UNDECIDED, UNDECIDED",
        "1, 1.999999, REFUTED, UNDECIDED",
        "4.000001, 5, REFUTED, REFUTED"
    })
    void betweenTwoAndFour(String low, String high, ClaimVerdict both, ClaimVerdict lower) {
        Bound bound = new Bound.Between(TWO, FOUR);
        assertEquals(both, verdict(bound, low, high, Trust.BOTH_ENDS));
        assertEquals(lower, verdict(bound, low, high, Trust.LOWER_END));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(bound, low, high, Trust.NEITHER_END));
    }

    @Test
    void theReasonNamesTheIntervalAndTheSide() {
        Interval interval = new Interval(new BigDecimal("2.5"), new BigDecimal("3"));
        assertEquals(
                "the 95 % interval 2.500000 to 3.000000 lies wholly at or below 4",
                BoundTest.of(new Bound.AtMost(FOUR), interval, Trust.BOTH_ENDS).reason());
        assertEquals(
                "the 95 % interval 2.500000 to 3.000000 lies wholly above 2; trials were censored, so not every end"
                        + " of it is a bound",
                BoundTest.of(new Bound.AtMost(TWO), interval, Trust.LOWER_END).reason());
        assertEquals(
                "the 95 % interval 2.500000 to 3.000000 does not decide it",
                BoundTest.of(new Bound.AtLeast(new BigDecimal("2.7")), interval, Trust.BOTH_ENDS)
                        .reason());
    }
}
