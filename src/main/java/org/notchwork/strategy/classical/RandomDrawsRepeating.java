package org.notchwork.strategy.classical;

import org.notchwork.problem.Oracle;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;

/** Queries uniformly random points, {@code bits(n)} each, until the first collision; a repeated point is a lost query. */
public final class RandomDrawsRepeating implements PeriodByCollision {

    @Override
    public String name() {
        return "random-draws-repeating";
    }

    @Override
    public String description() {
        return "queries uniformly random points, repeats allowed, until two different points have one value";
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        return CollisionSearch.run(oracle, () -> stream.bits(width));
    }
}
