package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class SubspaceLawsTest {

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("H").required("table");
        assertEquals(54, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            int dimension = row.required("k").asInt();
            assertPrints(
                    row.required("quantum_rounds_mean").asString(),
                    new SubspaceRoundsLaw(dimension).mean(width).value());
            SubspaceCollisionsLaw law = new SubspaceCollisionsLaw(dimension);
            if (width <= 24) {
                Prediction first = law.firstCollision(width);
                assertPrints(row.required("first_collision_mean").asString(), first.value());
                assertFraction(row.path("first_collision_exact"), first);
            }
            assertEquals(law.reaches(width), row.hasNonNull("all_of_S_mean"));
            if (law.reaches(width)) {
                assertPrints(
                        row.required("all_of_S_mean").asString(),
                        law.mean(width).value());
                assertFraction(row.path("all_of_S_exact"), law.mean(width));
            }
        }
    }

    private static void assertFraction(JsonNode expected, Prediction prediction) {
        if (expected.isString()) {
            assertEquals(Optional.of(expected.asString()), prediction.fraction());
        }
    }

    /** The naive twin: all sets of m points, the subspace spanned by the lowest unit words. */
    @ParameterizedTest
    @CsvSource({"2, 1", "2, 2", "3, 1", "3, 2", "3, 3", "4, 1", "4, 2", "4, 3"})
    void theDistributionIsThatOfAllSets(int width, int dimension) {
        int size = 1 << width;
        long[] sets = new long[size + 1];
        long[] spanning = new long[size + 1];
        for (int set = 0; set < 1 << size; set++) {
            int points = Integer.bitCount(set);
            sets[points]++;
            EchelonBasis basis = new EchelonBasis(width);
            for (int x = 0; x < size; x++) {
                for (int s = 1; s < 1 << dimension; s++) {
                    if ((set >>> x & 1) == 1 && (set >>> (x ^ s) & 1) == 1) {
                        basis.add(s);
                    }
                }
            }
            spanning[points] += basis.rank() == dimension ? 1 : 0;
        }
        SubspaceCollisionsLaw law = new SubspaceCollisionsLaw(dimension);
        BigDecimal square = BigDecimal.ZERO;
        for (int m = 0; m <= size; m++) {
            assertEquals(
                    Optional.of(Prediction.ratio(BigInteger.valueOf(spanning[m]), BigInteger.valueOf(sets[m]))),
                    law.within(width, m));
            square = square.add(Decimals.quotient((2L * m + 1) * (sets[m] - spanning[m]), sets[m]));
        }
        long worst = law.worst(width).orElseThrow();
        assertEquals(sets[(int) worst], spanning[(int) worst]);
        assertTrue(spanning[(int) worst - 1] < sets[(int) worst - 1]);
        BigDecimal mean = law.mean(width).value();
        assertEquals(
                Decimals.text(square.subtract(mean.multiply(mean)), 40),
                Decimals.text(law.variance(width).orElseThrow(), 40));
    }

    @Test
    void widthsOutOfReachAreRefused() {
        SubspaceCollisionsLaw law = new SubspaceCollisionsLaw(2);
        assertFalse(law.reaches(11));
        assertThrows(IllegalArgumentException.class, () -> law.mean(11));
        assertThrows(IllegalArgumentException.class, () -> law.within(1, 1));
        assertThrows(IllegalArgumentException.class, () -> new SubspaceRoundsLaw(3).mean(2));
        assertThrows(IllegalArgumentException.class, () -> new SubspaceRoundsLaw(0));
    }

    @Test
    void aPeriodIsASubspaceOfDimensionOne() {
        assertEquals(new FourierRoundsLaw().within(6, 7), new SubspaceRoundsLaw(1).within(6, 7));
        assertEquals(new FourierRoundsLaw().variance(6), new SubspaceRoundsLaw(3).variance(8));
    }
}
