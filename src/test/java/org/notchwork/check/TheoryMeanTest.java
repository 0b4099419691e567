package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.law.SequentialScanLaw;
import org.notchwork.study.Cell;

class TheoryMeanTest {

    private static CrossCheck check(String mean, long trials, long censored) {
        QueryFigures queries =
                new QueryFigures(new BigDecimal(mean), Optional.empty(), Optional.empty(), 2, 2, 2, 2, 20);
        CellFigures figures = new CellFigures(
                new Cell("main", 5, "sequential-scan"),
                Optional.empty(),
                Optional.empty(),
                trials,
                trials - censored,
                0,
                censored,
                queries,
                0,
                BigDecimal.ONE,
                new Interval(BigDecimal.ZERO, BigDecimal.ONE));
        return TheoryMean.check(figures, new SequentialScanLaw());
    }

    /** At width 5 the mean is 12 and the variance 30, so 30 trials have a standard error of 1. */
    @ParameterizedTest
    @CsvSource({
        "12, 0.00, AGREES",
        "17, 5.00, AGREES",
        "7, -5.00, AGREES",
        "17.01, 5.01, DIFFERS",
        "6.99, -5.01, DIFFERS"
    })
    void aMeanAgreesWithinFiveStandardErrors(String mean, String errors, CheckOutcome outcome) {
        CrossCheck check = check(mean, 30, 0);
        assertEquals(outcome, check.outcome());
        assertEquals(Optional.of(errors), check.standardErrors());
        assertEquals("mean 12.000000 = 12", check.expected());
        assertEquals(30, check.compared());
    }

    @Test
    void aMeanWithCensoredTrialsIsNotComparable() {
        CrossCheck check = check("3", 30, 1);
        assertEquals(CheckOutcome.NOT_COMPARABLE, check.outcome());
        assertEquals(Optional.empty(), check.standardErrors());
    }
}
