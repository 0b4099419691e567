package org.notchwork.strategy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.support.Studies;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

class CensoringTest {

    static List<StrategyChoice> choices() {
        return Studies.allChoices();
    }

    private static TrialRecord run(StrategyChoice choice, int width, long trial, long limit) {
        Experiment experiment = Studies.experiment(List.of(width), List.of(choice), 1, limit);
        Instance instance = Studies.runner().instance(experiment, width, trial);
        return Studies.runner().run(experiment, choice, instance, trial);
    }

    @ParameterizedTest
    @MethodSource("choices")
    void everyLimitBelowTheNeedCensorsAndEveryOtherDoesNot(StrategyChoice choice) {
        for (int width : List.of(2, 3, 5, 6)) {
            for (long trial = 0; trial < 5; trial++) {
                TrialRecord free = run(choice, width, trial, 1000);
                assertEquals(Outcome.SOLVED, free.outcome());
                Counts needed = free.counts();
                for (long limit = 1; limit < needed.total(); limit++) {
                    TrialRecord cut = run(choice, width, trial, limit);
                    assertEquals(Outcome.CENSORED, cut.outcome());
                    assertEquals(Math.min(limit, needed.queries()), cut.counts().queries());
                    assertEquals(0, cut.counts().confirming());
                }
                for (long limit = needed.total(); limit < needed.total() + 3; limit++) {
                    assertEquals(free, run(choice, width, trial, limit));
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("choices")
    void everyAnswerIsRightAndItsCertificateProvesIt(StrategyChoice choice) {
        Experiment experiment = Studies.experiment(List.of(2, 3, 4, 7, 9), List.of(choice), 20, 1000);
        for (int width : experiment.widths()) {
            for (long trial = 0; trial < experiment.trials(); trial++) {
                Instance instance = Studies.runner().instance(experiment, width, trial);
                TrialRecord record = Studies.runner().run(experiment, choice, instance, trial);
                assertEquals(Outcome.SOLVED, record.outcome());
                assertEquals(Optional.of(instance.hidden()), record.answer());
                assertEquals(
                        Optional.empty(),
                        CertificateCheck.check(
                                instance.function(),
                                record.answer().orElseThrow(),
                                record.certificate().orElseThrow()));
            }
        }
    }

    @ParameterizedTest
    @MethodSource("choices")
    void aQuantumStrategyUsesTheUnitaryAndAClassicalOneTheFunction(StrategyChoice choice) {
        TrialRecord record = run(choice, 6, 0, 1000);
        boolean quantum = choice.engine().isPresent();
        assertEquals(quantum, record.counts().quantum() > 0);
        assertEquals(!quantum, record.counts().classical() > 0);
        assertEquals(quantum ? 2 : 0, record.counts().confirming());
        assertEquals(quantum ? record.counts().quantum() : 0, record.usage().equations());
        assertTrue(record.usage().memoryWords() > 0);
    }
}
