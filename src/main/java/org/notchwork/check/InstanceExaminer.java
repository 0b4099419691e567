package org.notchwork.check;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.bits.Word;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Unitary;
import org.notchwork.study.Experiment;
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
        ExhaustiveSearch.Found found = ExhaustiveSearch.search(instance.function());
        if (found instanceof ExhaustiveSearch.Found.Broken broken) {
            Comparison differed = Comparison.differed(
                    "trial " + group.trial() + ": inputs " + broken.x() + " and " + broken.y() + ": " + broken.why());
            return new InstanceTally(differed, differed, Comparison.NONE);
        }
        long period = ((ExhaustiveSearch.Found.Period) found).s();
        Answer searched = new Answer.Period(Word.of(group.width(), period));
        Comparison hidden = searched.equals(instance.hidden())
                ? Comparison.agreed()
                : Comparison.differed(
                        "trial " + group.trial() + ": search finds period " + period + ", another one is hidden");
        Comparison answers = hidden;
        for (TrialRecord record : group.records()) {
            if (record.answer().isPresent()) {
                answers = answers.plus(answer(record, searched));
            }
        }
        return new InstanceTally(hidden, answers, engines(experiment, instance, group.trial(), period));
    }

    private static Comparison answer(TrialRecord record, Answer searched) {
        return record.answer().filter(searched::equals).isPresent()
                ? Comparison.agreed()
                : Comparison.differed(
                        "trial " + record.trial() + ": " + record.cell().label() + " answers otherwise");
    }

    /** Returns whether the engines are compared on the first instances of a cell only. */
    static boolean samplesEngines(Experiment experiment, int width) {
        return width > ALL_INSTANCES_WIDTH && experiment.trials() > FIRST_INSTANCES;
    }

    private Comparison engines(Experiment experiment, Instance instance, long trial, long period) {
        int width = instance.function().width();
        boolean quantum =
                experiment.strategies().stream().anyMatch(s -> s.engine().isPresent());
        if (!quantum || (width > ALL_INSTANCES_WIDTH && trial >= FIRST_INSTANCES)) {
            return Comparison.NONE;
        }
        Comparison comparison = Comparison.NONE;
        for (Engine engine : compared(experiment)) {
            if (engine.refusal(experiment.problem(), width).isEmpty()) {
                long wrong = wrongWords(open(engine, instance).outcomes(), period);
                comparison = comparison.plus(
                        wrong == 0
                                ? Comparison.agreed()
                                : Comparison.differed(
                                        "trial " + trial + ": " + engine.name() + " differs on " + wrong + " words"));
            }
        }
        return comparison;
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
