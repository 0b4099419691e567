package org.notchwork.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Sight;
import org.notchwork.json.Fields;
import org.notchwork.problem.Problem;
import org.notchwork.strategy.QuantumStrategy;

/**
 * Picks an engine where a study leaves it open: the strongest blind one that takes the strategy at every width of the
 * experiment within 2 GiB. The choice depends on the study alone, so that it is the same on every machine.
 */
final class EngineChoice {

    private static final long MEMORY = 2L << 30;

    private final Optional<Problem> problem;
    private final List<Integer> widths;

    EngineChoice(Optional<Problem> problem, List<Integer> widths) {
        this.problem = problem;
        this.widths = widths;
    }

    /** Returns the engine; empty if a fault was noted, or the problem is faulty itself. */
    Optional<Engine> strongest(Fields fields, QuantumStrategy strategy, boolean allowsSighted) {
        if (problem.isEmpty() || widths.isEmpty()) {
            return Optional.empty();
        }
        List<Engine> able = new ArrayList<>();
        List<String> refusals = new ArrayList<>();
        for (Engine engine : Engines.byStrength()) {
            refusal(engine, strategy).ifPresentOrElse(refusals::add, () -> able.add(engine));
        }
        Optional<Engine> blind =
                able.stream().filter(e -> e.sight() == Sight.BLIND).findFirst();
        if (blind.isPresent()) {
            return blind;
        }
        if (able.isEmpty()) {
            fields.fault("engine", "no engine takes this: " + refusals.get(0), "a smaller width is wanted");
            return Optional.empty();
        }
        if (!allowsSighted) {
            fields.fault(
                    "engine",
                    "no blind engine takes this, and " + able.get(0).name() + " is told the secret",
                    "a smaller width, or \"allow-sighted\": true, is wanted");
            return Optional.empty();
        }
        return Optional.of(able.get(0));
    }

    private Optional<String> refusal(Engine engine, QuantumStrategy strategy) {
        for (int width : widths) {
            Optional<String> refused = engine.refusal(problem.orElseThrow(), width, strategy.circuit());
            if (refused.isPresent()) {
                return refused;
            }
            if (engine.memoryBytes(width) > MEMORY) {
                return Optional.of(engine.name() + " needs more than 2 GiB at width " + width);
            }
        }
        return Optional.empty();
    }
}
