package org.notchwork.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.study.Bound;
import org.notchwork.study.Cell;
import org.notchwork.study.Claim;
import org.notchwork.study.FigureKind;
import org.notchwork.study.Quantity;
import org.notchwork.study.Study;
import org.notchwork.support.Studies;

class JudgeTest {

    private static final Cell A = new Cell("main", 5, "sequential-scan");
    private static final Cell B = new Cell("main", 5, "random-draws");

    private static BigDecimal number(String text) {
        return new BigDecimal(text);
    }

    private static Interval interval(String low, String high) {
        return new Interval(number(low), number(high));
    }

    private static CellFigures cell(Cell cell, long censored, Optional<Interval> mean) {
        QueryFigures queries = new QueryFigures(number("12.5"), Optional.of(BigDecimal.ONE), mean, 1, 1, 1, 1, 1);
        return new CellFigures(
                cell,
                Optional.empty(),
                Optional.empty(),
                100,
                100 - censored,
                0,
                censored,
                queries,
                0,
                number("0.9"),
                interval("0.85", "0.95"));
    }

    private static ClaimResult judge(Quantity quantity, Bound bound, CellFigures figures, RatioFigures ratio) {
        Claim claim = new Claim("c", "It holds.", quantity, bound);
        Study plain =
                Studies.study(Studies.experiment(List.of(5), List.of(Studies.classical("sequential-scan")), 100, 100));
        Study study = new Study(plain.title(), plain.question(), plain.seed(), plain.experiments(), 8, List.of(claim));
        List<ClaimResult> results = Judge.judge(study, new Summary(List.of(figures), List.of(ratio)));
        assertEquals(1, results.size());
        assertEquals(claim, results.get(0).claim());
        return results.get(0);
    }

    private static RatioFigures ratio(long censored, Optional<Interval> interval) {
        return new RatioFigures(A, B, 100, censored, number("4"), interval);
    }

    private static ClaimResult ofMean(Bound bound, long censored, Optional<Interval> interval) {
        return judge(
                new Quantity.OfCell(A, FigureKind.QUERIES_MEAN),
                bound,
                cell(A, censored, interval),
                ratio(0, Optional.empty()));
    }

    private static ClaimResult ofRatio(Cell of, Cell to, Bound bound, long censored, Optional<Interval> interval) {
        return judge(new Quantity.Ratio(of, to), bound, cell(A, 0, Optional.empty()), ratio(censored, interval));
    }

    @ParameterizedTest
    @CsvSource({
        "13, 0, SUPPORTED",
        "12, 0, UNDECIDED",
        "11, 0, REFUTED",
        "13, 1, UNDECIDED",
        "12, 1, UNDECIDED",
        "11, 1, REFUTED"
    })
    void aMeanIsAtMost(String bound, long censored, ClaimVerdict verdict) {
        ClaimResult result = ofMean(new Bound.AtMost(number(bound)), censored, Optional.of(interval("11.5", "13")));
        assertEquals(verdict, result.verdict());
        assertEquals(number("12.500000"), result.value());
    }

    @ParameterizedTest
    @CsvSource({"11, 0, SUPPORTED", "11, 1, SUPPORTED", "14, 0, REFUTED", "14, 1, UNDECIDED"})
    void aMeanIsAtLeast(String bound, long censored, ClaimVerdict verdict) {
        assertEquals(
                verdict,
                ofMean(new Bound.AtLeast(number(bound)), censored, Optional.of(interval("11.5", "13")))
                        .verdict());
    }

    @ParameterizedTest
    @CsvSource({"0.85, SUPPORTED", "0.86, UNDECIDED", "0.96, REFUTED"})
    void aSuccessRateIsJudgedByItsIntervalCensoredTrialsOrNot(String bound, ClaimVerdict verdict) {
        for (long censored : new long[] {0, 10}) {
            ClaimResult result = judge(
                    new Quantity.OfCell(A, FigureKind.SUCCESS_RATE),
                    new Bound.AtLeast(number(bound)),
                    cell(A, censored, Optional.empty()),
                    ratio(0, Optional.empty()));
            assertEquals(verdict, result.verdict());
        }
    }

    @Test
    void theIntervalIsJudgedAsItIsWritten() {
        Optional<Interval> hairAbove = Optional.of(interval("11", "13.0000004"));
        ClaimResult result = ofMean(new Bound.AtMost(number("13")), 0, hairAbove);
        assertEquals(ClaimVerdict.SUPPORTED, result.verdict());
        assertEquals(Optional.of(interval("11.000000", "13.000000")), result.interval());
    }

    @Test
    void withoutAnIntervalNothingIsDecided() {
        assertEquals(
                ClaimVerdict.UNDECIDED,
                ofMean(new Bound.AtMost(number("1000")), 0, Optional.empty()).verdict());
        assertEquals(
                ClaimVerdict.UNDECIDED,
                ofRatio(A, B, new Bound.AtMost(number("1000")), 0, Optional.empty())
                        .verdict());
    }

    @ParameterizedTest
    @CsvSource({"2, SUPPORTED", "3, UNDECIDED", "6, REFUTED"})
    void aRatioIsAtLeast(String bound, ClaimVerdict verdict) {
        Optional<Interval> interval = Optional.of(interval("2", "5"));
        assertEquals(
                verdict,
                ofRatio(A, B, new Bound.AtLeast(number(bound)), 0, interval).verdict());
        assertEquals(
                ClaimVerdict.UNDECIDED,
                ofRatio(A, B, new Bound.AtLeast(number(bound)), 1, interval).verdict());
    }

    /** The interval 2 to 5 of A over B is 0.2 to 0.5 of B over A. */
    @ParameterizedTest
    @CsvSource({"0.5, SUPPORTED", "0.4, UNDECIDED", "0.1, REFUTED"})
    void theInverseOfARatioIsAtMost(String bound, ClaimVerdict verdict) {
        Optional<Interval> interval = Optional.of(interval("2", "5"));
        ClaimResult result = ofRatio(B, A, new Bound.AtMost(number(bound)), 0, interval);
        assertEquals(verdict, result.verdict());
        assertEquals(number("0.250000"), result.value());
        assertEquals(Optional.of(interval("0.200000", "0.500000")), result.interval());
        assertEquals(
                ClaimVerdict.UNDECIDED,
                ofRatio(B, A, new Bound.AtMost(number(bound)), 1, interval).verdict());
    }

    @Test
    void theInverseOfAnIntervalThatReachesZeroDecidesNothing() {
        Optional<Interval> interval = Optional.of(interval("-1", "5"));
        ClaimResult result = ofRatio(B, A, new Bound.AtLeast(number("0.01")), 0, interval);
        assertEquals(ClaimVerdict.UNDECIDED, result.verdict());
        assertEquals(Optional.empty(), result.interval());
    }

    @Test
    void aClaimAboutNoCellIsAFaultOfTheStudy() {
        Quantity unknown = new Quantity.OfCell(B, FigureKind.QUERIES_MEAN);
        CellFigures figures = cell(A, 0, Optional.empty());
        RatioFigures ratio = ratio(0, Optional.empty());
        assertThrows(
                IllegalArgumentException.class, () -> judge(unknown, new Bound.AtMost(BigDecimal.ONE), figures, ratio));
        Quantity same = new Quantity.Ratio(A, A);
        assertThrows(
                IllegalArgumentException.class, () -> judge(same, new Bound.AtMost(BigDecimal.ONE), figures, ratio));
    }
}
