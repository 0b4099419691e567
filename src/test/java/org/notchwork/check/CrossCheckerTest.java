package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.catalogue.Engines;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.problem.CallKind;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.support.Studies;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

class CrossCheckerTest {

    private static final int TRIALS = 60;

    private static Experiment experiment(long queryLimit) {
        return Studies.experiment(List.of(3, 6), Studies.allChoices(), TRIALS, queryLimit);
    }

    private static List<CrossCheck> checks(Experiment experiment, List<TrialGroup> groups) {
        Study study = Studies.study(experiment);
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        Map<String, InstanceTally> examined = new LinkedHashMap<>();
        InstanceExaminer examiner = new InstanceExaminer(Engines.all());
        for (TrialGroup group : groups) {
            figures.add(group);
            lines.add(group);
            examined.merge(
                    CrossChecker.subject("main", group.width()),
                    examiner.examine(
                            experiment, Studies.runner().instance(experiment, group.width(), group.trial()), group),
                    InstanceTally::plus);
        }
        Summary summary = figures.summary();
        List<CrossCheck> all = new CrossChecker(study).all(examined, lines, summary);
        List<CrossCheck> fromLines = new CrossChecker(study).fromLines(lines, summary);
        assertEquals(all.stream().filter(c -> !c.kind().needsInstances()).toList(), fromLines);
        return all;
    }

    private static long count(List<CrossCheck> checks, CheckKind kind, CheckOutcome outcome) {
        return checks.stream()
                .filter(c -> c.kind() == kind && c.outcome() == outcome)
                .count();
    }

    @Test
    void anHonestStudyAgreesInEveryCheck() {
        Experiment experiment = experiment(1000);
        List<CrossCheck> checks = checks(experiment, Studies.run(experiment));
        for (CrossCheck check : checks) {
            assertEquals(CheckOutcome.AGREES, check.outcome(), check::toString);
        }
        assertEquals(2, count(checks, CheckKind.PROMISE, CheckOutcome.AGREES));
        assertEquals(2, count(checks, CheckKind.EXHAUSTIVE_ANSWER, CheckOutcome.AGREES));
        assertEquals(4, count(checks, CheckKind.ALL_SECRETS, CheckOutcome.AGREES));
        assertEquals(2, count(checks, CheckKind.ENGINES, CheckOutcome.AGREES));
        assertEquals(4, count(checks, CheckKind.CLOSED_FORM, CheckOutcome.AGREES));
        assertEquals(12, count(checks, CheckKind.THEORY_MEAN, CheckOutcome.AGREES));
        assertEquals(26, checks.size());
    }

    /** Every record with some queries more than were made. */
    private static List<TrialGroup> miscounted(List<TrialGroup> groups, int extra) {
        List<TrialGroup> miscounted = new ArrayList<>();
        for (TrialGroup group : groups) {
            List<TrialRecord> records = new ArrayList<>();
            for (TrialRecord r : group.records()) {
                var counts = r.counts();
                for (int i = 0; i < extra; i++) {
                    counts = counts.plus(CallKind.CLASSICAL);
                }
                records.add(new TrialRecord(
                        r.cell(), r.trial(), r.hidden(), r.outcome(), r.answer(), r.certificate(), counts, r.usage()));
            }
            miscounted.add(new TrialGroup(group.experiment(), group.width(), group.trial(), records));
        }
        return miscounted;
    }

    @Test
    void oneQueryTooManyDiffersFromTheClosedFormInEveryTrial() {
        Experiment experiment = experiment(1000);
        List<CrossCheck> checks = checks(experiment, miscounted(Studies.run(experiment), 1));
        assertEquals(4, count(checks, CheckKind.CLOSED_FORM, CheckOutcome.DIFFERS));
        for (CrossCheck check : checks) {
            if (check.kind() == CheckKind.CLOSED_FORM) {
                assertTrue(check.observed().startsWith("60 of 60 differ; first: trial 0: "), check.observed());
            }
        }
    }

    @Test
    void manyQueriesTooManyDifferFromTheExpectedMean() {
        Experiment experiment = experiment(1000);
        List<CrossCheck> checks = checks(experiment, miscounted(Studies.run(experiment), 30));
        assertEquals(12, count(checks, CheckKind.THEORY_MEAN, CheckOutcome.DIFFERS));
        assertEquals(2, count(checks, CheckKind.PROMISE, CheckOutcome.AGREES));
    }

    @Test
    void censoredTrialsHaveNoComparableMean() {
        Experiment experiment = experiment(4);
        List<CrossCheck> checks = checks(experiment, Studies.run(experiment));
        assertEquals(
                6,
                checks.stream()
                        .filter(c -> c.subject().startsWith("main/6/") && c.outcome() == CheckOutcome.NOT_COMPARABLE)
                        .filter(c -> c.kind() == CheckKind.THEORY_MEAN)
                        .count());
        assertEquals(
                0,
                checks.stream().filter(c -> c.outcome() == CheckOutcome.DIFFERS).count());
    }

    @Test
    void nothingExaminedIsNotComparable() {
        Experiment experiment = experiment(1000);
        Study study = Studies.study(experiment);
        SummaryBuilder figures = new SummaryBuilder(study);
        Studies.run(experiment).forEach(figures::add);
        List<CrossCheck> checks = new CrossChecker(study).all(Map.of(), new LineChecks(study), figures.summary());
        assertEquals(2, count(checks, CheckKind.PROMISE, CheckOutcome.NOT_COMPARABLE));
        assertEquals(2, count(checks, CheckKind.ENGINES, CheckOutcome.NOT_COMPARABLE));
        assertEquals(4, count(checks, CheckKind.CLOSED_FORM, CheckOutcome.NOT_COMPARABLE));
    }

    @Test
    void widthsUpToTheCrossCheckWidthAreExhaustive() {
        Study study = Studies.study(experiment(10));
        assertTrue(CrossChecker.isExhaustive(study, 8));
        assertFalse(CrossChecker.isExhaustive(study, 9));
    }

    @Test
    void comparisonsAddUpAndKeepTheFirstDifference() {
        Comparison sum = Comparison.agreed()
                .plus(Comparison.differed("a"))
                .plus(Comparison.agreed())
                .plus(Comparison.differed("b"));
        assertEquals(new Comparison(4, 2, Optional.of("a")), sum);
        assertEquals("2 of 4 differ; first: a", sum.text());
        assertEquals(CheckOutcome.DIFFERS, sum.outcome());
        assertEquals(CheckOutcome.AGREES, Comparison.agreed().outcome());
        assertEquals(CheckOutcome.NOT_COMPARABLE, Comparison.NONE.outcome());
        assertThrows(IllegalArgumentException.class, () -> new Comparison(1, 2, Optional.of("a")));
        assertThrows(IllegalArgumentException.class, () -> new Comparison(1, 1, Optional.empty()));
        assertThrows(IllegalArgumentException.class, () -> new Comparison(1, 0, Optional.of("a")));
    }
}
