package org.notchwork.strategy.classical;

import org.notchwork.engine.Noise;
import org.notchwork.json.Fields;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.StrategyForm;

/** Reads {@code distinguished-points}: {@code distinguished-bits} from 0 to 40 and {@code stored-trails} from 1 to 1 048 576. */
public final class DistinguishedPointsForm implements StrategyForm {

    private static final int MOST_BITS = 40;
    private static final int MOST_TRAILS = 1 << 20;

    @Override
    public String name() {
        return DistinguishedPoints.NAME;
    }

    @Override
    public Strategy configure(Fields settings, Noise noise) {
        int bits = (int) settings.integer("distinguished-bits", 0, MOST_BITS);
        int trails = (int) settings.integer("stored-trails", 1, MOST_TRAILS);
        return new DistinguishedPoints(bits, trails);
    }
}
