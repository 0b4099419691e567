package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class BalancedScanLawTest {

    private final BalancedScanLaw law = new BalancedScanLaw();

    @Test
    void theMeansOnBalancedFunctionsAreThoseOfTheCheckValues() throws IOException {
        JsonNode means = CheckValues.section("I").required("dj_mean_balanced");
        assertEquals(10, means.size());
        for (Map.Entry<String, JsonNode> mean : means.properties()) {
            Prediction balanced = law.balancedMean(Integer.parseInt(mean.getKey()));
            if (!mean.getValue().get(0).isNull()) {
                assertEquals(Optional.of(mean.getValue().get(0).asString()), balanced.fraction());
            }
            assertPrints(mean.getValue().get(1).asString(), balanced.value());
        }
    }

    /** P(Q ≤ m) = (1 − error)/2 on balanced functions, since constant ones take M + 1 queries. */
    @Test
    void theDistributionMeetsTheErrorsOfTheCheckValues() throws IOException {
        JsonNode rows = CheckValues.section("I").required("dj");
        assertEquals(104, rows.size());
        for (JsonNode row : rows) {
            int width = row.required("n").asInt();
            long m = row.required("k").asLong();
            if (m <= 1L << (width - 1) && !row.required("err_without").isNull()) {
                List<String> parts =
                        List.of(row.required("err_without").asString().split("/", -1));
                Fraction error = new Fraction(
                        new BigInteger(parts.get(0)),
                        parts.size() == 1 ? BigInteger.ONE : new BigInteger(parts.get(1)));
                assertEquals(Optional.of(error.complement().half().prediction()), law.within(width, m));
            }
        }
    }

    /** The naive twin: every balanced function, scanned from 0 on, and as many constant ones. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void momentsAndDistributionAreThoseOfAllFunctions(int width) {
        int size = 1 << width;
        MomentsByListing listed = new MomentsByListing();
        for (int table = 0; table < 1 << size; table++) {
            if (Integer.bitCount(table) == size / 2) {
                int x = 1;
                while ((table >>> x & 1) == (table & 1)) {
                    x++;
                }
                listed.add(x + 1L);
                listed.add(size / 2 + 1L);
            }
        }
        listed.assertAre(law, width);
        listed.assertDistributionIs(law, width);
    }
}
