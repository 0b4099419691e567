package org.notchwork.support;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Strategies;
import org.notchwork.engine.Engine;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;
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

    /** Returns every strategy, the quantum ones once with each engine. */
    public static List<StrategyChoice> allChoices() {
        List<StrategyChoice> choices = new ArrayList<>();
        for (String name : Strategies.names()) {
            Strategy strategy = Strategies.strategy(name).orElseThrow();
            if (strategy instanceof QuantumStrategy) {
                for (Engine engine : Engines.all()) {
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
        return new StrategyChoice(Strategies.strategy(name).orElseThrow(), Optional.empty());
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
        return new TrialRunner(new SeedTree(SEED));
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
