package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Studies;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.study.Cell;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRunner;

/** Where there is nothing to compare, or only a part is compared, a check neither agrees nor differs silently. */
class NothingToCompareTest {

    @ParameterizedTest
    @CsvSource({
        // Law without a variance; the trials' deviation is absent for one trial and 0 for equal counts.
        "9, , NOT_COMPARABLE",
        "9, 0, NOT_COMPARABLE",
        "10, , AGREES",
        "10, 0, AGREES",
        // Four trials with deviation 2: the standard error is 1.
        "15, 2, AGREES",
        "15.01, 2, DIFFERS",
        "4.99, 2, DIFFERS"
    })
    void aMeanIsMeasuredByTheSampleWhereTheLawHasNoVariance(
            BigDecimal mean, BigDecimal deviation, CheckOutcome outcome) {
        CrossCheck check = TheoryMean.check(figures(mean, Optional.ofNullable(deviation)), new MeanTen());
        assertEquals(outcome, check.outcome(), check.observed());
    }

    @Test
    void theObservationSaysWhyAMeanIsNotComparable() {
        assertEquals(
                "mean 9.000000, not comparable: neither the law nor the trials tell a spread",
                TheoryMean.check(figures(new BigDecimal(9), Optional.empty()), new MeanTen())
                        .observed());
    }

    @Test
    void aClosedFormOfCensoredTrialsOnlySaysSo() {
        Study study = Studies.of(Studies.SMALL.replace("\"query-limit\": 9", "\"query-limit\": 1"));
        TrialRunner runner = new TrialRunner(study);
        LineChecks lines = new LineChecks(study);
        lines.add(runner.run(study.experiments().get(1), 6, 0));
        CrossCheck check = lines.check(new Cell("cut", 6, "sequential-scan")).orElseThrow();
        assertEquals(CheckOutcome.NOT_COMPARABLE, check.outcome());
        assertEquals("0 of 0 differ; every trial was censored", check.observed());
    }

    @ParameterizedTest
    @CsvSource({"10, 17, false", "11, 16, false", "11, 17, true", "12, 17, true"})
    void theCheckOfTheEnginesSaysWhereItIsASample(int width, int trials, boolean sample) {
        Study study = Studies.of(Studies.SMALL
                .replace("\"widths\": [6]", "\"widths\": [" + width + "]")
                .replace("\"trials\": 12", "\"trials\": " + trials)
                .replace("\"cross-check-width\": 5", "\"cross-check-width\": 12")
                .replace("cut/6/", "cut/" + width + "/"));
        CrossCheck check = new CrossChecker(study)
                        .all(
                                Map.of(),
                                new LineChecks(study),
                                summaryOfOneTrialEach(study).summary())
                        .stream()
                        .filter(c ->
                                c.kind() == CheckKind.ENGINES && c.subject().equals("cut/" + width))
                        .findFirst()
                        .orElseThrow();
        assertEquals(sample, check.expected().endsWith("; on the first 16 instances"), check.expected());
        assertTrue(check.expected().startsWith("every engine gives 2^(1-n)"), check.expected());
    }

    private static SummaryBuilder summaryOfOneTrialEach(Study study) {
        TrialRunner runner = new TrialRunner(study);
        SummaryBuilder builder = new SummaryBuilder(study);
        study.experiments()
                .forEach(e -> e.widths().forEach(w -> {
                    TrialGroup group = runner.run(e, w, 0);
                    builder.add(group);
                }));
        return builder;
    }

    private static CellFigures figures(BigDecimal mean, Optional<BigDecimal> deviation) {
        return new CellFigures(
                new Cell("e", 4, "c"),
                Optional.empty(),
                Optional.empty(),
                4,
                4,
                0,
                0,
                new QueryFigures(mean, deviation, Optional.empty(), 1, 1, 1, 1, 1),
                0,
                BigDecimal.ONE,
                new Interval(BigDecimal.ZERO, BigDecimal.ONE));
    }

    /** A mean of ten and nothing else. */
    private static final class MeanTen implements QueryLaw {

        @Override
        public Prediction mean(int width) {
            return Prediction.decimal(BigDecimal.TEN);
        }

        @Override
        public Optional<BigDecimal> variance(int width) {
            return Optional.empty();
        }

        @Override
        public OptionalLong worst(int width) {
            return OptionalLong.empty();
        }

        @Override
        public OptionalLong queries(int width, long period) {
            return OptionalLong.empty();
        }

        @Override
        public String formula() {
            return "10";
        }

        @Override
        public String source() {
            return "made for a test";
        }
    }
}
