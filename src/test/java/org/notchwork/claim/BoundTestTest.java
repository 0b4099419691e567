package org.notchwork.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.Interval;
import org.notchwork.study.Bound;

/** Verdicts by the interval 4 to 6, at every place of a bound; derived from the definition. */
class BoundTestTest {

    private static final Interval INTERVAL = new Interval(BigDecimal.valueOf(4), BigDecimal.valueOf(6));

    @ParameterizedTest
    @CsvSource({
        "at-most, 7, BOTH_ENDS, SUPPORTED",
        "at-most, 6, BOTH_ENDS, SUPPORTED",
        "at-most, 5, BOTH_ENDS, UNDECIDED",
        "at-most, 4, BOTH_ENDS, UNDECIDED",
        "at-most, 3, BOTH_ENDS, REFUTED",
        "at-most, 7, LOWER_END, UNDECIDED",
        "at-most, 3, LOWER_END, REFUTED",
        "at-most, 7, NEITHER_END, UNDECIDED",
        "at-most, 3, NEITHER_END, UNDECIDED",
        "at-least, 3, BOTH_ENDS, SUPPORTED",
        "at-least, 4, BOTH_ENDS, SUPPORTED",
        "at-least, 5, BOTH_ENDS, UNDECIDED",
        "at-least, 6, BOTH_ENDS, UNDECIDED",
        "at-least, 7, BOTH_ENDS, REFUTED",
        "at-least, 3, LOWER_END, SUPPORTED",
        "at-least, 7, LOWER_END, UNDECIDED",
        "at-least, 3, NEITHER_END, UNDECIDED"
    })
    void aOneSidedClaimIsJudgedByTheEndsThatCanBeTrusted(
            String kind, BigDecimal at, Trust trust, ClaimVerdict verdict) {
        Bound bound = kind.equals("at-most") ? new Bound.AtMost(at) : new Bound.AtLeast(at);
        assertEquals(verdict, BoundTest.of(bound, INTERVAL, trust).verdict());
    }

    @ParameterizedTest
    @CsvSource({
        "4, 6, BOTH_ENDS, SUPPORTED",
        "3, 7, BOTH_ENDS, SUPPORTED",
        "5, 7, BOTH_ENDS, UNDECIDED",
        "3, 5, BOTH_ENDS, UNDECIDED",
        "1, 3, BOTH_ENDS, REFUTED",
        "7, 9, BOTH_ENDS, REFUTED",
        "3, 7, LOWER_END, UNDECIDED",
        "1, 3, LOWER_END, REFUTED",
        "7, 9, LOWER_END, UNDECIDED",
        "3, 7, NEITHER_END, UNDECIDED"
    })
    void aTwoSidedClaimIsSupportedByAnIntervalInsideOnly(
            BigDecimal low, BigDecimal high, Trust trust, ClaimVerdict verdict) {
        assertEquals(
                verdict,
                BoundTest.of(new Bound.Between(low, high), INTERVAL, trust).verdict());
    }
}
