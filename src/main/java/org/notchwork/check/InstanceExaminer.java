package org.notchwork.check;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.AnswerText;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

/**
 * Examines one instance exhaustively: promise, hidden answer, answers given, outcome distributions of the engines.
 *
 * <p>From width 11 on the engines are compared on the first 16 instances of a width only, because a state vector of
 * both registers then takes seconds; the check says so. Immutable.
 */
public final class InstanceExaminer {

    private static final int ALL_INSTANCES_WIDTH = 10;
    static final long FIRST_INSTANCES = 16;

    private final List<Engine> engines;

    /** Creates an examiner that always compares these engines, where they apply. */
    public InstanceExaminer(List<Engine> engines) {
        this.engines = List.copyOf(engines);
    }

    /**
     * Examines an instance.
     *
     * @param experiment the experiment
     * @param instance the instance of the group's trial
     * @param group what the strategies made of it
     */
    public InstanceTally examine(Experiment experiment, Instance instance, TrialGroup group) {
        Problem problem = experiment.problem();
        ExhaustiveAnswer.Found found = ExhaustiveAnswer.search(instance.function(), problem.promise());
        String trial = "trial " + group.trial() + ": ";
        if (found instanceof ExhaustiveAnswer.Found.Broken broken) {
            if (problem.isPromiseBroken()) {
                return new InstanceTally(Comparison.agreed(), Comparison.NONE, engines(experiment, instance, group));
            }
            Comparison differed = Comparison.differed(trial + broken.why());
            return new InstanceTally(differed, differed, Comparison.NONE);
        }
        ExhaustiveAnswer.Found.Right right = (ExhaustiveAnswer.Found.Right) found;
        if (problem.isPromiseBroken()) {
            Comparison differed = Comparison.differed(trial + "the promise is said to be broken and holds");
            return new InstanceTally(differed, differed, Comparison.NONE);
        }
        Comparison hidden = right.answers().contains(instance.hidden())
                ? Comparison.agreed()
                : Comparison.differed(trial + "search finds " + texts(right.answers()) + ", another one is hidden");
        Comparison answers = hidden;
        for (TrialRecord record : group.records()) {
            // Where the promise is exact, search has one answer; the outcome says which answers it was not.
            if (record.answer().isPresent() && (isChecked(experiment, record) || record.outcome() == Outcome.SOLVED)) {
                answers = answers.plus(answer(record, right.answers()));
            }
        }
        return new InstanceTally(
                hidden,
                answers,
                engines(experiment, instance, group),
                right.accidents(),
                right.answers().size() > 1 ? List.of(group.trial()) : List.of());
    }

    /** A strategy that may err by design is held to its outcome, not to being right. */
    private static boolean isChecked(Experiment experiment, TrialRecord record) {
        return experiment
                .choice(record.cell().label())
                .map(c -> !mayErr(experiment.problem(), c))
                .orElse(true);
    }

    private static boolean mayErr(Problem problem, StrategyChoice choice) {
        return choice.strategy().mayErr()
                || choice.successLaw(problem).isPresent()
                || !choice.noise().isNone()
                || !problem.promise().isExact();
    }

    private static String texts(List<Answer> answers) {
        return answers.stream().map(InstanceExaminer::text).collect(Collectors.joining(" and "));
    }

    private static String text(Answer answer) {
        return answer instanceof Answer.Period period ? "period " + period.s().value() : AnswerText.of(answer);
    }

    private static Comparison answer(TrialRecord record, List<Answer> searched) {
        return record.answer().filter(searched::contains).isPresent()
                ? Comparison.agreed()
                : Comparison.differed(
                        "trial " + record.trial() + ": " + record.cell().label() + " answers otherwise");
    }

    /** Returns whether the engines are compared on the first instances of a cell only. */
    static boolean samplesEngines(Experiment experiment, int width) {
        return width > ALL_INSTANCES_WIDTH && experiment.trials() > FIRST_INSTANCES;
    }

    private Comparison engines(Experiment experiment, Instance instance, TrialGroup group) {
        int width = instance.function().width();
        if (width > ALL_INSTANCES_WIDTH && group.trial() >= FIRST_INSTANCES) {
            return Comparison.NONE;
        }
        Comparison comparison = Comparison.NONE;
        for (Circuit circuit : circuits(experiment)) {
            comparison = comparison.plus(engines(experiment, instance, group.trial(), circuit));
        }
        return comparison;
    }

    /** Returns the circuits that the strategies of an experiment run. */
    private static List<Circuit> circuits(Experiment experiment) {
        return Arrays.stream(Circuit.values())
                .filter(circuit -> experiment.strategies().stream()
                        .anyMatch(c -> c.strategy() instanceof QuantumStrategy q && q.circuit() == circuit))
                .toList();
    }

    private Comparison engines(Experiment experiment, Instance instance, long trial, Circuit circuit) {
        Comparison comparison = Comparison.NONE;
        for (Engine engine : compared(experiment)) {
            if (engine.refusal(experiment.problem(), instance.function().width(), circuit)
                    .isEmpty()) {
                long wrong = wrongWords(experiment, instance, engine, circuit);
                comparison = comparison.plus(
                        wrong == 0
                                ? Comparison.agreed()
                                : Comparison.differed(
                                        "trial " + trial + ": " + engine.name() + " differs on " + wrong + " words"));
            }
        }
        return comparison;
    }

    private static long wrongWords(Experiment experiment, Instance instance, Engine engine, Circuit circuit) {
        Simulation simulation = open(engine, instance);
        if (circuit == Circuit.PHASE) {
            return simulation.phaseOutcomes().differences(CircuitWeights.phase(instance.function()));
        }
        boolean exactPeriod = instance.hidden() instanceof Answer.Period
                && experiment.problem().promise().isExact();
        if (circuit == Circuit.FOURIER && exactPeriod) {
            return wrongWords(simulation.outcomes(), period(instance));
        }
        if (circuit == Circuit.FOURIER) {
            return simulation.outcomes().differences(CircuitWeights.fourier(instance.function()));
        }
        return wrongAmplified(simulation, instance);
    }

    private static long period(Instance instance) {
        return ((Answer.Period) instance.hidden()).s().bits();
    }

    /** Three tests: the period, which accepts nothing, and two words that are not the period and split in half. */
    private static long wrongAmplified(Simulation simulation, Instance instance) {
        long period = period(instance);
        long wrong = 0;
        for (long test : new long[] {period, period == 1 ? 2 : 1, period == 3 ? 2 : 3}) {
            Outcomes outcomes = simulation.amplifiedOutcomes(test);
            long accepted = test == period ? outcomes.size() / 2 : outcomes.size() / 4;
            for (int y = 0; y < outcomes.size(); y++) {
                boolean possible =
                        (Long.bitCount(y & period) & 1) == 0 && (test == period || (Long.bitCount(y & test) & 1) == 1);
                long expected = possible ? outcomes.total() : 0;
                wrong += Math.multiplyExact(outcomes.weight(y), accepted) == expected ? 0 : 1;
            }
        }
        return wrong;
    }

    /** The engines that are always compared, then those that the experiment names besides. */
    private List<Engine> compared(Experiment experiment) {
        List<Engine> compared = new ArrayList<>(engines);
        experiment.strategies().stream()
                .flatMap(choice -> choice.engine().stream())
                .filter(engine -> compared.stream().noneMatch(c -> c.name().equals(engine.name())))
                .forEach(compared::add);
        return compared;
    }

    private static Simulation open(Engine engine, Instance instance) {
        Unitary unitary = new Unitary(instance.function(), new Meter(1));
        if (engine instanceof SightedEngine sighted) {
            return sighted.open(unitary, instance.hidden());
        }
        return ((BlindEngine) engine).open(unitary);
    }

    /** Returns how many words do not have probability 2^(1−n) if orthogonal to the period and 0 if not. */
    static long wrongWords(Outcomes outcomes, long period) {
        long wrong = 0;
        long half = outcomes.size() / 2;
        for (int y = 0; y < outcomes.size(); y++) {
            boolean orthogonal = (Long.bitCount(y & period) & 1) == 0;
            long expected = orthogonal ? outcomes.total() : 0;
            if (Math.multiplyExact(outcomes.weight(y), half) != expected) {
                wrong++;
            }
        }
        return wrong;
    }
}
