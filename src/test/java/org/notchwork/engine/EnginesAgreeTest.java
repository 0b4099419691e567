package org.notchwork.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bits.WalshHadamard;
import org.notchwork.engine.annihilator.AnnihilatorEngine;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.statevector.StateVectorEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Given;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

class EnginesAgreeTest {

    static Stream<BlindEngine> blindEngines() {
        return Stream.of(new StateVectorEngine(), new FibreEngine());
    }

    private static Outcomes outcomes(BlindEngine engine, BitFunction function) {
        return engine.open(new Unitary(function, new Meter(1))).outcomes();
    }

    @ParameterizedTest
    @EnumSource(Labelling.class)
    void allEnginesGiveTheSameOutcomesOnRandomInstances(Labelling labelling) {
        XorPeriod problem = new XorPeriod(labelling);
        for (int width = 2; width <= 8; width++) {
            for (int i = 0; i < 10; i++) {
                Instance instance = problem.draw(width, Streams.numbered("engines " + width, i));
                Outcomes expected = theory(width, instance.hidden());
                Unitary unitary = new Unitary(instance.function(), new Meter(1));
                Outcomes annihilator =
                        new AnnihilatorEngine().open(unitary, instance.hidden()).outcomes();
                assertEquals(0, expected.differences(annihilator));
                blindEngines().forEach(e -> assertEquals(0, expected.differences(outcomes(e, instance.function()))));
            }
        }
    }

    /** Uniform on the words orthogonal to the period (D. R. Simon, SIAM J. Comput. 26 (1997), section 3.1). */
    private static Outcomes theory(int width, Answer hidden) {
        long s = ((Answer.Period) hidden).s().bits();
        long[] weights = new long[1 << width];
        for (int y = 0; y < weights.length; y++) {
            weights[y] = Long.bitCount(y & s) % 2 == 0 ? 1 : 0;
        }
        return new Outcomes(weights);
    }

    @ParameterizedTest
    @MethodSource("blindEngines")
    void outcomesOfArbitraryFunctionsEqualAProductOfMatrices(BlindEngine engine) {
        for (int width = 1; width <= 3; width++) {
            for (int valueWidth = 1; valueWidth <= 3; valueWidth++) {
                for (int i = 0; i < 10; i++) {
                    BitFunction function = arbitrary(width, valueWidth, i);
                    assertEquals(0, byMatrices(function).differences(outcomes(engine, function)));
                }
            }
        }
    }

    private static BitFunction arbitrary(int width, int valueWidth, int number) {
        RandomStream stream = Streams.numbered("arbitrary " + width + " " + valueWidth, number);
        long[] values = new long[1 << width];
        for (int x = 0; x < values.length; x++) {
            values[x] = stream.bits(valueWidth);
        }
        return Given.of(width, valueWidth, values);
    }

    /** The naive twin: (H ⊗ 1) U_f (H ⊗ 1) as full matrices, without the factor of H, applied to the first state. */
    private static Outcomes byMatrices(BitFunction function) {
        int inputs = 1 << function.width();
        int values = 1 << function.valueWidth();
        long[][] hadamards = new long[inputs * values][inputs * values];
        long[][] oracle = new long[inputs * values][inputs * values];
        for (int x = 0; x < inputs; x++) {
            for (int z = 0; z < values; z++) {
                oracle[x * values + (z ^ (int) function.at(x))][x * values + z] = 1;
                for (int y = 0; y < inputs; y++) {
                    hadamards[y * values + z][x * values + z] = Integer.bitCount(x & y) % 2 == 0 ? 1 : -1;
                }
            }
        }
        long[][] circuit = product(hadamards, product(oracle, hadamards));
        long[] weights = new long[inputs];
        for (int row = 0; row < inputs * values; row++) {
            weights[row / values] += circuit[row][0] * circuit[row][0];
        }
        return new Outcomes(weights);
    }

    private static long[][] product(long[][] a, long[][] b) {
        long[][] c = new long[a.length][b[0].length];
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < b[0].length; j++) {
                for (int k = 0; k < b.length; k++) {
                    c[i][j] += a[i][k] * b[k][j];
                }
            }
        }
        return c;
    }

    /** By hand: w(y) is the sum over d of (−1)^(d·y) times the number of x with f(x) = f(x ⊕ d), over 2^(2n). */
    @ParameterizedTest
    @CsvSource({
        "2, 0 0 0 1, 10 2 2 2",
        "2, 3 1 1 3, 8 0 0 8",
        "3, 0 1 2 3 3 2 1 1, 18 2 2 10 2 10 18 2",
        "3, 5 2 0 0 6 2 6 4, 14 10 10 6 10 6 6 2",
        "3, 1 1 1 1 1 1 1 1, 64 0 0 0 0 0 0 0",
        "3, 0 1 2 3 4 5 6 7, 8 8 8 8 8 8 8 8"
    })
    void workedExamplesHaveTheseOutcomes(int width, String values, String weights) {
        assertOutcomes(Given.of(width, 3, numbers(values)), numbers(weights));
    }

    @Test
    void allWorkedExamplesOfTheCheckValuesAreMet() throws IOException {
        JsonNode section = CheckValues.section("J");
        List<JsonNode> examples = Stream.concat(
                        section.required("examples").properties().stream(),
                        section.required("worked").properties().stream())
                .map(Map.Entry::getValue)
                .filter(e -> e.has("weights"))
                .toList();
        assertEquals(9, examples.size());
        for (JsonNode example : examples) {
            long[] values = numbers(example.required("f"));
            int width = Integer.numberOfTrailingZeros(values.length);
            long[] collisions = numbers(example.required("N_d"));
            long[] weights = numbers(example.required("weights"));
            assertOutcomes(Given.of(width, 4, values), weights);
            WalshHadamard.transform(collisions);
            assertTrue(Arrays.equals(collisions, weights));
        }
    }

    private static void assertOutcomes(BitFunction function, long[] weights) {
        Outcomes expected = new Outcomes(weights);
        blindEngines().forEach(e -> assertEquals(0, expected.differences(outcomes(e, function)), e.name()));
    }

    private static long[] numbers(String text) {
        return Arrays.stream(text.split(" ", -1)).mapToLong(Long::parseLong).toArray();
    }

    private static long[] numbers(JsonNode array) {
        long[] numbers = new long[array.size()];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = array.get(i).asLong();
        }
        return numbers;
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7})
    void aFunctionThatBreaksThePromiseHasOtherOutcomes(int changed) {
        Instance instance = new XorPeriod(Labelling.TABLE).draw(3, Streams.named("broken"));
        long[] values = new long[8];
        for (int x = 0; x < 8; x++) {
            values[x] = instance.function().at(x);
        }
        values[changed] = values[changed == 7 ? 0 : changed + 1] ^ 1;
        Outcomes promised = theory(3, instance.hidden());
        blindEngines()
                .forEach(e -> assertTrue(promised.differences(outcomes(e, Given.of(3, 3, values))) > 0, e.name()));
    }

    @Test
    void outcomesAboveWidth12AreNotListed() {
        XorPeriod problem = new XorPeriod(Labelling.PERMUTATION);
        Instance instance = problem.draw(13, Streams.named("wide"));
        Unitary unitary = new Unitary(instance.function(), new Meter(1));
        List<Simulation> simulations = List.of(
                new StateVectorEngine().open(unitary),
                new FibreEngine().open(unitary),
                new AnnihilatorEngine().open(unitary, instance.hidden()));
        for (Simulation simulation : simulations) {
            assertThrows(IllegalArgumentException.class, simulation::outcomes);
        }
    }
}
