package org.notchwork.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.notchwork.Studies;
import org.notchwork.bundle.Results;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.claim.Judge;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Simulation;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;

/** Results that nothing was run for, larger than the catalogue of strategies allows, to try the layout with. */
final class MadeUpResults {

    private static final String LONG_NAME = "a-strategy-with-a-name-of-forty-letters-";

    private MadeUpResults() {}

    /** Twelve strategies, nine classical and three quantum, at forty widths, every tenth cell censored. */
    static Results ofTwelveStrategiesAtFortyWidths() {
        Study small = Studies.small();
        List<StrategyChoice> choices = new ArrayList<>();
        for (String name : List.of("sequential-scan", "random-draws", "difference-cover")) {
            choices.add(classical(name));
        }
        for (int i = 0; i < 6; i++) {
            choices.add(classical(i == 0 ? LONG_NAME : "made-up-" + i));
        }
        Engines.all().forEach(e -> choices.add(new StrategyChoice(new Quantum("fourier-sampling"), Optional.of(e))));
        List<Integer> widths = IntStream.rangeClosed(2, 41).boxed().toList();
        Experiment experiment = new Experiment(
                "an-experiment-of-forty-widths-0123456789",
                small.experiments().get(0).problem(),
                widths,
                choices,
                1_000_000,
                Long.MAX_VALUE >> 10);
        Study study = new Study(small.title(), small.question(), small.seed(), List.of(experiment), 12, List.of());
        Summary summary = new Summary(
                experiment.cells().stream().map(c -> figures(experiment, c)).toList(), ratios(experiment));
        return new Results(study, summary, checks(experiment), Judge.judge(study, summary));
    }

    private static CellFigures figures(Experiment experiment, Cell cell) {
        StrategyChoice choice = experiment.choice(cell.label()).orElseThrow();
        int series = experiment.strategies().indexOf(choice);
        BigDecimal mean = choice.engine().isPresent()
                ? BigDecimal.valueOf(cell.width() + series)
                : BigDecimal.valueOf(2)
                        .pow(1 + cell.width() * (9 + series) / 22)
                        .add(BigDecimal.valueOf(series, 1));
        BigDecimal error = mean.divide(BigDecimal.TEN);
        long whole = mean.longValue();
        long censored = (cell.width() + series) % 10 == 0 ? 17 : 0;
        return new CellFigures(
                cell,
                choice.engine().map(e -> e.name()),
                choice.sight(),
                experiment.trials(),
                experiment.trials() - censored,
                0,
                censored,
                new QueryFigures(
                        mean,
                        Optional.of(error),
                        Optional.of(new Interval(mean.subtract(error), mean.add(error))),
                        1,
                        whole / 2,
                        whole,
                        whole * 2,
                        whole * 4),
                choice.engine().isPresent() ? 2_000_000 : 0,
                new BigDecimal("0.999983"),
                new Interval(new BigDecimal("0.999973"), new BigDecimal("0.99999")));
    }

    private static List<RatioFigures> ratios(Experiment experiment) {
        List<RatioFigures> ratios = new ArrayList<>();
        for (int width : experiment.widths()) {
            ratios.add(new RatioFigures(
                    new Cell(experiment.id(), width, LONG_NAME),
                    new Cell(experiment.id(), width, "fourier-sampling@fibre"),
                    1_000_000,
                    17,
                    new BigDecimal("12345678.9"),
                    Optional.of(new Interval(new BigDecimal("12345678"), new BigDecimal("12345679")))));
        }
        return ratios;
    }

    private static List<CrossCheck> checks(Experiment experiment) {
        List<CrossCheck> checks = new ArrayList<>();
        for (Cell cell : experiment.cells()) {
            checks.add(new CrossCheck(
                    CheckKind.THEORY_MEAN,
                    cell.id(),
                    1_000_000,
                    "mean 123456789012.345678 = 123456789012345678901/9876543210987654321",
                    "mean 123456789012.345678, standard error 12345.678901",
                    Optional.of("-0.07"),
                    CheckOutcome.AGREES));
        }
        for (int i = 0; i < 7; i++) {
            checks.add(new CrossCheck(
                    CheckKind.EXHAUSTIVE_ANSWER,
                    experiment.id() + "/" + (2 + i),
                    8,
                    "the hidden answer",
                    "trial " + i + " differs",
                    Optional.empty(),
                    CheckOutcome.DIFFERS));
        }
        return checks;
    }

    private static StrategyChoice classical(String name) {
        return new StrategyChoice(new Classical(name), Optional.empty());
    }

    private record Classical(String name) implements ClassicalStrategy {

        @Override
        public Attempt attempt(Oracle oracle, RandomStream stream) {
            throw new UnsupportedOperationException("never run");
        }

        @Override
        public String description() {
            return "made up";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width) {
            return Optional.empty();
        }

        @Override
        public boolean deterministic() {
            return false;
        }

        @Override
        public long memoryBytes(int width, long queryLimit) {
            return 0;
        }
    }

    private record Quantum(String name) implements QuantumStrategy {

        @Override
        public Circuit circuit() {
            return Circuit.FOURIER;
        }

        @Override
        public Attempt attempt(Simulation simulation, Oracle oracle, RandomStream stream) {
            throw new UnsupportedOperationException("never run");
        }

        @Override
        public String description() {
            return "made up";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width) {
            return Optional.empty();
        }

        @Override
        public boolean deterministic() {
            return false;
        }

        @Override
        public long memoryBytes(int width, long queryLimit) {
            return 0;
        }
    }
}
