package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Promise;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.problem.subspace.HiddenSubspace;
import org.notchwork.strategy.Attempt;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Recording;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Random points with repeats (check values, section B2) and until a subspace is spanned (section H). */
class CollisionMeansTest {

    private static final int TRIALS = 4000;

    private static JsonNode row(String section, String... where) throws Exception {
        for (JsonNode row : CheckValues.section(section).required("table")) {
            boolean here = true;
            for (int i = 0; i < where.length; i += 2) {
                here &= row.required(where[i]).asString().equals(where[i + 1]);
            }
            if (here) {
                return row;
            }
        }
        throw new AssertionError("no row " + List.of(where));
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 6, 8, 10})
    void repeatsCostOneQueryOnTheMean(int width) throws Exception {
        Sample sample = new Sample();
        Promise promise = Promise.period(Promise.Labels.RANDOM);
        for (long number = 0; number < TRIALS; number++) {
            Instance instance = new XorPeriod(Labelling.TABLE).draw(width, Streams.numbered("repeat " + width, number));
            sample.add(Facing.classical(
                            new RandomDrawsRepeating(), instance, promise, Streams.numbered("draws " + width, number))
                    .assertProved()
                    .counts()
                    .queries());
        }
        double variance = Double.parseDouble(
                row("B", "n", Integer.toString(width)).required("var_with").asString());
        double mean = Double.parseDouble(
                row("B", "n", Integer.toString(width)).required("mean_with").asString());
        sample.assertMean(mean, 5);
        assertEquals(variance, sample.error() * sample.error() * TRIALS, 0.25 * variance);
    }

    @Test
    void pointsAreRepeatedAsIfDrawnAnew() {
        Recording function = new Recording(4);
        Oracle oracle = new Oracle(function, Promise.period(Promise.Labels.RANDOM), new Meter(500));
        assertInstanceOf(
                Attempt.Censored.class, new RandomDrawsRepeating().attempt(oracle, Streams.named("repeating")));
        assertEquals(500, function.points().size());
        assertEquals(16, new HashSet<>(function.points()).size());
    }

    @ParameterizedTest
    @CsvSource({"3, 1", "3, 2", "4, 1", "4, 2", "4, 3", "6, 2", "6, 4", "8, 3", "10, 2"})
    void theSpanIsFoundAfterAsManyPointsAsTheTableSays(int width, int dimension) throws Exception {
        HiddenSubspace problem = new HiddenSubspace(dimension);
        Sample sample = new Sample();
        for (long number = 0; number < TRIALS; number++) {
            String name = width + " " + dimension;
            Instance instance = problem.draw(width, Streams.numbered("subspace " + name, number));
            sample.add(Facing.classical(
                            new CollisionSpan(), instance, problem.promise(), Streams.numbered("span " + name, number))
                    .assertProved()
                    .counts()
                    .queries());
        }
        JsonNode row = row("H", "n", Integer.toString(width), "k", Integer.toString(dimension));
        sample.assertMean(Double.parseDouble(row.required("all_of_S_mean").asString()), 5);
    }
}
