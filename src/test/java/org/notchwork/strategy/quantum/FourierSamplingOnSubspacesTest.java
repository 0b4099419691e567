package org.notchwork.strategy.quantum;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Instance;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.subspace.HiddenSubspace;
import org.notchwork.strategy.Attempt;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Facing;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Subspaces (check values, section H) and the decision between a period and none (section F). */
class FourierSamplingOnSubspacesTest {

    @ParameterizedTest
    @CsvSource({"3, 1", "3, 2", "4, 2", "4, 3", "5, 2", "6, 3", "8, 4"})
    void theRoundsAreThoseOfTheTable(int width, int dimension) throws Exception {
        HiddenSubspace problem = new HiddenSubspace(dimension);
        Sample rounds = new Sample();
        for (long number = 0; number < 3000; number++) {
            String name = width + " " + dimension;
            Instance instance = problem.draw(width, Streams.numbered("subspace " + name, number));
            Facing facing = Facing.quantum(
                            new FourierSampling(),
                            new FibreEngine(),
                            instance,
                            problem.promise(),
                            Streams.numbered("sampling " + name, number))
                    .assertProved();
            rounds.add(facing.counts().quantum());
            assertEquals(dimension + 1, facing.counts().confirming());
        }
        for (JsonNode row : CheckValues.section("H").required("table")) {
            if (row.required("n").asInt() == width && row.required("k").asInt() == dimension) {
                rounds.assertMean(
                        Double.parseDouble(row.required("quantum_rounds_mean").asString()), 5);
                return;
            }
        }
        throw new AssertionError("no row");
    }

    @Test
    void everyEngineThatTakesSubspacesFindsAllOfThem() {
        for (Engine engine : Engines.all()) {
            for (int dimension = 1; dimension <= 3; dimension++) {
                HiddenSubspace problem = new HiddenSubspace(dimension);
                if (engine.refusal(problem, 4, Circuit.FOURIER).isPresent()) {
                    assertEquals("stabilizer", engine.name());
                    continue;
                }
                Set<Answer> met = new HashSet<>();
                for (long number = 0; number < 400; number++) {
                    Instance instance = problem.draw(4, Streams.numbered("all subspaces", number));
                    met.add(instance.hidden());
                    Facing.quantum(
                                    new FourierSampling(),
                                    engine,
                                    instance,
                                    problem.promise(),
                                    Streams.numbered("all " + engine.name(), number))
                            .assertProved();
                }
                // 15 lines, 35 planes and 15 spaces of dimension 3.
                assertEquals(dimension == 2 ? 35 : 15, met.size());
            }
        }
    }

    /**
     * Rank n − 1 and two evaluations decide for certain: Σ 1/(1 − 2^−i) rounds on the mean, i from 2 to n without a period
     * and from 1 to n − 1 with one.
     */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 8})
    void aPeriodAndNoneAreToldApartForCertain(int width) {
        PeriodOrNone problem = new PeriodOrNone(Labelling.TABLE);
        Sample with = new Sample();
        Sample without = new Sample();
        for (long number = 0; number < 4000; number++) {
            Instance instance = problem.draw(width, Streams.numbered("or none " + width, number));
            Facing facing = Facing.quantum(
                            new FourierSampling(),
                            new FibreEngine(),
                            instance,
                            problem.promise(),
                            Streams.numbered("decide " + width, number))
                    .assertProved();
            assertEquals(2, facing.counts().confirming());
            Attempt.Answered answered = assertInstanceOf(Attempt.Answered.class, facing.attempt());
            assertInstanceOf(Certificate.Equations.class, answered.certificate());
            (instance.hidden() instanceof Answer.NoPeriod ? without : with)
                    .add(facing.counts().quantum());
        }
        with.assertMean(rounds(1, width - 1), 5);
        without.assertMean(rounds(2, width), 5);
    }

    private static double rounds(int from, int to) {
        double sum = 0;
        for (int i = from; i <= to; i++) {
            sum += 1 / (1 - Math.pow(2, -i));
        }
        return sum;
    }
}
