package org.notchwork.trial;

import java.util.List;
import java.util.Optional;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Engine;
import org.notchwork.engine.NoisySimulation;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
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
import org.notchwork.study.Study;

/** Runs single trials. Immutable; what it returns depends on the study alone. */
public final class TrialRunner {

    private final Study study;
    private final SeedTree seeds;

    /** Creates a runner that takes all its chance from the study's seed. */
    public TrialRunner(Study study) {
        this.study = study;
        this.seeds = new SeedTree(study.seed());
    }

    /** Draws the instance of a trial, the same for every strategy. */
    public Instance instance(Experiment experiment, int width, long trial) {
        return experiment.problem().draw(width, seeds.stream(Address.instance(experiment.id(), width, trial)));
    }

    /** Draws what the controls of a trial face, the same for every strategy. */
    public Instance control(Experiment experiment, int width, long trial) {
        return experiment.problem().control(width, seeds.stream(Address.control(experiment.id(), width, trial)));
    }

    /** Lets every strategy of an experiment face one instance, and those with a control the control's. */
    public TrialGroup run(Experiment experiment, int width, long trial) {
        Instance instance = instance(experiment, width, trial);
        List<TrialRecord> records = experiment.strategies().stream()
                .map(choice -> run(experiment, choice, instance, trial))
                .toList();
        return new TrialGroup(
                experiment.id(), width, trial, records, controls(experiment, width, trial, instance.hidden()));
    }

    /** Lets every strategy that has a control at a width face what the controls of a trial face. */
    public List<ControlRecord> controls(Experiment experiment, int width, long trial, Answer secret) {
        List<StrategyChoice> choices = study.controls(experiment, width);
        if (choices.isEmpty()) {
            return List.of();
        }
        Instance instance = control(experiment, width, trial);
        return choices.stream()
                .map(choice -> control(experiment, choice, instance, trial, secret))
                .toList();
    }

    /** Lets one strategy face an instance. */
    public TrialRecord run(Experiment experiment, StrategyChoice choice, Instance instance, long trial) {
        int width = instance.function().width();
        Meter meter = new Meter(experiment.queryLimit(), instance.counters());
        RandomStream stream = seeds.stream(Address.strategy(experiment.id(), width, trial, choice.label()));
        Attempt attempt = attempt(experiment, choice, instance, instance.hidden(), meter, stream);
        Cell cell = new Cell(experiment.id(), width, choice.label());
        List<Counts> byFunction = instance.parts().isEmpty() ? List.of() : meter.byFunction();
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
                    byFunction,
                    answered.usage());
        }
        return new TrialRecord(
                cell,
                trial,
                instance.hidden(),
                attempt instanceof Attempt.Censored ? Outcome.CENSORED : Outcome.UNANSWERED,
                Optional.empty(),
                Optional.empty(),
                meter.counts(),
                byFunction,
                attempt.usage());
    }

    /**
     * Lets one strategy face an instance that hides nothing. A sighted engine is told what the trial hides all the same:
     * that is what the control is to show.
     */
    public ControlRecord control(
            Experiment experiment, StrategyChoice choice, Instance instance, long trial, Answer secret) {
        int width = instance.function().width();
        Meter meter = new Meter(experiment.queryLimit(), instance.counters());
        RandomStream stream = seeds.stream(Address.control(experiment.id(), width, trial, choice.label()));
        Attempt attempt = attempt(experiment, choice, instance, secret, meter, stream);
        Cell cell = new Cell(experiment.id(), width, choice.label());
        if (attempt instanceof Attempt.Answered answered) {
            return new ControlRecord(
                    cell,
                    trial,
                    secret,
                    outcome(instance, answered, secret),
                    Optional.of(answered.answer()),
                    Optional.of(answered.certificate()),
                    meter.counts());
        }
        return new ControlRecord(
                cell, trial, secret, ControlOutcome.NOTHING, Optional.empty(), Optional.empty(), meter.counts());
    }

    private static ControlOutcome outcome(Instance instance, Attempt.Answered answered, Answer secret) {
        return outcome(instance, answered.answer(), answered.certificate(), secret);
    }

    /** Returns what an answer in a control amounts to. */
    public static ControlOutcome outcome(Instance instance, Answer answer, Certificate certificate, Answer secret) {
        if (answer instanceof Answer.NoPeriod) {
            return ControlOutcome.NOTHING;
        }
        if (answer.equals(secret)) {
            return ControlOutcome.SECRET;
        }
        return CertificateCheck.check(instance.function(), answer, certificate).isEmpty()
                ? ControlOutcome.CLAIMED
                : ControlOutcome.FAILED;
    }

    private static Attempt attempt(
            Experiment experiment,
            StrategyChoice choice,
            Instance instance,
            Answer told,
            Meter meter,
            RandomStream stream) {
        Oracle oracle = new Oracle(instance.function(), experiment.problem().promise(), meter, instance.parts());
        if (choice.strategy() instanceof ClassicalStrategy classical) {
            return classical.attempt(oracle, stream);
        }
        if (choice.strategy() instanceof QuantumStrategy quantum) {
            Unitary unitary = new Unitary(instance.function(), meter);
            Simulation simulation = open(choice.engine().orElseThrow(), unitary, told);
            if (!choice.noise().isNone()) {
                simulation = new NoisySimulation(simulation, unitary.width(), choice.noise());
            }
            return quantum.attempt(simulation, oracle, stream);
        }
        throw new IllegalStateException("neither classical nor quantum: " + choice.label());
    }

    private static Simulation open(Engine engine, Unitary unitary, Answer told) {
        if (engine instanceof BlindEngine blind) {
            return blind.open(unitary);
        }
        if (engine instanceof SightedEngine sighted) {
            return sighted.open(unitary, told);
        }
        throw new IllegalStateException("neither blind nor sighted: " + engine.name());
    }
}
