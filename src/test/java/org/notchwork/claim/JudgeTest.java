package org.notchwork.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.seed.Seed;
import org.notchwork.study.Bound;
import org.notchwork.study.Cell;
import org.notchwork.study.Claim;
import org.notchwork.study.FigureKind;
import org.notchwork.study.Quantity;
import org.notchwork.study.Study;

/** Verdicts on made-up figures; what they should be follows from the rules by hand. */
class JudgeTest {

    private static final Cell FEW = new Cell("e", 4, "few");
    private static final Cell MANY = new Cell("e", 4, "many");
    private static final Quantity MEAN = new Quantity.OfCell(FEW, FigureKind.QUERIES_MEAN);
    private static final Quantity RATE = new Quantity.OfCell(FEW, FigureKind.SUCCESS_RATE);
    private static final Quantity RATIO = new Quantity.Ratio(FEW, MANY);
    private static final Quantity INVERSE = new Quantity.Ratio(MANY, FEW);

    @Test
    void theWrittenIntervalDecidesAndNotTheOneBeforeRounding() {
        Summary summary = summary(cell(0, interval("4.0000001", "6.0000004")), ratio(0, Optional.empty()));
        assertEquals(ClaimVerdict.SUPPORTED, verdict(summary, MEAN, atMost("6")));
        assertEquals(ClaimVerdict.SUPPORTED, verdict(summary, MEAN, new Bound.Between(of("4"), of("6"))));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, MEAN, atMost("5.9999999")));
    }

    @Test
    void thePointDoesNotDecide() {
        // The mean of 5 is below 5.5, its interval is not.
        Summary summary = summary(cell(0, interval("4", "6")), ratio(0, Optional.empty()));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, MEAN, atMost("5.5")));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, MEAN, atLeast("4.5")));
    }

    @Test
    void withoutAnIntervalNothingIsDecided() {
        Summary summary = summary(cell(0, Optional.empty()), ratio(0, Optional.empty()));
        for (Quantity quantity : List.of(MEAN, RATIO, INVERSE)) {
            ClaimResult result = result(summary, quantity, atMost("1000"));
            assertEquals(ClaimVerdict.UNDECIDED, result.verdict());
            assertEquals(Optional.empty(), result.interval());
            assertTrue(result.reason().startsWith("there is no interval"), result.reason());
        }
    }

    @Test
    void aCensoredMeanIsALowerBoundOnly() {
        Summary summary = summary(cell(1, interval("4", "6")), ratio(0, Optional.empty()));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, MEAN, atMost("1000")));
        assertEquals(ClaimVerdict.REFUTED, verdict(summary, MEAN, atMost("3")));
        assertEquals(ClaimVerdict.SUPPORTED, verdict(summary, MEAN, atLeast("4")));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, MEAN, atLeast("7")));
        assertTrue(result(summary, MEAN, atMost("1000")).reason().contains("censored"));
    }

    @Test
    void theSuccessRateKeepsItsIntervalWhenTrialsAreCensored() {
        Summary summary = summary(cell(1, interval("4", "6")), ratio(0, Optional.empty()));
        assertEquals(ClaimVerdict.SUPPORTED, verdict(summary, RATE, atLeast("0.5")));
        assertEquals(ClaimVerdict.REFUTED, verdict(summary, RATE, atMost("0.4")));
    }

    @Test
    void aRatioWithCensoredPairsDecidesNothing() {
        Summary summary = summary(cell(0, interval("4", "6")), ratio(1, interval("0.2", "0.4")));
        for (Bound bound : List.of(atMost("9"), atMost("0.1"), atLeast("0.1"), atLeast("9"))) {
            assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, RATIO, bound));
            assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, INVERSE, bound));
        }
    }

    @Test
    void aRatioTheOtherWayRoundIsTurnedOverBeforeRounding() {
        Summary summary = summary(cell(0, interval("4", "6")), ratio(0, interval("0.3", "0.7")));
        ClaimResult result = result(summary, INVERSE, atLeast("1.4"));
        assertEquals(Optional.of(new Interval(of("1.428571"), of("3.333333"))), result.interval());
        assertEquals(of("2.000000"), result.value());
        assertEquals(ClaimVerdict.SUPPORTED, result.verdict());
        assertEquals(of("0.500000"), result(summary, RATIO, atMost("1")).value());
    }

    @Test
    void anIntervalThatReachesZeroHasNoInverse() {
        Summary summary = summary(cell(0, interval("4", "6")), ratio(0, interval("-0.1", "0.7")));
        assertEquals(ClaimVerdict.UNDECIDED, verdict(summary, INVERSE, atLeast("1")));
        assertEquals(ClaimVerdict.SUPPORTED, verdict(summary, RATIO, atMost("1")));
    }

    @Test
    void aClaimAboutACellThatIsNotThereIsAFaultOfTheProgram() {
        Summary summary = new Summary(List.of(), List.of());
        assertThrows(IllegalArgumentException.class, () -> result(summary, MEAN, atMost("1")));
        assertThrows(IllegalArgumentException.class, () -> result(summary, RATIO, atMost("1")));
    }

    private static ClaimVerdict verdict(Summary summary, Quantity quantity, Bound bound) {
        return result(summary, quantity, bound).verdict();
    }

    private static ClaimResult result(Summary summary, Quantity quantity, Bound bound) {
        Claim claim = new Claim("c", "a claim", quantity, bound);
        Study study = new Study("t", "q", new Seed("a seed for verdicts"), List.of(), 0, List.of(claim));
        return Judge.judge(study, summary).get(0);
    }

    private static Summary summary(CellFigures cell, RatioFigures ratio) {
        return new Summary(List.of(cell), List.of(ratio));
    }

    private static CellFigures cell(long censored, Optional<Interval> interval) {
        QueryFigures queries = new QueryFigures(of("5"), Optional.of(of("1")), interval, 1, 4, 5, 6, 9);
        Interval success = new Interval(of("0.5"), of("0.9"));
        return new CellFigures(
                FEW,
                Optional.empty(),
                Optional.empty(),
                10,
                10 - censored,
                0,
                censored,
                queries,
                0,
                of("0.8"),
                success);
    }

    private static RatioFigures ratio(long censored, Optional<Interval> interval) {
        return new RatioFigures(FEW, MANY, 10, censored, of("0.5"), interval);
    }

    private static Optional<Interval> interval(String low, String high) {
        return Optional.of(new Interval(of(low), of(high)));
    }

    private static Bound atMost(String high) {
        return new Bound.AtMost(of(high));
    }

    private static Bound atLeast(String low) {
        return new Bound.AtLeast(of(low));
    }

    private static BigDecimal of(String text) {
        return new BigDecimal(text);
    }
}
