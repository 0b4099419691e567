package org.notchwork.trial;

import java.util.List;
import java.util.Optional;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Engine;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** Runs single trials. Immutable; what it returns depends on the study alone. */
public final class TrialRunner {

    private final SeedTree seeds;

    /** Creates a runner that takes all its chance from one seed tree. */
    public TrialRunner(SeedTree seeds) {
        this.seeds = seeds;
    }

    /** Draws the instance of a trial, the same for every strategy. */
    public Instance instance(Experiment experiment, int width, long trial) {
        return experiment.problem().draw(width, seeds.stream(Address.instance(experiment.id(), width, trial)));
    }

    /** Lets every strategy of an experiment face one instance. */
    public TrialGroup run(Experiment experiment, int width, long trial) {
        Instance instance = instance(experiment, width, trial);
        List<TrialRecord> records = experiment.strategies().stream()
                .map(choice -> run(experiment, choice, instance, trial))
                .toList();
        return new TrialGroup(experiment.id(), width, trial, records);
    }

    /** Lets one strategy face an instance. */
    public TrialRecord run(Experiment experiment, StrategyChoice choice, Instance instance, long trial) {
        int width = instance.function().width();
        Meter meter = new Meter(experiment.queryLimit());
        RandomStream stream = seeds.stream(Address.strategy(experiment.id(), width, trial, choice.label()));
        Attempt attempt = attempt(choice, instance, meter, stream);
        Cell cell = new Cell(experiment.id(), width, choice.label());
        if (attempt instanceof Attempt.Answered answered) {
            Outcome outcome = answered.answer().equals(instance.hidden()) ? Outcome.SOLVED : Outcome.WRONG;
            return new TrialRecord(
                    cell,
                    trial,
                    instance.hidden(),
                    outcome,
                    Optional.of(answered.answer()),
                    Optional.of(answered.certificate()),
                    meter.counts(),
                    answered.usage());
        }
        return new TrialRecord(
                cell,
                trial,
                instance.hidden(),
                Outcome.CENSORED,
                Optional.empty(),
                Optional.empty(),
                meter.counts(),
                attempt.usage());
    }

    private static Attempt attempt(StrategyChoice choice, Instance instance, Meter meter, RandomStream stream) {
        Oracle oracle = new Oracle(instance.function(), meter);
        if (choice.strategy() instanceof ClassicalStrategy classical) {
            return classical.attempt(oracle, stream);
        }
        if (choice.strategy() instanceof QuantumStrategy quantum) {
            Unitary unitary = new Unitary(instance.function(), meter);
            Simulation simulation = open(choice.engine().orElseThrow(), unitary, instance);
            return quantum.attempt(simulation, oracle, stream);
        }
        throw new IllegalStateException("neither classical nor quantum: " + choice.label());
    }

    private static Simulation open(Engine engine, Unitary unitary, Instance instance) {
        if (engine instanceof BlindEngine blind) {
            return blind.open(unitary);
        }
        if (engine instanceof SightedEngine sighted) {
            return sighted.open(unitary, instance.hidden());
        }
        throw new IllegalStateException("neither blind nor sighted: " + engine.name());
    }
}
