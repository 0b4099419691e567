package org.notchwork.support;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Strategies;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Noise;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Seed;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Strategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRunner;

/** Small studies of the XOR period. */
public final class Studies {

    private static final Seed SEED = new Seed("the fixed seed of all tests");

    private Studies() {}

    /** Returns a strategy by name, with its defaults. */
    public static Strategy strategy(String name) {
        List<Fault> faults = new ArrayList<>();
        Fields none = Fields.of(JsonObject.builder().build(), "", faults);
        Strategy strategy = Strategies.form(name).orElseThrow().configure(none, Noise.NONE);
        if (!faults.isEmpty()) {
            throw new IllegalArgumentException(name + " has no defaults: " + faults);
        }
        return strategy;
    }

    /** Returns four strategies for periods, the quantum one once with each engine that is always compared. */
    public static List<StrategyChoice> allChoices() {
        List<StrategyChoice> choices = new ArrayList<>();
        for (String name : List.of("sequential-scan", "random-draws", "difference-cover", "fourier-sampling")) {
            Strategy strategy = Studies.strategy(name);
            if (strategy instanceof QuantumStrategy) {
                for (Engine engine : Engines.reference()) {
                    choices.add(new StrategyChoice(strategy, Optional.of(engine)));
                }
            } else {
                choices.add(new StrategyChoice(strategy, Optional.empty()));
            }
        }
        return choices;
    }

    /** Returns the choice of a strategy without an engine. */
    public static StrategyChoice classical(String name) {
        return new StrategyChoice(Studies.strategy(name), Optional.empty());
    }

    /** Returns an experiment named {@code main} on random tables. */
    public static Experiment experiment(
            List<Integer> widths, List<StrategyChoice> choices, int trials, long queryLimit) {
        return new Experiment("main", new XorPeriod(Labelling.TABLE), widths, choices, trials, queryLimit);
    }

    /** Returns a study of one experiment, cross-checked up to width 8, without claims. */
    public static Study study(Experiment experiment) {
        return new Study("A test", "Does it hold?", SEED, List.of(experiment), 8, List.of());
    }

    /** Returns a runner on the seed of these studies. */
    public static TrialRunner runner() {
        return new TrialRunner(new Study("A test", "Does it hold?", SEED, List.of(), 8, List.of()));
    }

    /** Returns all trials of an experiment, one after the other. */
    public static List<TrialGroup> run(Experiment experiment) {
        List<TrialGroup> groups = new ArrayList<>();
        for (int width : experiment.widths()) {
            for (long trial = 0; trial < experiment.trials(); trial++) {
                groups.add(runner().run(experiment, width, trial));
            }
        }
        return groups;
    }
}
