package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Controlled;
import org.notchwork.Studies;
import org.notchwork.figure.Holm;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlOutcome;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Checks that give a probability: honest records pass, falsified ones do not, and all of a study are corrected together. */
class StatisticalChecksTest {

    private static final String TEXT = Controlled.TEXT.replace("\"trials\": 30", "\"trials\": 150");
    private static final String SAMPLING = "c/6/fourier-sampling@fibre";
    private static final Pattern P = Pattern.compile(", p = ([0-9.]+), corrected for ([0-9]+) tests ([0-9.]+)$");

    private static List<CrossCheck> checks(
            String text, UnaryOperator<TrialRecord> trials, UnaryOperator<ControlRecord> controls) {
        Study study = Studies.of(text);
        TrialRunner runner = new TrialRunner(study);
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        for (Experiment e : study.experiments()) {
            for (int width : e.widths()) {
                for (long trial = 0; trial < e.trials(); trial++) {
                    TrialGroup honest = runner.run(e, width, trial);
                    TrialGroup group = new TrialGroup(
                            e.id(),
                            width,
                            trial,
                            honest.records().stream().map(trials).toList());
                    figures.add(group);
                    lines.add(group);
                    honest.controls().stream().map(controls).forEach(figures::addControl);
                }
            }
        }
        return new CrossChecker(study).fromLines(lines, figures.summary());
    }

    private static List<CrossCheck> honest() {
        return checks(TEXT, UnaryOperator.identity(), UnaryOperator.identity());
    }

    private static CrossCheck check(List<CrossCheck> checks, CheckKind kind, String subject) {
        return checks.stream()
                .filter(c -> c.kind() == kind && c.subject().equals(subject))
                .findFirst()
                .orElseThrow();
    }

    private static UnaryOperator<TrialRecord> counting(String cell, UnaryOperator<Counts> change) {
        return r -> !r.cell().id().equals(cell)
                ? r
                : new TrialRecord(
                        r.cell(),
                        r.trial(),
                        r.hidden(),
                        r.outcome(),
                        r.answer(),
                        r.certificate(),
                        change.apply(r.counts()),
                        r.usage());
    }

    @Test
    void honestRecordsAgree() {
        List<CrossCheck> checks = honest();
        for (CheckKind kind : List.of(CheckKind.QUERY_DISTRIBUTION, CheckKind.CLASSICAL_BOUND, CheckKind.CONTROL)) {
            assertTrue(checks.stream().anyMatch(c -> c.kind() == kind && c.outcome() == CheckOutcome.AGREES));
        }
        assertTrue(checks.stream().noneMatch(c -> c.outcome() == CheckOutcome.DIFFERS), checks.toString());
        assertEquals(
                CheckOutcome.AGREES,
                check(checks, CheckKind.CLASSICAL_BOUND, "c/6/random-draws").outcome());
    }

    /** The engine is told, so its control cannot agree; it is flagged instead of judged. */
    @Test
    void theControlOfASightedCellIsFlagged() {
        CrossCheck check = check(honest(), CheckKind.CONTROL, "c/6/fourier-sampling@annihilator");
        assertEquals(CheckOutcome.NOT_COMPARABLE, check.outcome());
        assertEquals("150 of 150 controls name what is not there: FLAGGED, the engine is told", check.observed());
    }

    /** Without the long runs, three more in every trial, or always the mean: none is the distribution of the law. */
    @ParameterizedTest
    @ValueSource(strings = {"short", "more", "mean"})
    void falsifiedCountsDoNotFitTheDistribution(String how) {
        UnaryOperator<Counts> change = c -> switch (how) {
            case "short" -> new Counts(0, Math.min(6, c.quantum()), 0, 2);
            case "more" -> new Counts(0, c.quantum() + 3, 0, 2);
            default -> new Counts(0, 7, 0, 2);
        };
        List<CrossCheck> checks = checks(TEXT, counting(SAMPLING, change), UnaryOperator.identity());
        assertEquals(
                CheckOutcome.DIFFERS,
                check(checks, CheckKind.QUERY_DISTRIBUTION, SAMPLING).outcome());
        assertEquals(
                CheckOutcome.AGREES,
                check(checks, CheckKind.QUERY_DISTRIBUTION, "c/4/fourier-sampling@fibre")
                        .outcome());
    }

    /** Five independent words need five rounds. */
    @Test
    void aCountThatTheLawRulesOutIsNamed() {
        List<CrossCheck> checks = checks(
                TEXT,
                r -> r.trial() == 7
                        ? counting(SAMPLING, c -> new Counts(0, 4, 0, 2)).apply(r)
                        : r,
                UnaryOperator.identity());
        CrossCheck check = check(checks, CheckKind.QUERY_DISTRIBUTION, SAMPLING);
        assertEquals(CheckOutcome.DIFFERS, check.outcome());
        assertTrue(check.observed().startsWith("the law gives 4 queries no chance at all"), check.observed());
    }

    @ParameterizedTest
    @CsvSource({"c/6/random-draws, 5", "c/6/sequential-scan, 6", "c/9/difference-cover, 15"})
    void betterThanAnyClassicalStrategyDiffers(String cell, long queries) {
        List<CrossCheck> checks =
                checks(TEXT, counting(cell, c -> new Counts(queries, 0, 0, 0)), UnaryOperator.identity());
        CrossCheck check = check(checks, CheckKind.CLASSICAL_BOUND, cell);
        assertEquals(CheckOutcome.DIFFERS, check.outcome(), check.observed());
        assertTrue(check.observed().contains("150 of 150 within " + queries + " queries"), check.observed());
    }

    /** The bound is on classical queries. */
    @Test
    void quantumCellsAreNotHeldToTheBound() {
        assertTrue(honest().stream()
                .filter(c -> c.kind() == CheckKind.CLASSICAL_BOUND)
                .noneMatch(c -> c.subject().contains("fourier")));
    }

    private static UnaryOperator<ControlRecord> naming(String cell, long times) {
        return r -> !r.cell().id().equals(cell) || r.trial() >= times
                ? r
                : new ControlRecord(
                        r.cell(),
                        r.trial(),
                        r.secret(),
                        ControlOutcome.SECRET,
                        Optional.of(r.secret()),
                        Optional.of(new Certificate.Absent("made up")),
                        r.counts());
    }

    /** The chance is 1/63: 20 of 150 are far beyond it. */
    @Test
    void aBlindCellThatNamesSecretsDiffers() {
        CrossCheck check = check(
                checks(TEXT, UnaryOperator.identity(), naming("c/6/random-draws", 20)),
                CheckKind.CONTROL,
                "c/6/random-draws");
        assertEquals(CheckOutcome.DIFFERS, check.outcome(), check.observed());
    }

    private record Judged(CrossCheck check, BigDecimal p, int tests, BigDecimal corrected) {}

    private static List<Judged> judged(List<CrossCheck> checks) {
        List<Judged> judged = new ArrayList<>();
        for (CrossCheck check : checks) {
            Matcher matcher = P.matcher(check.observed());
            if (matcher.find()) {
                judged.add(new Judged(
                        check,
                        new BigDecimal(matcher.group(1)),
                        Integer.parseInt(matcher.group(2)),
                        new BigDecimal(matcher.group(3))));
            }
        }
        return judged;
    }

    /** Every test of the study counts, whatever its kind, experiment and width; the printed digits allow the rest. */
    @ParameterizedTest
    @ValueSource(longs = {0, 10, 40})
    void allTestsOfTheStudyAreCorrectedTogether(long named) {
        List<Judged> judged = judged(checks(TEXT, UnaryOperator.identity(), naming("c/6/random-draws", named)));
        assertTrue(judged.size() >= 15, judged.size() + " tests");
        List<BigDecimal> adjusted = Holm.adjust(judged.stream().map(Judged::p).toList());
        BigDecimal allowed = new BigDecimal("0.0000006").multiply(BigDecimal.valueOf(judged.size() + 1L));
        for (int i = 0; i < judged.size(); i++) {
            Judged one = judged.get(i);
            assertEquals(judged.size(), one.tests());
            assertTrue(
                    one.corrected().subtract(adjusted.get(i)).abs().compareTo(allowed) <= 0,
                    one + " is not " + adjusted.get(i));
            assertEquals(
                    one.corrected().compareTo(new BigDecimal("0.001")) < 0,
                    one.check().outcome() == CheckOutcome.DIFFERS,
                    one.toString());
        }
    }

    /** A probability below 0.001 among so many tests is no finding: it is corrected first. */
    @Test
    void oneSmallProbabilityAmongManyAgrees() {
        List<CrossCheck> best = List.of();
        for (long named = 1; named < 20; named++) {
            List<CrossCheck> checks =
                    checks(TEXT, UnaryOperator.identity(), naming("c/6/fourier-sampling@fibre", named));
            Judged one = judged(checks).stream()
                    .filter(j -> j.check().kind() == CheckKind.CONTROL
                            && j.check().subject().equals("c/6/fourier-sampling@fibre"))
                    .findFirst()
                    .orElseThrow();
            if (one.p().compareTo(new BigDecimal("0.001")) < 0
                    && one.corrected().compareTo(new BigDecimal("0.001")) >= 0) {
                best = checks;
                assertEquals(CheckOutcome.AGREES, one.check().outcome());
            }
        }
        assertTrue(!best.isEmpty(), "no number of names gives a probability between the two");
    }

    @Test
    void censoredCellsAreNotComparedWithTheDistribution() {
        List<CrossCheck> checks = checks(
                TEXT.replace("\"query-limit\": 1000", "\"query-limit\": 8"),
                UnaryOperator.identity(),
                UnaryOperator.identity());
        CrossCheck check = check(checks, CheckKind.QUERY_DISTRIBUTION, SAMPLING);
        assertEquals(CheckOutcome.NOT_COMPARABLE, check.outcome());
        assertTrue(check.observed().matches("not comparable: [0-9]+ trials censored"), check.observed());
    }

    @Test
    void aFewTrialsAreTooFewForADistribution() {
        List<CrossCheck> checks = checks(
                Controlled.TEXT.replace("\"trials\": 30", "\"trials\": 3"),
                UnaryOperator.identity(),
                UnaryOperator.identity());
        CrossCheck check = check(checks, CheckKind.QUERY_DISTRIBUTION, SAMPLING);
        assertEquals(CheckOutcome.NOT_COMPARABLE, check.outcome());
        assertEquals("not comparable: too few trials for two bins", check.observed());
    }

    /** What stands under the seals of the first format stays as it was. */
    @Test
    void aStudyOfTheFirstFormatHasNoneOfThem() {
        List<CrossCheck> checks = checks(Studies.SMALL, UnaryOperator.identity(), UnaryOperator.identity());
        assertTrue(
                checks.stream().allMatch(c -> c.kind() == CheckKind.CLOSED_FORM || c.kind() == CheckKind.THEORY_MEAN));
    }
}
