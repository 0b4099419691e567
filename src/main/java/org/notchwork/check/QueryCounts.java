package org.notchwork.check;

import java.util.SortedMap;
import java.util.TreeMap;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** How often each number of queries occurred in a cell, in all trials and in those that were solved. */
final class QueryCounts {

    private final SortedMap<Long, Long> all = new TreeMap<>();
    private final SortedMap<Long, Long> solved = new TreeMap<>();
    private long trials;

    void add(TrialRecord record) {
        long queries = record.counts().queries();
        all.merge(queries, 1L, Math::addExact);
        if (record.outcome() == Outcome.SOLVED) {
            solved.merge(queries, 1L, Math::addExact);
        }
        trials++;
    }

    long trials() {
        return trials;
    }

    SortedMap<Long, Long> all() {
        return all;
    }

    SortedMap<Long, Long> solved() {
        return solved;
    }
}
