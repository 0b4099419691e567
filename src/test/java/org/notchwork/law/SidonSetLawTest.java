package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.util.HashSet;
import java.util.OptionalLong;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class SidonSetLawTest {

    private final SidonSetLaw law = new SidonSetLaw();

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("D").required("table");
        assertEquals(10, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertEquals(
                    Fractions.value(row.required("mean_total").asString()),
                    law.mean(width).value());
            assertPrints(
                    row.required("mean_total_dec").asString(), law.mean(width).value());
            assertEquals(OptionalLong.of(Long.parseLong(row.required("worst").asString())), law.worst(width));
            assertEquals(
                    Fractions.value(row.required("success_at_exhaustion").asString()),
                    law.within(width, 1L << (width / 2)).orElseThrow().value());
            assertEquals(
                    Fraction.ONE.prediction(),
                    law.within(width, law.worst(width).orElseThrow()).orElseThrow());
        }
    }

    /** The naive twin: asks the points one by one and lists the sums that each adds. */
    @ParameterizedTest
    @CsvSource({"1, 3", "2, 7", "3, 11", "4, 19", "5, 37", "6, 67"})
    void everythingIsAsInTheWalkThroughThePoints(int degree, int polynomial) {
        Set<Integer> seen = new HashSet<>();
        Set<Integer> met = new HashSet<>();
        MomentsByListing listed = new MomentsByListing();
        for (int i = 0; i < (2 << degree) - 1; i++) {
            int point = i < 1 << degree ? (i << degree) | cube(i, degree, polynomial) : i - (1 << degree) + 1;
            seen.add(point);
            for (int other : seen) {
                if (other != point && met.add(other ^ point)) {
                    listed.add(seen.size());
                }
            }
        }
        listed.assertAre(law, 2 * degree);
        listed.assertDistributionIs(law, 2 * degree);
    }

    /** Products of polynomials first, the remainder after. */
    private static int cube(int x, int degree, int polynomial) {
        int result = 1;
        for (int factor = 0; factor < 3; factor++) {
            int product = 0;
            for (int bit = 0; bit < degree; bit++) {
                product ^= (x >>> bit & 1) == 0 ? 0 : result << bit;
            }
            for (int bit = 2 * degree; bit >= degree; bit--) {
                product ^= (product >>> bit & 1) == 0 ? 0 : polynomial << (bit - degree);
            }
            result = product;
        }
        return result;
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 3, 28, 34})
    void otherWidthsAreRefused(int width) {
        assertThrows(IllegalArgumentException.class, () -> law.mean(width));
    }
}
