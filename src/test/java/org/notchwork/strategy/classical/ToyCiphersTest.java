package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.cipher.EvenMansour;
import org.notchwork.problem.cipher.FeistelThree;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.strategy.Attempt;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** The strategies that verify their candidates, on toys of ciphers. */
class ToyCiphersTest {

    private static Facing counting(Problem problem, int width, long number) {
        Instance instance = problem.draw(width, Streams.numbered(problem.kind() + " " + width, number));
        return Facing.classical(
                new CollisionCounting(), instance, problem.promise(), Streams.numbered("counting " + width, number));
    }

    /** Labels never collide by accident there: the first collision, E queries, and four that verify it. */
    @ParameterizedTest
    @ValueSource(ints = {4, 6, 8, 10})
    void onExactPeriodsFourQueriesAreAddedToTheFirstCollision(int width) throws Exception {
        Sample sample = new Sample();
        for (long number = 0; number < 3000; number++) {
            sample.add(counting(new XorPeriod(Labelling.TABLE), width, number)
                    .assertProved()
                    .counts()
                    .queries());
        }
        for (JsonNode row : CheckValues.section("B").required("table")) {
            if (row.required("n").asInt() == width) {
                sample.assertMean(
                        Double.parseDouble(row.required("mean_without").asString()) + 4, 5);
                return;
            }
        }
        throw new AssertionError("no row of width " + width);
    }

    /** An injective function is told after min(2^n, 4 · 2^⌈n/2⌉) points exactly. */
    @ParameterizedTest
    @CsvSource({"2, 4", "4, 16", "5, 32", "6, 32", "7, 64", "8, 64", "10, 128"})
    void withoutAPeriodPatienceEndsTheSearch(int width, long points) {
        PeriodOrNone problem = new PeriodOrNone(Labelling.TABLE);
        Instance instance = problem.drawHiding(new Answer.NoPeriod(), width, Streams.numbered("none", width));
        Facing facing = Facing.classical(
                        new CollisionCounting(), instance, problem.promise(), Streams.numbered("patience", width))
                .assertProved();
        assertEquals(points, facing.counts().total());
    }

    /**
     * A right answer is missed only where all points of the patience miss the period, below e^−8 a trial, or a wrong
     * candidate passes: at most (accidental pairs)/2 candidates, each passing with probability (N(d)/2^n)².
     */
    @Test
    void theKeyOfEvenMansourIsFoundAndEachCallCountsTwice() {
        Sample right = new Sample();
        for (long number = 0; number < 600; number++) {
            Facing facing = counting(new EvenMansour(), 10, number);
            right.add(facing.isSolved());
            assertEquals(2, facing.byFunction().size());
            assertEquals(facing.byFunction().get(0), facing.byFunction().get(1));
            assertTrue(facing.attempt() instanceof Attempt.Answered);
        }
        assertTrue(right.mean() >= 0.99, "rate " + right.mean());
    }

    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void feistelFunctionsAreToldFromRandomOnes(boolean hasPermutations) {
        FeistelThree problem = new FeistelThree(hasPermutations);
        Sample right = new Sample();
        Sample none = new Sample();
        for (long number = 0; number < 600; number++) {
            Facing facing = counting(problem, 9, number);
            right.add(facing.isSolved());
            none.add(facing.instance().hidden() instanceof Answer.NoPeriod);
        }
        assertTrue(right.mean() >= 0.98, "rate " + right.mean());
        none.assertRate(0.5, 5);
    }

    /**
     * Each y hits one of 2D points of 2^n, so that 2^n/D evaluations of the permutation are needed on the mean; candidates
     * that fail add 4 at most for each of the D/2^n accidental matches of a y, times two for sums that come in pairs.
     */
    @ParameterizedTest
    @CsvSource({"10, 2", "10, 3", "10, 4", "12, 4"})
    void dataTimesTimeIsTheNumberOfKeys(int width, int dataBits) {
        DataTimeTradeoff strategy = new DataTimeTradeoff(Optional.of(dataBits));
        EvenMansour problem = new EvenMansour();
        long pairs = 1L << dataBits;
        Sample time = new Sample();
        Sample right = new Sample();
        for (long number = 0; number < 1500; number++) {
            Instance instance = problem.draw(width, Streams.numbered("tradeoff " + width, number));
            Facing facing = Facing.classical(
                    strategy, instance, problem.promise(), Streams.numbered("time " + width + dataBits, number));
            right.add(facing.isSolved());
            assertEquals(2 * pairs, facing.byFunction().get(0).queries());
            assertEquals(2, facing.byFunction().get(0).confirming());
            time.add(facing.byFunction().get(1).queries());
        }
        assertTrue(right.mean() >= 0.995, "rate " + right.mean());
        double expected = (1L << width) / (double) pairs;
        double more = 1 + 8.0 * (double) pairs / (double) (1L << width);
        double least = expected - 5 * time.error();
        // Two of D plaintexts with one sum count as one: D/2^(n + 1) of them, doubled for safety.
        double most = (expected * more + 8) * (1 + (double) pairs / (double) (1L << width)) + 5 * time.error();
        assertTrue(time.mean() >= least && time.mean() <= most, time.mean() + " not in " + least + " to " + most);
    }

    @Test
    void withoutASettingHalfOfTheBitsAreData() {
        EvenMansour problem = new EvenMansour();
        for (long number = 0; number < 300; number++) {
            Instance instance = problem.draw(8, Streams.numbered("tradeoff", number));
            Facing facing = Facing.classical(
                    new DataTimeTradeoff(Optional.empty()),
                    instance,
                    problem.promise(),
                    Streams.numbered("time", number));
            assertEquals(32, facing.byFunction().get(0).queries());
        }
    }

    @Test
    void limitsAreKeptByBothStrategies() {
        EvenMansour problem = new EvenMansour();
        Instance instance = problem.draw(6, Streams.named("limit"));
        for (long limit = 2; limit < 120; limit++) {
            Facing cut = Facing.classical(
                    new DataTimeTradeoff(Optional.of(2)), instance, problem.promise(), limit, Streams.named("cut"));
            assertTrue(cut.counts().total() <= limit);
            Facing counted =
                    Facing.classical(new CollisionCounting(), instance, problem.promise(), limit, Streams.named("cut"));
            assertTrue(counted.counts().total() <= limit);
        }
    }
}
