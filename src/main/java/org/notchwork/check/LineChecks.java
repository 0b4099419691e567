package org.notchwork.check;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.law.QueryLaw;
import org.notchwork.problem.Answer;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

/**
 * Compares the query count of every trial with the closed form of its strategy, where there is one. Needs nothing but
 * the records of the trials.
 */
public final class LineChecks {

    private final Map<Cell, QueryLaw> laws = new LinkedHashMap<>();
    private final Map<Cell, Comparison> found = new LinkedHashMap<>();

    private final Map<Cell, QueryCounts> counts = new LinkedHashMap<>();
    private final boolean keepsCounts;

    /** Starts with no trials. */
    public LineChecks(Study study) {
        this.keepsCounts = study.hasFullChecks();
        for (Experiment experiment : study.experiments()) {
            for (Cell cell : experiment.cells()) {
                experiment
                        .choice(cell.label())
                        .filter(c -> c.strategy().deterministic())
                        .flatMap(c -> c.law(experiment.problem(), cell.width()))
                        .filter(law -> law.queries(cell.width(), 1).isPresent())
                        .ifPresent(law -> {
                            laws.put(cell, law);
                            found.put(cell, Comparison.NONE);
                        });
            }
        }
    }

    /** Adds one instance faced by every strategy of its experiment. */
    public void add(TrialGroup group) {
        for (TrialRecord record : group.records()) {
            if (keepsCounts) {
                counts.computeIfAbsent(record.cell(), c -> new QueryCounts()).add(record);
            }
            Optional.ofNullable(laws.get(record.cell())).ifPresent(law -> add(record, law));
        }
    }

    private void add(TrialRecord record, QueryLaw law) {
        if (record.outcome() == Outcome.CENSORED) {
            return;
        }
        OptionalLong expected = law.queries(record.cell().width(), key(record.hidden()));
        long counted = record.counts().queries();
        if (expected.isEmpty()) {
            return;
        }
        Comparison one = expected.getAsLong() == counted
                ? Comparison.agreed()
                : Comparison.differed(
                        "trial " + record.trial() + ": " + counted + " queries, not " + expected.getAsLong());
        found.merge(record.cell(), one, Comparison::plus);
    }

    /** Laws that depend on what is hidden are about periods of at most 63 bits; to the others it is all the same. */
    private static long key(Answer hidden) {
        return hidden instanceof Answer.Period period && period.s().width() < Long.SIZE
                ? period.s().bits()
                : 0;
    }

    /** Returns how often each number of queries occurred in a cell of a study with full checks. */
    QueryCounts counts(Cell cell) {
        return counts.getOrDefault(cell, new QueryCounts());
    }

    /** Returns the check of a cell; empty if its strategy has no closed form. */
    Optional<CrossCheck> check(Cell cell) {
        return Optional.ofNullable(found.get(cell))
                .map(c -> new CrossCheck(
                        CheckKind.CLOSED_FORM,
                        cell.id(),
                        c.compared(),
                        "the query count that the hidden answer fixes, in every trial that was not censored",
                        c.compared() == 0 ? c.text() + "; every trial was censored" : c.text(),
                        Optional.empty(),
                        c.outcome()));
    }
}
