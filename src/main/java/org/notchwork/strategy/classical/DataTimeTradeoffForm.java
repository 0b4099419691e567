package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.engine.Noise;
import org.notchwork.json.Fields;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.StrategyForm;

/** Reads {@code data-time-tradeoff}: {@code data-bits}, from 1 to 22, may be left out. */
public final class DataTimeTradeoffForm implements StrategyForm {

    private static final int MOST = 22;

    @Override
    public String name() {
        return DataTimeTradeoff.NAME;
    }

    @Override
    public Strategy configure(Fields settings, Noise noise) {
        OptionalLong bits = settings.optionalInteger("data-bits", 1, MOST);
        return new DataTimeTradeoff(bits.isPresent() ? Optional.of((int) bits.getAsLong()) : Optional.empty());
    }
}
