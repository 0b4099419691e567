package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.util.HashSet;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class DifferenceCoverLawTest {

    private final DifferenceCoverLaw law = new DifferenceCoverLaw();

    /** Found by going through all periods, apart from this code. */
    @ParameterizedTest
    @CsvSource({"2, 8/3, 3", "3, 25/7, 5", "5, 225/31, 11", "8, 1165/51, 31", "12, 18469/195, 127"})
    void smallWidthsHaveTheseMeansAndWorstCases(int width, String mean, long worst) {
        assertEquals(Optional.of(mean), law.mean(width).fraction());
        assertEquals(OptionalLong.of(worst), law.worst(width));
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("C").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertEquals(
                    Optional.of(row.required("mean_floor").asString()),
                    law.mean(width).fraction());
            assertPrints(
                    row.required("mean_floor_dec").asString(), law.mean(width).value());
            assertEquals(OptionalLong.of(Long.parseLong(row.required("worst").asString())), law.worst(width));
        }
    }

    /** The naive twin: goes through the points and looks for one whose partner was there before. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 8, 9})
    void theCountOfEveryPeriodIsThatOfTheWalk(int width) {
        MomentsByListing listed = new MomentsByListing();
        for (long s = 1; s < 1L << width; s++) {
            long count = walk(width, s);
            assertEquals(OptionalLong.of(count), law.queries(width, s));
            listed.add(count);
        }
        listed.assertAre(law, width);
        listed.assertDistributionIs(law, width);
    }

    private static long walk(int width, long s) {
        long block = 1L << (width / 2);
        Set<Long> seen = new HashSet<>();
        for (long x = 0; x < 1L << width; x += x < block ? 1 : block) {
            seen.add(x);
            if (seen.contains(x ^ s)) {
                return seen.size();
            }
        }
        throw new IllegalStateException("no two points differ by " + s);
    }
}
