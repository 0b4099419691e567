package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bits.Word;
import org.notchwork.law.SequentialScanLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Problem;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.classical.SequentialScan;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.support.Streams;
import org.notchwork.support.Studies;

class AllSecretsTest {

    private final Experiment experiment =
            Studies.experiment(List.of(5), List.of(Studies.classical("sequential-scan")), 1, 100);

    private CrossCheck check(ClassicalStrategy strategy, int width) {
        return new AllSecrets(Streams.tree())
                .check(
                        experiment,
                        width,
                        "main/5/x",
                        new StrategyChoice(strategy, Optional.empty()),
                        new SequentialScanLaw());
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 8})
    void theScanHasTheMeanAndTheWorstCaseOfItsLaw(int width) {
        CrossCheck check = check(new SequentialScan(), width);
        assertEquals(CheckOutcome.AGREES, check.outcome());
        assertEquals((1 << width) - 1, check.compared());
        assertEquals(check.expected(), check.observed());
    }

    /** The scan with a fault: how often it asks besides, and whether it answers something else. */
    private record Faulty(int extraQueries, boolean otherAnswer) implements ClassicalStrategy {

        @Override
        public String name() {
            return "sequential-scan";
        }

        @Override
        public String description() {
            return "a scan with a fault";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width) {
            return Optional.empty();
        }

        @Override
        public boolean deterministic() {
            return true;
        }

        @Override
        public long memoryBytes(int width, long queryLimit) {
            return 0;
        }

        @Override
        public Attempt attempt(Oracle oracle, RandomStream stream) {
            Attempt attempt = new SequentialScan().attempt(oracle, stream);
            for (int i = 0; i < extraQueries; i++) {
                oracle.query(0);
            }
            if (otherAnswer && attempt instanceof Attempt.Answered answered) {
                Word s = ((Answer.Period) answered.answer()).s();
                Word other = Word.of(s.width(), s.bits() == 1 ? 2 : 1);
                return new Attempt.Answered(new Answer.Period(other), answered.certificate(), answered.usage());
            }
            return attempt;
        }
    }

    @Test
    void aScanThatAsksOnceMoreDiffers() {
        CrossCheck check = check(new Faulty(1, false), 5);
        assertEquals(CheckOutcome.DIFFERS, check.outcome());
        assertEquals("mean 12, worst 17", check.expected());
        assertEquals("mean 13, worst 18", check.observed());
    }

    @Test
    void aScanThatAnswersOtherwiseDiffers() {
        CrossCheck check = check(new Faulty(0, true), 5);
        assertEquals(CheckOutcome.DIFFERS, check.outcome());
        assertTrue(check.observed().endsWith("; secret number 0 is not found"), check.observed());
    }

    @Test
    void theDoubleWithoutItsFaultAgrees() {
        assertEquals(CheckOutcome.AGREES, check(new Faulty(0, false), 5).outcome());
    }
}
