package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class SamplingAndNoiseTest {

    @Test
    void allPublishedBoundsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("J").required("bound");
        assertEquals(80, rows.size());
        for (JsonNode row : rows) {
            BigDecimal bound = new SamplingBound()
                    .published(
                            row.required("n").asInt(),
                            Fractions.value(row.required("p0").asString()),
                            row.required("c").asInt())
                    .value();
            assertPrints(row.required("failure_bound").asString(), bound);
        }
    }

    /** By hand: one pair with N = 2, two words with N = 0, at n = 2 and 3 without an accident. */
    @Test
    void sharperBoundsOfSmallFunctionsAreTheSumsByHand() {
        SamplingBound bound = new SamplingBound();
        assertEquals(
                Optional.of("1/8"), bound.sharper(List.of(4, 0, 0, 4), 3, 3).fraction());
        assertEquals(
                Optional.of("9/16"), bound.sharper(List.of(4, 2, 2, 4), 3, 2).fraction());
        assertEquals(
                Optional.of("3/16"),
                bound.sharper(List.of(8, 0, 0, 0, 0, 0, 0, 8), 7, 4).fraction());
    }

    @Test
    void allProbabilitiesOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("K").required("orth");
        assertEquals(56, rows.size());
        for (JsonNode row : rows) {
            ReadoutNoise noise =
                    new ReadoutNoise(new BigDecimal(row.required("p").asString()));
            int weight = row.required("wt").asInt();
            assertPrints(
                    row.required("prob_orth").asString(),
                    noise.orthogonal(weight).value());
            assertPrints(row.required("delta").asString(), noise.bias(weight));
        }
    }

    @Test
    void allRoundsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("K").required("rounds");
        assertEquals(30, rows.size());
        BigDecimal tenth = new BigDecimal("0.1");
        for (JsonNode row : rows) {
            ReadoutNoise noise =
                    new ReadoutNoise(new BigDecimal(row.required("p").asString()));
            int width = row.required("n").asInt();
            int weight = row.required("wt").asInt();
            assertEquals(
                    row.required("ml_rounds_chernoff_unweighted_fail10pct").asInt(),
                    noise.peakRounds(width, weight, tenth));
            assertEquals(
                    row.required("ml_rounds_bhattacharyya_fail10pct").asInt(),
                    noise.likelihoodRounds(width, weight, tenth));
            // Printed with eight digits, also where that is less than to the units.
            BigDecimal draws = noise.pooledDraws(width, weight).value();
            BigDecimal printed =
                    new BigDecimal(row.required("pooled_expected_trials").asString());
            assertEquals(0, printed.compareTo(draws.round(new MathContext(8))), draws::toPlainString);
            BigDecimal bound = noise.informationBound(width, weight).value();
            BigDecimal six = new BigDecimal(row.required("info_lower").asString());
            assertEquals(0, six.compareTo(bound.round(new MathContext(6))), bound::toPlainString);
        }
    }

    @Test
    void aFlipOfAHalfOrMoreIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> new ReadoutNoise(new BigDecimal("0.5")));
    }

    /** OEIS A002162 and A002392. */
    @Test
    void logarithmsAreRight() {
        assertPrints("0.693147180559945309417232121458176568", NaturalLogarithm.of(BigDecimal.valueOf(2)));
        assertPrints("-2.302585092994045684017991454684364208", NaturalLogarithm.of(new BigDecimal("0.1")));
    }
}
