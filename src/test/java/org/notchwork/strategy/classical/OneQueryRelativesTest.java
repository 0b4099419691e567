package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.affine.AffinePeriod;
import org.notchwork.problem.balance.ConstantOrBalanced;
import org.notchwork.problem.mask.InnerProduct;
import org.notchwork.strategy.Attempt;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Fractions;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** The classical strategies for inner products, constant or balanced functions and affine ones (check values, section I). */
class OneQueryRelativesTest {

    private static final ConstantOrBalanced BALANCE = new ConstantOrBalanced();

    private static Instance balance(boolean isBalanced, int width, long number) {
        return BALANCE.drawHiding(
                new Answer.Balance(isBalanced),
                width,
                Streams.numbered((isBalanced ? "balanced " : "constant ") + width, number));
    }

    @ParameterizedTest
    @CsvSource({"1, false", "3, false", "6, false", "1, true", "3, true", "6, true"})
    void unitVectorsReadEveryMaskInAsManyQueries(int width, boolean hasConstant) {
        InnerProduct problem = new InnerProduct(hasConstant);
        for (int repeat = 0; repeat < 4; repeat++) {
            for (Answer hidden : problem.answers(width)) {
                Instance instance = problem.drawHiding(hidden, width, Streams.numbered("mask", repeat));
                Facing facing = Facing.classical(
                                new UnitVectors(), instance, problem.promise(), Streams.named("unit vectors"))
                        .assertProved();
                assertEquals(new Counts(hasConstant ? width + 1 : width, 0, 0, 0), facing.counts());
            }
        }
    }

    @Test
    void unitVectorsAreCutByEveryLimitBelowTheirNumber() {
        InnerProduct problem = new InnerProduct(true);
        Instance instance = problem.draw(5, Streams.named("mask"));
        for (long limit = 1; limit <= 6; limit++) {
            Facing facing = Facing.classical(
                    new UnitVectors(), instance, problem.promise(), limit, Streams.named("unit vectors"));
            assertEquals(limit == 6, facing.isSolved());
            assertEquals(limit, facing.counts().total());
        }
    }

    /** 1 + 2M/(M + 1) on the mean over balanced functions, M = 2^(n−1). */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 6, 8})
    void theScanMeetsAnotherValueAsSoonAsTheTableSays(int width) throws Exception {
        JsonNode means = CheckValues.section("I").required("dj_mean_balanced");
        Sample sample = new Sample();
        for (long number = 0; number < 6000; number++) {
            sample.add(Facing.classical(
                            new BalanceScan(), balance(true, width, number), BALANCE.promise(), Streams.named("scan"))
                    .assertProved()
                    .counts()
                    .queries());
        }
        sample.assertMean(
                Double.parseDouble(
                        means.required(Integer.toString(width)).get(1).asString()),
                5);
        double half = 1 << (width - 1);
        assertEquals(
                1 + 2 * half / (half + 1),
                Double.parseDouble(
                        means.required(Integer.toString(width)).get(1).asString()),
                1e-8);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 6, 8})
    void theScanIsSureOfAConstantFunctionAfterMoreThanHalfOfIt(int width) {
        for (long number = 0; number < 4; number++) {
            Facing facing = Facing.classical(
                            new BalanceScan(), balance(false, width, number), BALANCE.promise(), Streams.named("scan"))
                    .assertProved();
            assertEquals((1L << (width - 1)) + 1, facing.counts().total());
        }
    }

    /** Wrong on a balanced function with probability 2 C(N/2, k)/C(N, k), never on a constant one. */
    @ParameterizedTest
    @CsvSource({"2, 2", "2, 3", "3, 2", "3, 3", "3, 4", "3, 5", "4, 2", "4, 4", "5, 3", "6, 2", "6, 5", "8, 4"})
    void samplingIsWrongAsOftenAsTheTableSays(int width, int queries) throws Exception {
        Sample wrong = new Sample();
        for (long number = 0; number < 6000; number++) {
            Facing facing = Facing.classical(
                    new BalanceSampling(queries),
                    balance(true, width, number),
                    BALANCE.promise(),
                    Streams.numbered("sampling " + width + " " + queries, number));
            wrong.add(!facing.isSolved());
            assertTrue(facing.counts().total() <= queries);
        }
        for (JsonNode row : CheckValues.section("I").required("dj")) {
            if (row.required("n").asInt() == width && row.required("k").asInt() == queries) {
                JsonNode exact = row.required("err_without");
                double rate = exact.isNull()
                        ? Double.parseDouble(row.required("err_without_dec").asString())
                        : Fractions.value(exact.asString()).doubleValue();
                wrong.assertRate(rate, 5);
                return;
            }
        }
        throw new AssertionError("no row for " + width + " and " + queries);
    }

    @Test
    void samplingIsNeverWrongOnAConstantFunction() {
        for (long number = 0; number < 200; number++) {
            Facing facing = Facing.classical(
                            new BalanceSampling(7),
                            balance(false, 5, number),
                            BALANCE.promise(),
                            Streams.numbered("constant", number))
                    .assertProved();
            assertEquals(7, facing.counts().total());
        }
    }

    /** A function of n bits is read from n + 1 values; the period is confirmed by one value more. */
    @ParameterizedTest
    @CsvSource({"2, 50", "5, 50", "63, 20", "64, 20", "300, 3"})
    void affineFunctionsAreSolvedWithOneQueryMoreThanBits(int width, int trials) {
        AffinePeriod problem = new AffinePeriod();
        for (long number = 0; number < trials; number++) {
            Instance instance = problem.draw(width, Streams.numbered("affine " + width, number));
            Facing facing = Facing.classical(
                            new AffineSolve(), instance, problem.promise(), Streams.named("affine solve"))
                    .assertProved();
            assertEquals(new Counts(width + 1L, 0, 0, 1), facing.counts());
        }
    }

    @Test
    void affineSolveIsCutByEveryLimitBelowItsNeed() {
        AffinePeriod problem = new AffinePeriod();
        Instance instance = problem.draw(5, Streams.named("affine"));
        for (long limit = 1; limit <= 7; limit++) {
            Facing facing = Facing.classical(
                    new AffineSolve(), instance, problem.promise(), limit, Streams.named("affine solve"));
            assertEquals(limit == 7, facing.isSolved());
            assertEquals(limit, facing.counts().total());
            if (limit < 7) {
                assertInstanceOf(Attempt.Censored.class, facing.attempt());
            }
        }
    }
}
