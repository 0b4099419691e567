package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class ClassicalLowerBoundTest {

    private final ClassicalLowerBound bound = new ClassicalLowerBound();

    /** Derived by hand: r = 3, 4, 6, 23 and 1449 is the largest number with C(r, 2) ≤ 2^n − 1. */
    @ParameterizedTest
    @CsvSource({"2, 8/3, 3", "3, 25/7, 5", "4, 14/3, 6", "8, 4096/255, 24", "20, 337793617/349525, 1449"})
    void smallWidthsHaveTheseBounds(int width, String mean, long worst) {
        assertEquals(Optional.of(mean), bound.mean(width).fraction());
        assertEquals(worst, bound.worst(width));
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("D").required("lower_bound");
        assertTrue(table.size() >= 15);
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertEquals(
                    Optional.of(row.required("floor_mean").asString()),
                    bound.mean(width).fraction());
            assertPrints(
                    row.required("floor_mean_dec").asString(), bound.mean(width).value());
            assertEquals(Long.parseLong(row.required("floor_worst").asString()), bound.worst(width));
        }
    }

    /** The naive twin: the sum over m of max(0, 1 − C(m, 2) / (2^n − 1)), term by term. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 10, 16})
    void theMeanIsTheSumOfTheProbabilitiesThatNoCollisionIsSeen(int width) {
        long periods = (1L << width) - 1;
        BigInteger sum = BigInteger.ZERO;
        for (long m = 0; m * (m - 1) / 2 < periods; m++) {
            sum = sum.add(BigInteger.valueOf(periods - m * (m - 1) / 2));
            assertEquals(
                    Prediction.ratio(BigInteger.valueOf(m * (m - 1) / 2), BigInteger.valueOf(periods)),
                    bound.within(width, m));
        }
        assertEquals(Prediction.ratio(sum, BigInteger.valueOf(periods)), bound.mean(width));
        assertEquals(Optional.of("1"), bound.within(width, periods).fraction());
    }

    /** No law of a classical strategy may contradict the bound, at any width. */
    @Test
    void noClassicalLawLiesBelowTheBound() {
        List<QueryLaw> laws = List.of(new SequentialScanLaw(), new RandomDrawsLaw(), new DifferenceCoverLaw());
        for (int width = 2; width <= 63; width++) {
            for (QueryLaw law : laws) {
                String place = law.getClass().getSimpleName() + " at width " + width;
                assertTrue(law.mean(width).value().compareTo(bound.mean(width).value()) >= 0, place);
                assertTrue(law.worst(width).orElseThrow() >= bound.worst(width), place);
            }
        }
    }

    /** At every width the quantum rounds stay below what any classical strategy needs: the separation itself. */
    @Test
    void fourierRoundsLieBelowTheBound() {
        FourierRoundsLaw rounds = new FourierRoundsLaw();
        for (int width = 2; width <= 63; width++) {
            assertTrue(rounds.mean(width).value().compareTo(bound.mean(width).value()) < 0, "at width " + width);
        }
    }

    @Test
    void widthsOutOfRangeAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> bound.mean(1));
        assertThrows(IllegalArgumentException.class, () -> bound.worst(64));
    }
}
