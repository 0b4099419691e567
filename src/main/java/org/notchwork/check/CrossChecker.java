package org.notchwork.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Summary;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;

/** Makes the list of cross-checks of a study from what was gathered: by experiment, width and kind. */
public final class CrossChecker {

    private final Study study;

    /** Creates the checker of a study. */
    public CrossChecker(Study study) {
        this.study = study;
    }

    /** Returns whether the instances of a width are examined exhaustively. */
    public static boolean isExhaustive(Study study, int width) {
        return width <= study.crossCheckWidth();
    }

    /** Returns the checks that need nothing but the records of the trials. */
    public List<CrossCheck> fromLines(LineChecks lines, Summary summary) {
        List<CrossCheck> checks = new ArrayList<>();
        Map<Cell, CellFigures> figures = byCell(summary);
        StatisticalChecks statistical = new StatisticalChecks(study, lines, figures);
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                fromLines(experiment, width, lines, figures, statistical, checks);
            }
        }
        return checks;
    }

    /**
     * Returns all checks.
     *
     * @param examined what exhaustive examination found, by {@code EXPERIMENT/WIDTH}
     * @param lines what the records gave
     * @param summary the figures
     */
    public List<CrossCheck> all(Map<String, InstanceTally> examined, LineChecks lines, Summary summary) {
        List<CrossCheck> checks = new ArrayList<>();
        Map<Cell, CellFigures> figures = byCell(summary);
        StatisticalChecks statistical = new StatisticalChecks(study, lines, figures);
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                if (isExhaustive(study, width)) {
                    InstanceTally tally = examined.getOrDefault(subject(experiment.id(), width), InstanceTally.NONE);
                    exhaustive(experiment, width, tally, figures, checks);
                }
                fromLines(experiment, width, lines, figures, statistical, checks);
            }
        }
        return checks;
    }

    /**
     * What a check is about, known before it is made.
     *
     * @param kind what is checked
     * @param subject on what
     */
    public record Called(CheckKind kind, String subject) {}

    /** Returns which checks that need the instances the study calls for, in the order of {@link #all}. */
    public List<Called> onInstances() {
        List<Called> called = new ArrayList<>();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                if (isExhaustive(study, width)) {
                    onInstances(experiment, width, called);
                }
            }
        }
        return called;
    }

    private static void onInstances(Experiment experiment, int width, List<Called> called) {
        String subject = subject(experiment.id(), width);
        called.add(new Called(CheckKind.PROMISE, subject));
        called.add(new Called(CheckKind.EXHAUSTIVE_ANSWER, subject));
        if (!experiment.problem().promise().isExact()) {
            called.add(new Called(CheckKind.ACCIDENTS, subject));
            SamplingBounds.choices(experiment)
                    .forEach(choice -> called.add(new Called(
                            CheckKind.SAMPLING_BOUND, new Cell(experiment.id(), width, choice.label()).id())));
        }
        onAllSecrets(experiment, width)
                .forEach(choice -> called.add(
                        new Called(CheckKind.ALL_SECRETS, new Cell(experiment.id(), width, choice.label()).id())));
        if (hasEngines(experiment)) {
            called.add(new Called(CheckKind.ENGINES, subject));
        }
    }

    /** Returns how a check of a whole width is called: {@code EXPERIMENT/WIDTH}. */
    public static String subject(String experiment, int width) {
        return experiment + "/" + width;
    }

    private void exhaustive(
            Experiment experiment,
            int width,
            InstanceTally tally,
            Map<Cell, CellFigures> figures,
            List<CrossCheck> checks) {
        String subject = subject(experiment.id(), width);
        PromiseText text = new PromiseText(experiment.problem());
        checks.add(check(CheckKind.PROMISE, subject, tally.promise(), text.promise()));
        checks.add(check(CheckKind.EXHAUSTIVE_ANSWER, subject, tally.answers(), text.answers()));
        if (!experiment.problem().promise().isExact()) {
            checks.add(accidents(subject, tally));
            for (StrategyChoice choice : SamplingBounds.choices(experiment)) {
                checks.add(SamplingBounds.check(figures.get(new Cell(experiment.id(), width, choice.label())), tally));
            }
        }
        AllSecrets allSecrets = new AllSecrets(new SeedTree(study.seed()));
        for (StrategyChoice choice : onAllSecrets(experiment, width)) {
            String cell = new Cell(experiment.id(), width, choice.label()).id();
            checks.add(allSecrets.check(
                    experiment,
                    width,
                    cell,
                    choice,
                    choice.law(experiment.problem(), width).orElseThrow()));
        }
        if (hasEngines(experiment)) {
            checks.add(check(CheckKind.ENGINES, subject, tally.engines(), text.engines() + sample(experiment, width)));
        }
    }

    private static CrossCheck accidents(String subject, InstanceTally tally) {
        String ambiguous = tally.ambiguous().isEmpty()
                ? "; no instance has a second exact period"
                : "; a second exact period in trials "
                        + tally.ambiguous().stream().map(t -> Long.toString(t)).collect(Collectors.joining(", "));
        return new CrossCheck(
                CheckKind.ACCIDENTS,
                subject,
                tally.promise().compared(),
                "counted, not judged: pairs of inputs with one value that no exact period explains",
                tally.accidents() + " pairs" + ambiguous,
                Optional.empty(),
                tally.promise().compared() == 0 ? CheckOutcome.NOT_COMPARABLE : CheckOutcome.AGREES);
    }

    /** Returns the strategies that are run on everything that can be hidden. */
    private static List<StrategyChoice> onAllSecrets(Experiment experiment, int width) {
        return experiment.strategies().stream()
                .filter(c -> AllSecrets.applies(experiment, width, c))
                .toList();
    }

    private static boolean hasEngines(Experiment experiment) {
        return experiment.strategies().stream().anyMatch(s -> s.engine().isPresent());
    }

    private static String sample(Experiment experiment, int width) {
        return InstanceExaminer.samplesEngines(experiment, width)
                ? "; on the first " + InstanceExaminer.FIRST_INSTANCES + " instances"
                : "";
    }

    private static void fromLines(
            Experiment experiment,
            int width,
            LineChecks lines,
            Map<Cell, CellFigures> figures,
            StatisticalChecks statistical,
            List<CrossCheck> checks) {
        for (StrategyChoice choice : experiment.strategies()) {
            lines.check(new Cell(experiment.id(), width, choice.label())).ifPresent(checks::add);
        }
        for (StrategyChoice choice : experiment.strategies()) {
            CellFigures cell = figures.get(new Cell(experiment.id(), width, choice.label()));
            choice.law(experiment.problem(), width).ifPresent(law -> checks.add(TheoryMean.check(cell, law)));
        }
        for (StrategyChoice choice : experiment.strategies()) {
            checks.addAll(statistical.of(new Cell(experiment.id(), width, choice.label())));
        }
    }

    private static CrossCheck check(CheckKind kind, String subject, Comparison comparison, String expected) {
        return new CrossCheck(
                kind,
                subject,
                comparison.compared(),
                expected,
                comparison.text(),
                Optional.empty(),
                comparison.outcome());
    }

    private static Map<Cell, CellFigures> byCell(Summary summary) {
        Map<Cell, CellFigures> figures = new LinkedHashMap<>();
        summary.cells().forEach(c -> figures.put(c.cell(), c));
        return figures;
    }
}
