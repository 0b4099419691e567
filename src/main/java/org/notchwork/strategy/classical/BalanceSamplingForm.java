package org.notchwork.strategy.classical;

import org.notchwork.engine.Noise;
import org.notchwork.json.Fields;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.StrategyForm;

/** Reads {@code balance-sampling}: {@code queries}, from 1 to 1 048 576. */
public final class BalanceSamplingForm implements StrategyForm {

    private static final int MOST = 1 << 20;

    @Override
    public String name() {
        return BalanceSampling.NAME;
    }

    @Override
    public Strategy configure(Fields settings, Noise noise) {
        return new BalanceSampling((int) settings.integer("queries", 1, MOST));
    }
}
