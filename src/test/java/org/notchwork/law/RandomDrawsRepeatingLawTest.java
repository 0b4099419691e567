package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class RandomDrawsRepeatingLawTest {

    private final RandomDrawsRepeatingLaw law = new RandomDrawsRepeatingLaw();

    /** 8/3 + 1 and 128/35 + 1. */
    @ParameterizedTest
    @CsvSource({"2, 11/3", "3, 163/35"})
    void smallWidthsHaveTheseMeans(int width, String mean) {
        assertEquals(Optional.of(mean), law.mean(width).fraction());
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("B").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertPrints(row.required("mean_with").asString(), law.mean(width).value());
            assertEquals(width <= 14, law.variance(width).isPresent());
            if (width <= 14) {
                BigDecimal variance = law.variance(width).orElseThrow();
                assertPrints(row.required("var_with").asString(), variance);
                assertPrints(row.required("sd_with").asString(), Decimals.root(variance));
            }
        }
    }

    @Test
    void theExactVariancesOfTheCheckValuesAreMet() throws IOException {
        JsonNode variances = CheckValues.section("B").required("var_with_exact");
        assertEquals(4, variances.size());
        for (Map.Entry<String, JsonNode> variance : variances.properties()) {
            assertEquals(
                    Decimals.text(Fractions.value(variance.getValue().asString()), 40),
                    Decimals.text(
                            law.variance(Integer.parseInt(variance.getKey())).orElseThrow(), 40));
        }
    }

    /** The naive twin: all sequences of m words; a collision needs a word and its partner. */
    @ParameterizedTest
    @CsvSource({"2, 0", "2, 1", "2, 4", "2, 8", "3, 3", "3, 6", "4, 4"})
    void theProbabilityIsTheFractionOfAllSequencesThatCollide(int width, int draws) {
        int mask = (1 << width) - 1;
        long all = 1L << (width * draws);
        long colliding = 0;
        for (long sequence = 0; sequence < all; sequence++) {
            boolean collides = false;
            for (int i = 0; i < draws; i++) {
                for (int j = 0; j < i; j++) {
                    collides |= ((sequence >>> (i * width) ^ sequence >>> (j * width)) & mask) == 1;
                }
            }
            colliding += collides ? 1 : 0;
        }
        assertEquals(
                Optional.of(Prediction.ratio(BigInteger.valueOf(colliding), BigInteger.valueOf(all))),
                law.within(width, draws));
    }

    @Test
    void thereIsNoWorstCaseAndLongChainsAreLeftOut() {
        assertEquals(OptionalLong.empty(), law.worst(4));
        assertEquals(Optional.empty(), law.within(20, 1000));
    }
}
