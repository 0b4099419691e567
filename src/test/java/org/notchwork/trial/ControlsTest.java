package org.notchwork.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Controlled;
import org.notchwork.Studies;
import org.notchwork.bundle.Layout;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.ControlFigures;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;

/** Controls: the strategies on functions that hide nothing. */
class ControlsTest {

    private final Study study = Studies.of(Controlled.TEXT);
    private final TrialRunner runner = new TrialRunner(study);
    private final Experiment experiment = study.experiments().get(0);

    private static List<String> labels(Study of, int width) {
        return of.controls(of.experiments().get(0), width).stream()
                .map(StrategyChoice::label)
                .toList();
    }

    @Test
    void narrowWidthsHaveControlsWhereTheStudyDoesNotSayOtherwise() {
        List<String> all =
                List.of("random-draws", "fourier-sampling@fibre", "fourier-sampling@annihilator", "difference-cover");
        assertEquals(all, labels(study, 4));
        assertEquals(all, labels(study, 6));
        assertEquals(List.of("difference-cover"), labels(study, 9));
    }

    @ParameterizedTest
    @CsvSource({"8, true", "9, false"})
    void theUsualControlsEndAtWidthEight(int width, boolean has) {
        Study narrow = Studies.of(Controlled.TEXT.replace("[4, 6, 9]", "[" + width + "]"));
        assertEquals(has, labels(narrow, width).contains("random-draws"));
    }

    /** At 17 bits no table of a random function fits: a control that was asked for is not there either. */
    @Test
    void whereNoTableFitsThereIsNoControl() {
        Study wide = Studies.of(Controlled.TEXT.replace("[4, 6, 9]", "[16, 17]").replace("1000", "100000"));
        assertEquals(List.of("difference-cover"), labels(wide, 16));
        assertEquals(List.of(), labels(wide, 17));
    }

    @Test
    void aQuestionWithTwoAnswersHasNoControl() {
        Experiment balance = study.experiments().get(1);
        assertEquals(List.of(), study.controls(balance, 4));
        assertFalse(study.hasControls(balance));
        assertEquals(List.of(), runner.run(balance, 4, 0).controls());
    }

    @Test
    void aStudyOfTheFirstFormatHasNoControlFile() {
        assertFalse(Layout.sealed(Studies.small()).stream().anyMatch(n -> n.startsWith("controls")));
        assertTrue(Studies.small().experiments().stream()
                .noneMatch(e -> Studies.small().hasControls(e)));
        TrialRunner first = new TrialRunner(Studies.small());
        assertEquals(
                List.of(), first.run(Studies.small().experiments().get(0), 3, 0).controls());
        assertEquals(
                List.of(
                        "claims.json",
                        "controls-c.jsonl",
                        "cross-checks.json",
                        "study.json",
                        "summary.json",
                        "trials-c.jsonl",
                        "trials-d.jsonl"),
                Layout.sealed(study));
    }

    @Test
    void aControlHidesNothing() {
        for (int width : List.of(4, 6, 9)) {
            for (long trial = 0; trial < 30; trial++) {
                Instance control = runner.control(experiment, width, trial);
                assertEquals(new Answer.NoPeriod(), control.hidden());
                assertTrue(periods(control.function()).isEmpty());
                assertFalse(periods(runner.instance(experiment, width, trial).function())
                        .isEmpty());
            }
        }
    }

    private static Set<Long> periods(BitFunction function) {
        Set<Long> periods = new HashSet<>();
        for (long t = 1; t < 1L << function.width(); t++) {
            long x = 0;
            while (x < 1L << function.width() && function.at(x) == function.at(x ^ t)) {
                x++;
            }
            if (x == 1L << function.width()) {
                periods.add(t);
            }
        }
        return periods;
    }

    @Test
    void controlsAreTheSameWheneverTheyAreRunAndChangeNoTrial() {
        Study without = Studies.of(Controlled.TEXT
                .replace("{ \"name\": \"random-draws\" }", "{ \"name\": \"random-draws\", \"control\": false }")
                .replace("\"control\": true", "\"control\": false"));
        TrialRunner bare = new TrialRunner(without);
        for (long trial = 0; trial < 10; trial++) {
            TrialGroup group = runner.run(experiment, 6, trial);
            assertEquals(group, runner.run(experiment, 6, trial));
            TrialGroup less = bare.run(without.experiments().get(0), 6, trial);
            assertEquals(group.records(), less.records());
            assertEquals(group.controls().subList(1, 3), less.controls());
        }
        assertNotEquals(
                runner.run(experiment, 6, 0).controls(),
                runner.run(experiment, 6, 1).controls());
    }

    /** What a control's outcome says is so: the secret, another pair with one value, or neither. */
    @Test
    void outcomesSayWhatWasNamed() {
        Map<ControlOutcome, Integer> seen = new HashMap<>();
        for (long trial = 0; trial < 30; trial++) {
            Instance faced = runner.control(experiment, 6, trial);
            Answer secret = runner.instance(experiment, 6, trial).hidden();
            for (ControlRecord record : runner.run(experiment, 6, trial).controls()) {
                assertEquals(secret, record.secret());
                assertEquals(trial, record.trial());
                boolean holds = record.answer().isPresent()
                        && CertificateCheck.check(
                                        faced.function(),
                                        record.answer().get(),
                                        record.certificate().orElseThrow())
                                .isEmpty();
                ControlOutcome right = record.answer().isEmpty()
                        ? ControlOutcome.NOTHING
                        : record.answer().get().equals(secret)
                                ? ControlOutcome.SECRET
                                : holds ? ControlOutcome.CLAIMED : ControlOutcome.FAILED;
                assertEquals(right, record.outcome());
                seen.merge(record.outcome(), 1, Integer::sum);
            }
        }
        assertTrue(seen.keySet()
                .containsAll(Set.of(ControlOutcome.SECRET, ControlOutcome.CLAIMED, ControlOutcome.FAILED)));
    }

    @Test
    void anOutcomeAboutAnAnswerNeedsOne() {
        assertThrows(
                IllegalArgumentException.class,
                () -> new ControlRecord(
                        new Cell("c", 4, "random-draws"),
                        0,
                        new Answer.NoPeriod(),
                        ControlOutcome.FAILED,
                        Optional.empty(),
                        Optional.empty(),
                        Counts.NONE));
    }

    private static Map<Cell, ControlFigures> figures(Study of) {
        SummaryBuilder builder = new SummaryBuilder(of);
        TrialRunner runner = new TrialRunner(of);
        for (Experiment e : of.experiments()) {
            for (int width : e.widths()) {
                for (long trial = 0; trial < e.trials(); trial++) {
                    TrialGroup group = runner.run(e, width, trial);
                    builder.add(group);
                    group.controls().forEach(builder::addControl);
                }
            }
        }
        Map<Cell, ControlFigures> figures = new HashMap<>();
        for (CellFigures cell : builder.summary().cells()) {
            cell.control().ifPresent(c -> figures.put(cell.cell(), c));
        }
        return figures;
    }

    @Test
    void theSightedCellIsFlaggedAndNoOtherIs() {
        Map<Cell, ControlFigures> figures = figures(study);
        assertEquals(9, figures.size());
        figures.forEach((cell, control) -> {
            assertEquals(cell.label().equals("fourier-sampling@annihilator"), control.isFlagged(), cell.id());
            assertEquals(30, control.trials());
            assertTrue(control.named() + control.claimed() + control.failed() <= 30);
        });
        assertEquals(
                30,
                figures.get(new Cell("c", 6, "fourier-sampling@annihilator")).named());
    }

    /**
     * Every kind of problem with a control. Where there may be no period, the confirming queries contradict what the sighted
     * engine was told, and the strategy says that there is none.
     */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            "kind": "xor-period", "instances": "permutation"         | cycle-walk, random-draws-repeating, sidon-set | fourier-sampling, zero-error-fourier
            "kind": "xor-period-or-none", "instances": "table"       | random-draws, collision-counting              | fourier-sampling
            "kind": "hidden-subspace", "dimension": 2                | collision-span                                | fourier-sampling
            "kind": "inner-product", "constant-bit": true            | unit-vectors                                  | inner-product-fourier
            "kind": "affine-period"                                  | affine-solve, random-draws                    | fourier-sampling
            "kind": "even-mansour"                                   | collision-counting, data-time-tradeoff        | fourier-sampling
            "kind": "feistel-three"                                  | collision-counting                            | fourier-sampling
            """)
    void noBlindCellIsFlaggedWhateverTheProblem(String problem, String classical, String quantum) {
        boolean exact = !problem.contains("even-mansour") && !problem.contains("feistel");
        StringBuilder strategies = new StringBuilder();
        for (String name : classical.strip().split(", ", -1)) {
            strategies.append("{ \"name\": \"").append(name).append("\" },");
        }
        for (String name : quantum.strip().split(", ", -1)) {
            strategies.append("{ \"name\": \"").append(name).append("\", \"engine\": \"weights\" },");
            if (exact) {
                strategies.append("{ \"name\": \"").append(name).append("\", \"engine\": \"annihilator\" },");
            }
        }
        String text = Controlled.TEXT.substring(0, Controlled.TEXT.indexOf("\"experiments\""))
                + "\"experiments\": [{ \"id\": \"k\", \"problem\": { " + problem.strip() + " }, \"widths\": [6], "
                + "\"strategies\": [" + strategies.substring(0, strategies.length() - 1) + "], "
                + "\"trials\": 60, \"query-limit\": 2000 }], \"claims\": [] }";
        Study of = Studies.of(text);
        Map<Cell, ControlFigures> figures = figures(of);
        assertEquals(of.experiments().get(0).strategies().size(), figures.size());
        boolean mayBeNone = problem.contains("or-none");
        figures.forEach((cell, control) -> assertEquals(
                cell.label().endsWith("@annihilator") && !mayBeNone, control.isFlagged(), cell.id() + " " + control));
    }
}
