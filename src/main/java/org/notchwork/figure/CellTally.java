package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.study.Cell;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** Gathers the records of one cell. */
final class CellTally {

    private final Cell cell;
    private final StrategyChoice choice;
    private final CountTally queries = new CountTally();
    private long solved;
    private long wrong;
    private long censored;
    private long confirming;

    CellTally(Cell cell, StrategyChoice choice) {
        this.cell = cell;
        this.choice = choice;
    }

    Cell cell() {
        return cell;
    }

    void add(TrialRecord record) {
        switch (record.outcome()) {
            case SOLVED -> solved++;
            case WRONG -> wrong++;
            case CENSORED -> censored++;
        }
        confirming += record.counts().confirming();
        queries.add(record.counts().queries());
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
                queryFigures(),
                confirming,
                Decimals.quotient(solved, trials),
                ClopperPearson.interval(solved, trials));
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
