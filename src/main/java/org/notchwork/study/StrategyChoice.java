package org.notchwork.study;

import java.util.Optional;
import org.notchwork.engine.Engine;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Strategy;

/**
 * A strategy as an experiment runs it.
 *
 * @param strategy the strategy
 * @param engine the engine; present exactly for a quantum strategy
 */
public record StrategyChoice(Strategy strategy, Optional<Engine> engine) {

    /** Checks that a quantum strategy, and only one, has an engine. */
    public StrategyChoice {
        if (engine.isPresent() != strategy instanceof QuantumStrategy) {
            throw new IllegalArgumentException(strategy.name() + ": an engine goes with a quantum strategy, only");
        }
    }

    /** Returns the label, unique within an experiment: the name, with {@code @engine} for a quantum strategy. */
    public String label() {
        return engine.map(e -> strategy.name() + "@" + e.name()).orElse(strategy.name());
    }

    /** Returns {@code blind} or {@code sighted} for a quantum strategy. */
    public Optional<String> sight() {
        return engine.map(e -> e.sight().word());
    }
}
