package org.notchwork.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.notchwork.problem.Answer;
import org.notchwork.study.Experiment;
import org.notchwork.support.Studies;

class TrialRunnerTest {

    private final Experiment experiment = Studies.experiment(List.of(6), Studies.allChoices(), 10, 1000);

    @Test
    void aTrialIsTheSameWheneverItIsRun() {
        for (long trial = 0; trial < 10; trial++) {
            assertEquals(
                    Studies.runner().run(experiment, 6, trial), Studies.runner().run(experiment, 6, trial));
        }
    }

    @Test
    void allStrategiesOfATrialFaceOneInstance() {
        for (TrialGroup group : Studies.run(experiment)) {
            Set<Answer> hidden = new HashSet<>();
            group.records().forEach(r -> hidden.add(r.hidden()));
            assertEquals(1, hidden.size());
            assertEquals(
                    experiment.cells(),
                    group.records().stream().map(TrialRecord::cell).toList());
        }
    }

    @Test
    void aStrategyDoesTheSameWhoeverStandsBesideIt() {
        Experiment alone = Studies.experiment(List.of(6), List.of(Studies.classical("random-draws")), 10, 1000);
        for (long trial = 0; trial < 10; trial++) {
            TrialRecord apart = Studies.runner().run(alone, 6, trial).records().get(0);
            TrialRecord beside =
                    Studies.runner().run(experiment, 6, trial).records().get(1);
            assertEquals(apart, beside);
        }
    }

    @Test
    void differentTrialsHaveDifferentInstances() {
        Set<Optional<Answer>> answers = new HashSet<>();
        for (TrialGroup group : Studies.run(experiment)) {
            answers.add(group.records().get(0).answer());
        }
        assertNotEquals(1, answers.size());
    }

    @Test
    void aRecordHasAnAnswerExactlyIfItIsNotCensored() {
        TrialRecord r = Studies.runner().run(experiment, 6, 0).records().get(0);
        assertThrows(
                IllegalArgumentException.class,
                () -> new TrialRecord(
                        r.cell(), 0, r.hidden(), Outcome.CENSORED, r.answer(), r.certificate(), r.counts(), r.usage()));
        assertThrows(
                IllegalArgumentException.class,
                () -> new TrialRecord(
                        r.cell(),
                        0,
                        r.hidden(),
                        Outcome.SOLVED,
                        Optional.empty(),
                        r.certificate(),
                        r.counts(),
                        r.usage()));
    }
}
