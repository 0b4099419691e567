package org.notchwork.strategy.classical;

import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;

/** Queries 0, 1, 2, … until the first collision, which comes at query 2^⌊log₂ s⌋ + 1. */
public final class SequentialScan implements PeriodByCollision {

    @Override
    public String name() {
        return "sequential-scan";
    }

    @Override
    public String description() {
        return "queries 0, 1, 2, ... until two values are the same";
    }

    @Override
    public boolean deterministic() {
        return true;
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return CollisionSearch.run(oracle, new Ascending(1L << oracle.width()));
    }

    private static final class Ascending implements CollisionSearch.Order {

        private final long end;
        private long next;

        Ascending(long end) {
            this.end = end;
        }

        @Override
        public long next() {
            return next == end ? SeenValues.NONE : next++;
        }
    }
}
