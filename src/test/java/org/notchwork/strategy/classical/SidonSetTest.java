package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Promise;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Fractions;
import org.notchwork.support.Hidden;
import org.notchwork.support.Recording;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Check values, sections D2 and D3. */
class SidonSetTest {

    private static final Promise PERIOD = Promise.period(Promise.Labels.RANDOM);

    private static List<Long> points(int width) {
        Recording function = new Recording(width);
        new SidonSet().attempt(new Oracle(function, PERIOD, new Meter(1L << (width + 1))), Streams.named("sidon"));
        return function.points();
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8, 10, 12})
    void theSumsOfThePointsBeforeTheLineAllDiffer(int width) {
        List<Long> points = points(width).subList(0, 1 << (width / 2));
        Set<Long> sums = new HashSet<>();
        for (int i = 0; i < points.size(); i++) {
            for (int j = 0; j < i; j++) {
                assertTrue(sums.add(points.get(i) ^ points.get(j)), "points " + i + " and " + j);
            }
        }
        assertEquals(points.size() * (points.size() - 1) / 2, sums.size());
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8, 10, 12})
    void withTheLineEveryNonZeroWordIsASumOfTwoPoints(int width) {
        List<Long> points = points(width);
        assertEquals((2 << (width / 2)) - 1, points.size());
        assertEquals(points.size(), new HashSet<>(points).size());
        Set<Long> sums = new HashSet<>();
        points.forEach(x -> points.forEach(y -> sums.add(x ^ y)));
        assertEquals(1 << width, sums.size());
    }

    private static List<Long> queries(int width) {
        List<Long> queries = new ArrayList<>();
        for (Answer hidden : Hidden.periods(width)) {
            Instance instance = new XorPeriod(Labelling.TABLE)
                    .drawHiding(hidden, width, Streams.numbered("sidon " + width, Hidden.bits(hidden)));
            queries.add(Facing.classical(new SidonSet(), instance, PERIOD, Streams.named("sidon"))
                    .assertProved()
                    .counts()
                    .queries());
        }
        return queries;
    }

    /** Over all secrets exactly C(m, 2) are found within m queries, m to 2^(n/2): no strategy finds more. */
    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8, 10})
    void asManySecretsAsPairsOfPointsAreFound(int width) {
        List<Long> queries = queries(width);
        for (long m = 0; m <= 1L << (width / 2); m++) {
            long most = m;
            assertEquals(
                    m * (m - 1) / 2, queries.stream().filter(q -> q <= most).count(), "within " + m);
        }
    }

    @Test
    void theMeanAndTheWorstCaseAreThoseOfTheTable() throws Exception {
        for (JsonNode row : CheckValues.section("D").required("table")) {
            int width = row.required("n").asInt();
            if (width > 12) {
                continue;
            }
            List<Long> queries = queries(width);
            BigDecimal mean = Decimals.quotient(
                    BigInteger.valueOf(
                            queries.stream().mapToLong(Long::longValue).sum()),
                    BigInteger.valueOf(queries.size()));
            assertEquals(Fractions.value(row.required("mean_total").asString()), mean, "width " + width);
            assertEquals(
                    Long.parseLong(row.required("worst").asString()),
                    queries.stream().mapToLong(Long::longValue).max().orElseThrow());
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {4, 8})
    void afterAllPointsWithoutACollisionThereIsNoPeriod(int width) {
        PeriodOrNone problem = new PeriodOrNone(Labelling.TABLE);
        Instance instance = problem.drawHiding(new Answer.NoPeriod(), width, Streams.numbered("none", width));
        Facing facing = Facing.classical(new SidonSet(), instance, problem.promise(), Streams.named("sidon"))
                .assertProved();
        assertEquals((2L << (width / 2)) - 1, facing.counts().queries());
    }

    @Test
    void anOddWidthIsRefused() {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        assertTrue(new SidonSet().refusal(problem, 8).isEmpty());
        assertEquals(
                "sidon-set splits words into two halves and width 7 is odd",
                new SidonSet().refusal(problem, 7).orElseThrow());
    }
}
