package org.notchwork.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.Interval;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.seed.Seed;
import org.notchwork.study.Bound;
import org.notchwork.study.Cell;
import org.notchwork.study.Claim;
import org.notchwork.study.Quantity;
import org.notchwork.study.Study;

/** A pair with a censored trial says nothing about a ratio in either direction, however clear its interval looks. */
class CensoredRatiosTest {

    private static final Cell FEW = new Cell("e", 4, "few");
    private static final Cell MANY = new Cell("e", 4, "many");

    @ParameterizedTest
    @CsvSource({"0.1, REFUTED, SUPPORTED", "0.3, UNDECIDED, UNDECIDED", "0.9, SUPPORTED, REFUTED"})
    void aRatioWithCensoredPairsDecidesNothing(BigDecimal bound, ClaimVerdict atMost, ClaimVerdict atLeast) {
        Quantity ratio = new Quantity.Ratio(FEW, MANY);
        assertEquals(atMost, judge(ratio, new Bound.AtMost(bound), 0).verdict());
        assertEquals(atLeast, judge(ratio, new Bound.AtLeast(bound), 0).verdict());
        for (Bound each : List.of(new Bound.AtMost(bound), new Bound.AtLeast(bound))) {
            for (Quantity quantity : List.of(ratio, new Quantity.Ratio(MANY, FEW))) {
                ClaimResult result = judge(quantity, each, 1);
                assertEquals(ClaimVerdict.UNDECIDED, result.verdict());
                assertTrue(result.reason().contains("censored"), result.reason());
            }
        }
    }

    private static ClaimResult judge(Quantity quantity, Bound bound, long censored) {
        Interval interval = new Interval(new BigDecimal("0.2"), new BigDecimal("0.4"));
        RatioFigures ratio = new RatioFigures(FEW, MANY, 10, censored, new BigDecimal("0.3"), Optional.of(interval));
        Claim claim = new Claim("c", "a claim", quantity, bound);
        Study study = new Study("t", "q", new Seed("a seed for verdicts"), List.of(), 0, List.of(claim));
        return Judge.judge(study, new Summary(List.of(), List.of(ratio))).get(0);
    }
}
