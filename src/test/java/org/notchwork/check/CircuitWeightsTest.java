package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.notchwork.engine.Outcomes;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.RandomFunction;
import org.notchwork.problem.balance.ConstantOrBalanced;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Given;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Check values, section J1. */
class CircuitWeightsTest {

    private static long[] numbers(JsonNode list) {
        long[] numbers = new long[list.size()];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = list.get(i).asLong();
        }
        return numbers;
    }

    private static void assertWeights(long[] expected, Outcomes outcomes) {
        List<Long> weights = new ArrayList<>();
        for (int y = 0; y < outcomes.size(); y++) {
            weights.add(outcomes.weight(y));
        }
        assertEquals(Arrays.stream(expected).boxed().toList(), weights);
    }

    @Test
    void theWorkedExamplesComeOut() throws Exception {
        int compared = 0;
        for (JsonNode example : CheckValues.section("J").required("examples")) {
            long[] values = numbers(example.required("f"));
            int width = Integer.numberOfTrailingZeros(values.length);
            Outcomes outcomes = CircuitWeights.fourier(Given.of(width, width, values));
            assertWeights(numbers(example.required("weights")), outcomes);
            assertEquals(example.required("denominator").asLong(), outcomes.total());
            compared++;
        }
        assertEquals(6, compared);
    }

    @Test
    void theToyOfTheTableComesOut() throws Exception {
        JsonNode toy = CheckValues.section("J").required("worked").required("even_mansour_n4");
        assertWeights(
                numbers(toy.required("weights")), CircuitWeights.fourier(Given.of(4, 4, numbers(toy.required("f")))));
    }

    /** P(y) = 2^(−2n) Σ_z |Σ_{x: f(x) = z} (−1)^(x·y)|², fibre by fibre. */
    @Test
    void weightsAreTheSquaredTransformsOfTheFibres() {
        for (int width = 1; width <= 6; width++) {
            BitFunction function = RandomFunction.draw(width, 3, Streams.numbered("weights", width));
            long[] expected = new long[1 << width];
            for (int y = 0; y < expected.length; y++) {
                for (long z = 0; z < 8; z++) {
                    long amplitude = 0;
                    for (int x = 0; x < expected.length; x++) {
                        amplitude += function.at(x) == z ? 1 - 2 * (Integer.bitCount(x & y) & 1) : 0;
                    }
                    expected[y] += amplitude * amplitude;
                }
            }
            assertWeights(expected, CircuitWeights.fourier(function));
        }
    }

    @Test
    void thePhaseCircuitMeasuresZeroExactlyOnConstantFunctions() {
        for (long number = 0; number < 20; number++) {
            BitFunction balanced = new ConstantOrBalanced()
                    .drawHiding(new Answer.Balance(true), 4, Streams.numbered("phase", number))
                    .function();
            Outcomes outcomes = CircuitWeights.phase(balanced);
            assertEquals(0, outcomes.weight(0));
            assertEquals(256, outcomes.total());
        }
        assertWeights(new long[] {16, 0, 0, 0}, CircuitWeights.phase(Given.of(2, 1, 1, 1, 1, 1)));
        assertWeights(new long[] {0, 0, 16, 0}, CircuitWeights.phase(Given.of(2, 1, 1, 1, 0, 0)));
        assertWeights(new long[] {4, 4, 4, 4}, CircuitWeights.phase(Given.of(2, 1, 0, 0, 0, 1)));
        assertTrue(CircuitWeights.phase(Given.of(1, 1, 0, 1)).weight(1) == 4);
    }
}
