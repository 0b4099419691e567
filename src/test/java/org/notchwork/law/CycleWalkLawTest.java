package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class CycleWalkLawTest {

    private final CycleWalkLaw law = new CycleWalkLaw();

    @Test
    void allRowsOfTheCheckValuesUpToWidth20AreMet() throws IOException {
        JsonNode table = CheckValues.section("E").required("exact_table");
        assertEquals(17, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            if (width <= 20) {
                assertPrints(
                        row.required("brent_single").asString(),
                        law.attemptMean(width).value());
                assertPrints(
                        row.required("p_fail").asString(), law.failure(width).value());
                assertPrints(
                        row.required("renewal_estimate_total").asString(),
                        law.mean(width).value());
            }
        }
    }

    /** Found by going through all functions and starts at n = 1, 2, 3; exact sums at n = 4. */
    @Test
    void smallWidthsAreExact() throws IOException {
        JsonNode small = CheckValues.section("E").required("exact_small");
        assertEquals(4, small.size());
        for (Map.Entry<String, JsonNode> row : small.properties()) {
            int width = Integer.parseInt(row.getKey());
            assertSame(
                    row.getValue().required("mean_brent").asString(),
                    law.attemptMean(width).value());
            assertSame(
                    row.getValue().required("p_success").asString(),
                    BigDecimal.ONE.subtract(law.failure(width).value()));
        }
    }

    private static void assertSame(String fraction, BigDecimal value) {
        assertEquals(Decimals.text(Fractions.value(fraction), 40), Decimals.text(value, 40));
    }

    @Test
    void otherWidthsAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> law.mean(25));
        assertThrows(IllegalArgumentException.class, () -> law.mean(0));
    }
}
