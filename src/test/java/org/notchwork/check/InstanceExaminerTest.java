package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Simulation;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.support.Given;
import org.notchwork.support.Studies;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

class InstanceExaminerTest {

    private static final int WIDTH = 4;

    private final Experiment experiment = Studies.experiment(List.of(WIDTH), Studies.allChoices(), 3, 100);
    private final Instance instance = Studies.runner().instance(experiment, WIDTH, 0);
    private final TrialGroup group = Studies.runner().run(experiment, WIDTH, 0);
    private final InstanceExaminer examiner = new InstanceExaminer(Engines.reference());

    @Test
    void anHonestInstanceAgreesInAllThatIsCompared() {
        InstanceTally tally = examiner.examine(experiment, instance, group);
        assertEquals(new Comparison(1, 0, Optional.empty()), tally.promise());
        assertEquals(new Comparison(1L + group.records().size(), 0, Optional.empty()), tally.answers());
        assertEquals(new Comparison(3, 0, Optional.empty()), tally.engines());
    }

    @Test
    void aFunctionThatBreaksThePromiseDiffers() {
        long other = instance.function().at(3) ^ 1;
        Instance broken = new Instance(Given.changed(instance.function(), 3, other), instance.hidden());
        InstanceTally tally = examiner.examine(experiment, broken, group);
        assertEquals(CheckOutcome.DIFFERS, tally.promise().outcome());
        assertEquals(CheckOutcome.DIFFERS, tally.answers().outcome());
        assertTrue(tally.promise().first().orElseThrow().startsWith("trial 0: inputs "));
    }

    @Test
    void anotherHiddenAnswerThanTheFunctionHasDiffers() {
        long s = ((Answer.Period) instance.hidden()).s().bits();
        Answer other = new Answer.Period(Word.of(WIDTH, s == 1 ? 2 : 1));
        InstanceTally tally = examiner.examine(experiment, new Instance(instance.function(), other), emptied(group));
        assertEquals(CheckOutcome.DIFFERS, tally.promise().outcome());
        assertEquals(CheckOutcome.DIFFERS, tally.answers().outcome());
    }

    private static TrialGroup emptied(TrialGroup group) {
        return new TrialGroup(group.experiment(), group.width(), group.trial(), List.of());
    }

    @Test
    void aWrongAnswerDiffers() {
        TrialRecord right = group.records().get(1);
        long s = ((Answer.Period) instance.hidden()).s().bits();
        TrialRecord wrong = new TrialRecord(
                right.cell(),
                right.trial(),
                right.hidden(),
                Outcome.WRONG,
                Optional.of(new Answer.Period(Word.of(WIDTH, s == 1 ? 2 : 1))),
                right.certificate(),
                right.counts(),
                right.usage());
        TrialGroup faulty =
                new TrialGroup("main", WIDTH, 0, List.of(group.records().get(0), wrong));
        InstanceTally tally = examiner.examine(experiment, instance, faulty);
        assertEquals(CheckOutcome.AGREES, tally.promise().outcome());
        assertEquals(new Comparison(3, 1, Optional.of("trial 0: random-draws answers otherwise")), tally.answers());
    }

    /** An engine that samples from all words alike. */
    private static final class Uniform implements BlindEngine {

        @Override
        public String name() {
            return "uniform";
        }

        @Override
        public String description() {
            return "samples from all words alike";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
            return Optional.empty();
        }

        @Override
        public long memoryBytes(int width) {
            return 0;
        }

        @Override
        public Simulation open(Unitary unitary) {
            return new Simulation() {
                @Override
                public long fourierSample(RandomStream stream) {
                    unitary.use();
                    return stream.bits(unitary.width());
                }

                @Override
                public Outcomes outcomes() {
                    long[] weights = new long[1 << unitary.width()];
                    Arrays.fill(weights, 1);
                    return new Outcomes(weights);
                }
            };
        }
    }

    /** The two engines given, and the two more that the experiment names. */
    @Test
    void anEngineWithOtherOutcomesDiffers() {
        List<Engine> engines = List.of(new FibreEngine(), new Uniform());
        InstanceTally tally = new InstanceExaminer(engines).examine(experiment, instance, group);
        assertEquals(new Comparison(4, 1, Optional.of("trial 0: uniform differs on 16 words")), tally.engines());
    }

    @Test
    void wordsAreComparedWithTheirExactProbability() {
        assertEquals(0, InstanceExaminer.wrongWords(new Outcomes(new long[] {3, 0, 3, 0}), 1));
        assertEquals(2, InstanceExaminer.wrongWords(new Outcomes(new long[] {2, 0, 4, 0}), 1));
        assertEquals(4, InstanceExaminer.wrongWords(new Outcomes(new long[] {0, 3, 0, 3}), 1));
        assertEquals(2, InstanceExaminer.wrongWords(new Outcomes(new long[] {3, 0, 3, 0}), 2));
    }

    @Test
    void withoutAQuantumStrategyNoEngineIsCompared() {
        Experiment classical = Studies.experiment(List.of(WIDTH), List.of(Studies.classical("random-draws")), 1, 100);
        InstanceTally tally = examiner.examine(
                classical,
                Studies.runner().instance(classical, WIDTH, 0),
                Studies.runner().run(classical, WIDTH, 0));
        assertEquals(CheckOutcome.NOT_COMPARABLE, tally.engines().outcome());
        assertEquals(CheckOutcome.AGREES, tally.answers().outcome());
    }

    /**
     * Strategies that err by design are held to their outcome: an honest wrong answer agrees, one that is called right does
     * not.
     */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            "kind": "constant-or-balanced"                     | "name": "balance-sampling", "queries": 2
            "kind": "xor-period-or-none", "instances": "table" | "name": "fourier-sampling-fixed", "engine": "fibre", "rounds": 4
            "kind": "xor-period", "instances": "table" | "name": "fourier-sampling-fixed", "engine": "fibre", "rounds": 4, "decoder": "likelihood"
            """)
    void anHonestErrorAgreesAndOneCalledRightDiffers(String problem, String strategy) {
        Study study = org.notchwork.Studies.of("""
                { "format": "notchwork-study/2", "title": "Errors", "question": "Who errs?",
                  "seed": "a seed of the study of errors", "cross-check-width": 4,
                  "experiments": [ { "id": "e", "problem": { %s }, "widths": [4], "strategies": [ { %s } ],
                    "trials": 60, "query-limit": 100 } ], "claims": [] }
                """.formatted(problem.strip(), strategy.strip()));
        Experiment erring = study.experiments().get(0);
        TrialRunner runner = new TrialRunner(study);
        int errors = 0;
        for (long trial = 0; trial < erring.trials(); trial++) {
            Instance drawn = runner.instance(erring, WIDTH, trial);
            TrialGroup honest = runner.run(erring, WIDTH, trial);
            assertEquals(
                    CheckOutcome.AGREES,
                    examiner.examine(erring, drawn, honest).answers().outcome());
            TrialRecord record = honest.records().get(0);
            if (record.outcome() == Outcome.WRONG) {
                errors++;
                TrialRecord called = new TrialRecord(
                        record.cell(),
                        record.trial(),
                        record.hidden(),
                        Outcome.SOLVED,
                        record.answer(),
                        record.certificate(),
                        record.counts(),
                        record.usage());
                assertEquals(
                        CheckOutcome.DIFFERS,
                        examiner.examine(erring, drawn, new TrialGroup("e", WIDTH, trial, List.of(called)))
                                .answers()
                                .outcome());
            }
        }
        assertTrue(errors > 0, "nothing went wrong");
    }
}
