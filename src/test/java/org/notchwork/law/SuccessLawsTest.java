package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class SuccessLawsTest {

    @Test
    void allFixedRoundsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("F").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertPrints(
                    row.required("p_min_dec").asString(),
                    FixedRoundsSuccess.extra(0, 1).success(width).value());
            assertPrints(
                    row.required("p_np4").asString(),
                    FixedRoundsSuccess.extra(5, 1).success(width).value());
            assertPrints(
                    row.required("p_np9").asString(),
                    FixedRoundsSuccess.absolute(width + 9, 1).success(width).value());
        }
    }

    @Test
    void allDecisionsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("F").required("decision");
        assertEquals(99, rows.size());
        for (JsonNode row : rows) {
            int width = row.required("n").asInt();
            DecisionSuccess law = new DecisionSuccess(row.required("m").asLong());
            assertPrints(
                    row.required("one_sided_error_when_s0").asString(),
                    law.errorWithoutPeriod(width).value());
            assertPrints(
                    row.required("half").asString(),
                    BigDecimal.ONE.subtract(law.success(width).value()));
            assertPrints(
                    row.required("bayes_error_prior_half").asString(),
                    law.bestError(width).value());
        }
    }

    /** The naive twin: all sequences of words, with no period and with a period, counted by rank. */
    @ParameterizedTest
    @CsvSource({"2, 1", "2, 3", "3, 2", "3, 4", "4, 3", "4, 4"})
    void decisionsAreThoseOfAllSequences(int width, int rounds) {
        long[] without = ranks(width, rounds);
        long[] with = ranks(width - 1, rounds);
        long all = 1L << (width * rounds);
        long least = 0;
        for (int r = 0; r <= width; r++) {
            least += Math.min(without[r], r == width ? 0 : with[r] << rounds);
        }
        DecisionSuccess law = new DecisionSuccess(rounds);
        assertEquals(ratio(least, 2 * all), law.bestError(width));
        assertEquals(ratio(all - without[width], all), law.errorWithoutPeriod(width));
        assertEquals(ratio(all + without[width], 2 * all), law.success(width));
        assertEquals(
                ratio(with[width - 1], all >> rounds),
                FixedRoundsSuccess.absolute(rounds, 1).success(width));
    }

    private static long[] ranks(int dimension, int rounds) {
        long[] counts = new long[dimension + 1];
        for (long sequence = 0; sequence < 1L << (dimension * rounds); sequence++) {
            EchelonBasis basis = new EchelonBasis(dimension);
            for (int i = 0; i < rounds; i++) {
                basis.add(sequence >>> (i * dimension) & ((1L << dimension) - 1));
            }
            counts[basis.rank()]++;
        }
        return counts;
    }

    private static Prediction ratio(long top, long bottom) {
        return Prediction.ratio(BigInteger.valueOf(top), BigInteger.valueOf(bottom));
    }

    @Test
    void allErrorsOnBalancedFunctionsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("I").required("dj");
        assertEquals(104, rows.size());
        for (JsonNode row : rows) {
            int width = row.required("n").asInt();
            BalancedSampleSuccess law =
                    new BalancedSampleSuccess(row.required("k").asLong());
            Prediction error = law.errorOnBalanced(width);
            if (!row.required("err_without").isNull()) {
                assertEquals(Optional.of(row.required("err_without").asString()), error.fraction());
            }
            assertPrints(row.required("err_without_dec").asString(), error.value());
        }
    }

    /** Worked out by hand: 1 − 1/6 with two of four points, certain with three. */
    @Test
    void samplesOfFourPointsSucceedSoOften() {
        assertEquals(Optional.of("1/2"), new BalancedSampleSuccess(1).success(2).fraction());
        assertEquals(Optional.of("5/6"), new BalancedSampleSuccess(2).success(2).fraction());
        assertEquals(Optional.of("1"), new BalancedSampleSuccess(3).success(2).fraction());
    }

    @Test
    void impossibleNumbersAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new BalancedSampleSuccess(0));
        assertThrows(IllegalArgumentException.class, () -> new DecisionSuccess(-1));
        assertThrows(IllegalArgumentException.class, () -> FixedRoundsSuccess.absolute(3, 0));
        assertThrows(
                IllegalArgumentException.class,
                () -> FixedRoundsSuccess.extra(0, 3).success(2));
    }
}
