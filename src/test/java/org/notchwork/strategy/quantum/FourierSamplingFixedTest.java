package org.notchwork.strategy.quantum;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.engine.Noise;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.quantum.decoder.Elimination;
import org.notchwork.strategy.quantum.decoder.Likelihood;
import org.notchwork.strategy.quantum.decoder.PooledElimination;
import org.notchwork.support.Facing;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;

/** Check values, section F. */
class FourierSamplingFixedTest {

    private static FourierSamplingFixed of(int rounds) {
        return new FourierSamplingFixed(new Rounds(false, rounds), new Elimination());
    }

    private static Facing facing(FourierSamplingFixed strategy, Problem problem, Instance instance, long number) {
        return Facing.quantum(
                strategy,
                new FibreEngine(),
                instance,
                problem.promise(),
                Streams.numbered(strategy.rounds().text() + instance.function().width(), number));
    }

    /** ∏ (1 − 2^(i−m)), i = 0 … n − 2; where the rank is short there is no answer, never a wrong one. */
    @ParameterizedTest
    @CsvSource({"2, 1", "2, 3", "3, 2", "4, 3", "4, 4", "4, 6", "6, 5", "6, 7", "8, 7", "8, 8", "8, 12", "5, 2"})
    void eliminationSucceedsAsOftenAsTheLawSays(int width, int rounds) {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        Sample right = new Sample();
        for (long number = 0; number < 4000; number++) {
            Instance instance = problem.draw(width, Streams.numbered("fixed " + width, number));
            Facing facing = facing(of(rounds), problem, instance, number);
            right.add(facing.isSolved());
            if (facing.isSolved()) {
                facing.assertProved();
                assertEquals(new Counts(0, rounds, 0, 2), facing.counts());
            } else {
                assertInstanceOf(Attempt.Unanswered.class, facing.attempt());
                assertEquals(new Counts(0, rounds, 0, 0), facing.counts());
            }
        }
        right.assertRate(full(width - 1, rounds), 5);
    }

    private static double full(int rank, int rounds) {
        double product = 1;
        for (int i = 0; i < rank; i++) {
            product *= Math.max(0, 1 - Math.pow(2, i - rounds));
        }
        return product;
    }

    /** Rank n says that there is no period: with probability ∏ (1 − 2^(i−m)), i = 0 … n − 1, and never wrongly. */
    @ParameterizedTest
    @CsvSource({"2, 2", "3, 3", "3, 5", "4, 4", "4, 6", "8, 8", "8, 9", "4, 3"})
    void aFunctionWithAPeriodIsNeverCalledInjective(int width, int rounds) {
        PeriodOrNone problem = new PeriodOrNone(Labelling.TABLE);
        Sample none = new Sample();
        Sample with = new Sample();
        for (long number = 0; number < 4000; number++) {
            Instance instance = problem.draw(width, Streams.numbered("decide " + width, number));
            Facing facing = facing(of(rounds), problem, instance, number);
            boolean saysNone = facing.attempt() instanceof Attempt.Answered answered
                    && answered.answer() instanceof Answer.NoPeriod;
            if (instance.hidden() instanceof Answer.NoPeriod) {
                none.add(saysNone);
            } else {
                assertTrue(!saysNone, "trial " + number);
                with.add(facing.isSolved());
            }
            if (facing.isSolved()) {
                facing.assertProved();
            }
        }
        none.assertRate(full(width, rounds), 5);
        with.assertRate(full(width - 1, rounds), 5);
    }

    @Test
    void roundsAreCountedFromTheWidthOrGiven() {
        assertEquals(12, new Rounds(true, 5).at(8));
        assertEquals(5, new Rounds(false, 5).at(8));
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        Instance instance = problem.draw(6, Streams.named("extra"));
        FourierSamplingFixed extra = new FourierSamplingFixed(new Rounds(true, 9), new Elimination());
        assertEquals(14, facing(extra, problem, instance, 0).counts().quantum());
    }

    @Test
    void whereThereMayBeNoPeriodOnlyEliminationDecides() {
        PeriodOrNone problem = new PeriodOrNone(Labelling.TABLE);
        assertTrue(of(5).refusal(problem, 5).isEmpty());
        assertTrue(new FourierSamplingFixed(new Rounds(false, 5), new PooledElimination(10))
                .refusal(problem, 5)
                .isPresent());
        assertTrue(new FourierSamplingFixed(new Rounds(false, 5), new Likelihood(Noise.NONE))
                .refusal(new XorPeriod(Labelling.PERMUTATION), 21)
                .orElseThrow()
                .contains("reaches width 20, not 21"));
    }
}
