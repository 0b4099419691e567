package org.notchwork.figure;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.notchwork.exact.Decimals;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.study.Cell;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** Gathers the records of one cell. */
final class CellTally {

    private final Problem problem;
    private final Cell cell;
    private final StrategyChoice choice;
    private final CountTally queries = new CountTally();
    private final List<CountTally> byFunction = new ArrayList<>();
    private final Map<String, long[]> split = new TreeMap<>();
    private long solved;
    private long wrong;
    private long censored;
    private long unanswered;
    private long confirming;
    private long controls;
    private long named;
    private long claimed;
    private long failed;

    CellTally(Problem problem, Cell cell, StrategyChoice choice) {
        this.problem = problem;
        this.cell = cell;
        this.choice = choice;
        problem.functions().forEach(f -> byFunction.add(new CountTally()));
    }

    Cell cell() {
        return cell;
    }

    void add(TrialRecord record) {
        switch (record.outcome()) {
            case SOLVED -> solved++;
            case WRONG -> wrong++;
            case CENSORED -> censored++;
            case UNANSWERED -> unanswered++;
        }
        confirming += record.counts().confirming();
        queries.add(record.counts().queries());
        for (int i = 0; i < Math.min(byFunction.size(), record.byFunction().size()); i++) {
            byFunction.get(i).add(record.byFunction().get(i).queries());
        }
        side(record.hidden()).ifPresent(side -> {
            long[] counts = split.computeIfAbsent(side, s -> new long[2]);
            counts[0]++;
            counts[1] += record.outcome() == Outcome.SOLVED ? 1 : 0;
        });
    }

    /** A control of a trial that hides no word has nothing that it must not name. */
    void add(ControlRecord record) {
        if (record.secret() instanceof Answer.NoPeriod || record.secret() instanceof Answer.Balance) {
            return;
        }
        controls++;
        switch (record.outcome()) {
            case SECRET -> named++;
            case CLAIMED -> claimed++;
            case FAILED -> failed++;
            case NOTHING -> {
                // What it should be.
            }
        }
    }

    private Optional<String> side(Answer hidden) {
        if (hidden instanceof Answer.Balance balance) {
            return Optional.of(balance.isBalanced() ? "balanced" : "constant");
        }
        if (problem.promise().question() != Question.PERIOD_OR_NONE) {
            return Optional.empty();
        }
        return Optional.of(hidden instanceof Answer.NoPeriod ? "none" : "period");
    }

    CellFigures figures() {
        long trials = queries.size();
        return new CellFigures(
                cell,
                choice.engine().map(e -> e.name()),
                choice.sight(),
                trials,
                solved,
                wrong,
                censored,
                unanswered,
                queryFigures(),
                confirming,
                Decimals.quotient(solved, trials),
                ClopperPearson.interval(solved, trials),
                functionFigures(),
                splitFigures(),
                controlFigures());
    }

    /** Returns how often each number of queries occurred. */
    SortedMap<Long, Long> distribution() {
        return queries.multiplicities();
    }

    private List<FunctionFigures> functionFigures() {
        List<FunctionFigures> figures = new ArrayList<>();
        for (int i = 0; i < byFunction.size(); i++) {
            CountTally tally = byFunction.get(i);
            if (tally.size() > 0) {
                figures.add(new FunctionFigures(problem.functions().get(i), tally.mean(), tally.max()));
            }
        }
        return figures;
    }

    private List<SplitFigures> splitFigures() {
        return split.entrySet().stream()
                .map(e -> new SplitFigures(
                        e.getKey(),
                        e.getValue()[0],
                        e.getValue()[1],
                        Decimals.quotient(e.getValue()[1], e.getValue()[0]),
                        ClopperPearson.interval(e.getValue()[1], e.getValue()[0])))
                .toList();
    }

    private Optional<ControlFigures> controlFigures() {
        if (controls == 0) {
            return Optional.empty();
        }
        BigDecimal chance = GuessRate.of(problem.promise(), cell.width());
        return Optional.of(new ControlFigures(
                controls, named, claimed, failed, chance, rounded(BinomialTail.atLeast(named, controls, chance))));
    }

    /** The flag depends on what is written, so that it can be found again from the file. */
    private static BigDecimal rounded(BigDecimal p) {
        return p.setScale(Decimals.PLACES, RoundingMode.HALF_EVEN);
    }

    private QueryFigures queryFigures() {
        Optional<BigDecimal> deviation = queries.variance().map(Decimals::root);
        return new QueryFigures(
                queries.mean(),
                deviation,
                deviation.map(d -> MeanInterval.of(queries.mean(), d, queries.size())),
                queries.min(),
                queries.quartile(1),
                queries.quartile(2),
                queries.quartile(3),
                queries.max());
    }

    /** Returns whether this outcome means that the query limit cut the trial off. */
    static boolean isCut(TrialRecord record) {
        return record.outcome() == Outcome.CENSORED;
    }
}
