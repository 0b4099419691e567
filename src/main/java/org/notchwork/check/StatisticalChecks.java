package org.notchwork.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.BinomialTail;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.ControlFigures;
import org.notchwork.figure.GoodnessOfFit;
import org.notchwork.figure.Holm;
import org.notchwork.law.ClassicalLowerBound;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.SuccessLaw;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;

/**
 * The cross-checks that give a probability: of such an observation, or one further off, if theory is right. All of a
 * study are corrected together by the method of S. Holm (1979); one differs if its corrected probability is below 0.001.
 * With a fixed seed they come out the same for ever: one that differs is a finding to explain.
 */
final class StatisticalChecks {

    private static final BigDecimal LEVEL = new BigDecimal("0.001");
    private static final int MOST_POINTS = 64;

    private final Study study;
    private final LineChecks lines;
    private final Map<Cell, CellFigures> figures;
    private final Map<Cell, List<CrossCheck>> checks = new LinkedHashMap<>();

    /** A check before it is judged; without a probability it is not comparable. */
    private record Test(
            CheckKind kind, Cell cell, long compared, String expected, String observed, Optional<BigDecimal> p) {}

    StatisticalChecks(Study study, LineChecks lines, Map<Cell, CellFigures> figures) {
        this.study = study;
        this.lines = lines;
        this.figures = figures;
        if (study.hasFullChecks()) {
            judge(tests());
        }
    }

    /** Returns the checks of a cell, judged. */
    List<CrossCheck> of(Cell cell) {
        return checks.getOrDefault(cell, List.of());
    }

    private List<Test> tests() {
        List<Test> tests = new ArrayList<>();
        for (Experiment experiment : study.experiments()) {
            for (Cell cell : experiment.cells()) {
                StrategyChoice choice = experiment.choice(cell.label()).orElseThrow();
                Problem problem = experiment.problem();
                choice.law(problem, cell.width())
                        .flatMap(law -> distribution(cell, law))
                        .ifPresent(tests::add);
                choice.successLaw(problem).ifPresent(law -> tests.add(success(cell, law)));
                if (isBounded(problem, choice)) {
                    tests.add(bound(cell));
                }
                figures.get(cell).control().ifPresent(control -> tests.add(control(cell, choice, control)));
            }
        }
        return tests;
    }

    private void judge(List<Test> tests) {
        List<BigDecimal> raw = tests.stream().flatMap(t -> t.p().stream()).toList();
        List<BigDecimal> corrected = Holm.adjust(raw);
        int next = 0;
        for (Test test : tests) {
            CheckOutcome outcome = CheckOutcome.NOT_COMPARABLE;
            String observed = test.observed();
            if (test.p().isPresent()) {
                BigDecimal p = corrected.get(next++);
                observed += ", p = " + Decimals.text(test.p().get()) + ", corrected for " + raw.size() + " tests "
                        + Decimals.text(p);
                outcome = p.compareTo(LEVEL) < 0 ? CheckOutcome.DIFFERS : CheckOutcome.AGREES;
            }
            checks.computeIfAbsent(test.cell(), c -> new ArrayList<>())
                    .add(new CrossCheck(
                            test.kind(),
                            test.cell().id(),
                            test.compared(),
                            test.expected(),
                            observed,
                            Optional.empty(),
                            outcome));
        }
    }

    private Optional<Test> distribution(Cell cell, QueryLaw law) {
        boolean isConstant =
                law.variance(cell.width()).filter(v -> v.signum() == 0).isPresent();
        if (isConstant || law.within(cell.width(), 0).isEmpty()) {
            return Optional.empty();
        }
        CellFigures cellFigures = figures.get(cell);
        QueryCounts counts = lines.counts(cell);
        String expected = "distribution of the law " + law.formula();
        if (cellFigures.censored() > 0) {
            return Optional.of(new Test(
                    CheckKind.QUERY_DISTRIBUTION,
                    cell,
                    counts.trials(),
                    expected,
                    "not comparable: " + cellFigures.censored() + " trials censored",
                    Optional.empty()));
        }
        Optional<GoodnessOfFit> fit = GoodnessOfFit.of(
                counts.all(),
                counts.trials(),
                m -> law.within(cell.width(), m).orElseThrow().value());
        return Optional.of(fit.map(f -> new Test(
                        CheckKind.QUERY_DISTRIBUTION,
                        cell,
                        counts.trials(),
                        expected,
                        f.impossible().isPresent()
                                ? "the law gives " + f.impossible().getAsLong() + " queries no chance at all"
                                : "chi-squared " + Decimals.text(f.statistic()) + " with " + f.degrees()
                                        + " degrees of freedom",
                        Optional.of(f.p())))
                .orElseGet(() -> new Test(
                        CheckKind.QUERY_DISTRIBUTION,
                        cell,
                        counts.trials(),
                        expected,
                        "not comparable: too few trials for two bins",
                        Optional.empty())));
    }

    private Test success(Cell cell, SuccessLaw law) {
        CellFigures cellFigures = figures.get(cell);
        Prediction success = law.success(cell.width());
        String expected = "rate " + Decimals.text(success.value())
                + success.fraction().map(f -> " = " + f).orElse("") + ", " + law.formula();
        String observed = cellFigures.solved() + " of " + cellFigures.trials();
        if (cellFigures.censored() > 0) {
            return new Test(
                    CheckKind.SUCCESS_RATE,
                    cell,
                    cellFigures.trials(),
                    expected,
                    observed + ", not comparable: " + cellFigures.censored() + " trials censored",
                    Optional.empty());
        }
        return new Test(
                CheckKind.SUCCESS_RATE,
                cell,
                cellFigures.trials(),
                expected,
                observed,
                Optional.of(BinomialTail.twoSided(cellFigures.solved(), cellFigures.trials(), success.value())));
    }

    /** The bound is about collisions with random labels: not about functions of which more is known. */
    private static boolean isBounded(Problem problem, StrategyChoice choice) {
        return choice.strategy() instanceof ClassicalStrategy
                && problem.promise().question() == Question.PERIOD
                && problem.promise().labels() == Promise.Labels.RANDOM;
    }

    /** The least p over at most 64 of the observed counts, times their number. */
    private Test bound(Cell cell) {
        QueryCounts counts = lines.counts(cell);
        ClassicalLowerBound law = new ClassicalLowerBound();
        List<Long> points = new ArrayList<>(counts.solved().keySet());
        int step = (points.size() + MOST_POINTS - 1) / MOST_POINTS;
        BigDecimal least = BigDecimal.ONE;
        String worst = "no trial solved";
        long solved = 0;
        int index = 0;
        int tested = 0;
        for (long queries : points) {
            solved += counts.solved().get(queries);
            if (index++ % step != 0) {
                continue;
            }
            tested++;
            BigDecimal limit = law.within(cell.width(), queries).value();
            BigDecimal p = limit.compareTo(BigDecimal.ONE) >= 0
                    ? BigDecimal.ONE
                    : BinomialTail.atLeast(solved, counts.trials(), limit);
            if (tested == 1 || p.compareTo(least) < 0) {
                least = p;
                worst = solved + " of " + counts.trials() + " within " + queries + " queries, at most "
                        + Decimals.text(limit) + " expected";
            }
        }
        BigDecimal corrected =
                least.multiply(BigDecimal.valueOf(Math.max(1, tested))).min(BigDecimal.ONE);
        return new Test(
                CheckKind.CLASSICAL_BOUND,
                cell,
                counts.trials(),
                "success within m queries at most C(m, 2) / (2^n - 1)",
                "nearest or beyond at " + worst,
                Optional.of(corrected));
    }

    private static Test control(Cell cell, StrategyChoice choice, ControlFigures control) {
        String expected = "named by chance at rate " + Decimals.text(control.chance());
        String observed = control.named() + " of " + control.trials() + " controls name what is not there";
        boolean isTold =
                choice.engine().map(e -> e.sight().word().equals("sighted")).orElse(false);
        return new Test(
                CheckKind.CONTROL,
                cell,
                control.trials(),
                expected,
                isTold ? observed + (control.isFlagged() ? ": FLAGGED, " : ": ") + "the engine is told" : observed,
                isTold ? Optional.empty() : Optional.of(control.p()));
    }
}
