package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

/** The power of a sample: the hypergeometric law against check values, listing, and its own words. */
class SpotCheckTest {

    /** Check values, section M (hypergeometric law; derived, and confirmed there by all subsets for N up to 7). */
    @Test
    void everyCheckValueIsMet() throws IOException {
        int rows = 0;
        for (JsonNode row : CheckValues.section("M").required("table")) {
            long all = row.required("N").asLong();
            long forged = row.required("b").asLong();
            for (Map.Entry<String, JsonNode> value : row.required("catch").properties()) {
                assertPrints(
                        value.getValue().asString(), SpotCheck.caught(all, forged, Long.parseLong(value.getKey())));
            }
            for (Map.Entry<String, JsonNode> least : row.required("least_k").properties()) {
                BigDecimal wanted = new BigDecimal(least.getKey());
                long k = least.getValue().asLong();
                assertTrue(SpotCheck.caught(all, forged, k).compareTo(wanted) >= 0, row + " " + least);
                assertTrue(SpotCheck.caught(all, forged, k - 1).compareTo(wanted) < 0, row + " " + least);
            }
            rows++;
        }
        assertTrue(rows >= 25, rows + " rows");
    }

    /** The same law a second time where the check values are not at hand: section M, five of its figures. */
    @ParameterizedTest
    @CsvSource({
        "20, 2, 5, 0.4473684211",
        "50, 10, 30, 0.9999820141",
        "200, 5, 100, 0.9703083948",
        "1000, 10, 100, 0.6530722852",
        "10000, 500, 50, 0.9235511973"
    })
    void aFigureOfTheTableIsMet(long all, long forged, long sampled, String printed) {
        assertPrints(printed, SpotCheck.caught(all, forged, sampled));
    }

    /** Every subset of up to nine trials is listed. */
    @Test
    void theLawIsTheShareOfSubsetsThatHoldAForgedTrial() {
        for (int all = 1; all <= 9; all++) {
            for (int forged = 0; forged <= all; forged++) {
                for (int sampled = 0; sampled <= all; sampled++) {
                    long subsets = 0;
                    long holding = 0;
                    for (int subset = 0; subset < 1 << all; subset++) {
                        if (Integer.bitCount(subset) == sampled) {
                            subsets++;
                            holding += (subset & ((1 << forged) - 1)) == 0 ? 0 : 1;
                        }
                    }
                    BigDecimal listed = Decimals.quotient(holding, subsets);
                    BigDecimal off = listed.subtract(SpotCheck.caught(all, forged, sampled))
                            .abs();
                    assertTrue(off.compareTo(new BigDecimal("1e-40")) < 0, all + " " + forged + " " + sampled);
                }
            }
        }
    }

    @Test
    void onlyCertaintyIsCalledOne() {
        // 1 % of 1000 is 10; 990 drawn miss all ten in one of C(1000, 10) cases; 991 cannot.
        assertTrue(SpotCheck.sentence(1000, 990).endsWith("probability 0.999"), SpotCheck.sentence(1000, 990));
        assertTrue(SpotCheck.sentence(1000, 991).endsWith("probability 1.000"), SpotCheck.sentence(1000, 991));
        assertTrue(SpotCheck.sentence(1000, 100).contains("0.653"));
    }

    @Test
    void aHundredthIsRoundedUpToAWholeTrialAndSaid() {
        assertTrue(SpotCheck.sentence(120, 1).contains("1 % of the trials (2)"));
        assertTrue(SpotCheck.sentence(1, 1).contains("1 % of the trials (1)"));
        assertEquals(0, SpotCheck.caught(100, 0, 50).signum());
        assertFalse(SpotCheck.sentence(100, 1).contains("(2)"));
    }

    @Test
    void moreThanThereAreIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> SpotCheck.caught(10, 11, 1));
        assertThrows(IllegalArgumentException.class, () -> SpotCheck.caught(10, 1, 11));
        assertThrows(IllegalArgumentException.class, () -> SpotCheck.caught(10, -1, 1));
    }
}
