package org.notchwork.strategy;

import org.notchwork.engine.Noise;
import org.notchwork.json.Fields;

/** Makes strategies of one name from the settings in a study file. */
public interface StrategyForm {

    /** Returns the name, as a study file gives it. */
    String name();

    /**
     * Returns the strategy that the settings describe.
     *
     * @param settings the members of the strategy in the study file; those that every strategy has are read by others.
     *     Faults are noted there; {@link Fields#end} is the caller's to call
     * @param noise what will disturb the samples of a quantum strategy, which a decoder may know
     */
    Strategy configure(Fields settings, Noise noise);

    /** Returns the form of a strategy without settings. */
    static StrategyForm of(Strategy strategy) {
        return new StrategyForm() {
            @Override
            public String name() {
                return strategy.name();
            }

            @Override
            public Strategy configure(Fields settings, Noise noise) {
                return strategy;
            }
        };
    }
}
