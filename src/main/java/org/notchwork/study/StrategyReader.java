package org.notchwork.study;

import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Strategies;
import org.notchwork.engine.Engine;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Problem;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Strategy;

/** Reads one strategy of an experiment and refuses combinations that cannot run. */
final class StrategyReader {

    private final Optional<Problem> problem;
    private final List<Integer> widths;

    StrategyReader(Optional<Problem> problem, List<Integer> widths) {
        this.problem = problem;
        this.widths = widths;
    }

    /** Returns the choice; empty if faults were noted. */
    Optional<StrategyChoice> read(Fields.Item item) {
        Fields fields = item.object();
        int before = fields.faults().size();
        Optional<Strategy> strategy = strategy(fields);
        Optional<Engine> engine = engine(fields, strategy);
        fields.end();
        strategy.ifPresent(s -> fit(fields, s, engine));
        if (fields.faults().size() > before || strategy.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new StrategyChoice(strategy.get(), engine));
    }

    private static Optional<Strategy> strategy(Fields fields) {
        String name = fields.text("name", 1, 60);
        Optional<Strategy> strategy = Strategies.strategy(name);
        if (strategy.isEmpty() && !name.isEmpty()) {
            fields.fault("name", "no strategy " + Fields.quoted(name), Spelling.mend(name, Strategies.names()));
        }
        return strategy;
    }

    /** Returns the engine; one that an unknown strategy names is checked for itself. */
    private static Optional<Engine> engine(Fields fields, Optional<Strategy> strategy) {
        boolean classical =
                strategy.filter(s -> !(s instanceof QuantumStrategy)).isPresent();
        if (classical && fields.has("engine")) {
            fields.fault("engine", strategy.get().name() + " is a classical strategy", "leave the engine out");
            return Optional.empty();
        }
        if (strategy.isPresent() && !classical && !fields.has("engine")) {
            String engines = String.join(", ", Engines.names());
            String mend = strategy.get().name() + " is a quantum strategy; one of " + engines + " is wanted";
            fields.fault("engine", "this member is missing", mend);
            return Optional.empty();
        }
        Optional<String> name = fields.optionalText("engine", 1, 60).filter(n -> !n.isEmpty());
        Optional<Engine> engine = name.flatMap(Engines::engine);
        if (name.isPresent() && engine.isEmpty()) {
            fields.fault(
                    "engine", "no engine " + Fields.quoted(name.get()), Spelling.mend(name.get(), Engines.names()));
        }
        return engine;
    }

    private void fit(Fields fields, Strategy strategy, Optional<Engine> engine) {
        problem.ifPresent(p -> {
            for (int width : widths) {
                Optional<String> refused = strategy.refusal(p, width);
                refused.ifPresent(why -> fields.fault("name", why, "another strategy or problem is wanted"));
                Optional<String> unreachable = engine.flatMap(e -> e.refusal(p, width));
                unreachable.ifPresent(
                        why -> fields.fault("engine", why, "a smaller width or another engine is wanted"));
                if (refused.isPresent() || unreachable.isPresent()) {
                    return;
                }
            }
        });
    }
}
