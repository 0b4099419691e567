package org.notchwork.study;

import java.util.Optional;
import org.notchwork.catalogue.Laws;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Noise;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.SuccessLaw;
import org.notchwork.problem.Problem;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Strategy;

/**
 * A strategy as an experiment runs it.
 *
 * @param strategy the strategy
 * @param engine the engine; present exactly for a quantum strategy
 * @param asked how the engine was asked for
 * @param ownLabel the author's own label; absent for the usual one
 * @param noise what disturbs the samples; none for a classical strategy
 * @param control whether the study says that there is a control, or none; absent where it leaves that to the width
 */
public record StrategyChoice(
        Strategy strategy,
        Optional<Engine> engine,
        Asked asked,
        Optional<String> ownLabel,
        Noise noise,
        Optional<Boolean> control) {

    /** How an engine was asked for. */
    public enum Asked {
        /** By name, or not at all. */
        BY_NAME,
        /** The strongest blind one. */
        AUTO,
        /** The strongest blind one, or a sighted one if there is none. */
        AUTO_OR_SIGHTED
    }

    /** Checks that a quantum strategy, and only one, has an engine. */
    public StrategyChoice {
        if (engine.isPresent() != strategy instanceof QuantumStrategy) {
            throw new IllegalArgumentException(strategy.name() + ": an engine goes with a quantum strategy, only");
        }
    }

    /** Creates a choice with nothing but a strategy and an engine by name. */
    public StrategyChoice(Strategy strategy, Optional<Engine> engine) {
        this(strategy, engine, Asked.BY_NAME, Optional.empty(), Noise.NONE, Optional.empty());
    }

    /**
     * Returns the label, unique within an experiment: the author's own, or the name, with {@code @engine} for a quantum
     * strategy ({@code @auto} where the engine was not named).
     */
    public String label() {
        return ownLabel.orElseGet(() -> engine.map(
                        e -> strategy.name() + "@" + (asked == Asked.BY_NAME ? e.name() : "auto"))
                .orElse(strategy.name()));
    }

    /** Returns {@code blind} or {@code sighted} for a quantum strategy. */
    public Optional<String> sight() {
        return engine.map(e -> e.sight().word());
    }

    /** Returns what theory says about the number of queries on a problem at a width; empty if it says nothing. */
    public Optional<QueryLaw> law(Problem problem, int width) {
        return Laws.queries(problem, strategy, noise).filter(law -> law.reaches(width));
    }

    /** Returns what theory says about the probability of a right answer on a problem; empty if it says nothing. */
    public Optional<SuccessLaw> successLaw(Problem problem) {
        return Laws.success(problem, strategy, noise);
    }
}
