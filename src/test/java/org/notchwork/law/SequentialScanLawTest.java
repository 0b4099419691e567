package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class SequentialScanLawTest {

    private final SequentialScanLaw law = new SequentialScanLaw();

    /** Worked out by hand: (2^n + 4) / 3 and (2^(n+1) − 1)(2^n − 2) / 63. */
    @ParameterizedTest
    @CsvSource({"2, 8/3, 2/9, 3", "3, 4, 10/7, 5", "6, 68/3, 7874/63, 33", "10, 1028/3, 298862/9, 513"})
    void smallWidthsHaveTheseMeansVariancesAndWorstCases(int width, String mean, String variance, long worst) {
        assertEquals(Optional.of(mean), law.mean(width).fraction());
        assertEquals(Fractions.value(variance), law.variance(width).orElseThrow());
        assertEquals(OptionalLong.of(worst), law.worst(width));
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("A").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertEquals(
                    Optional.of(row.required("mean").asString()),
                    law.mean(width).fraction());
            assertPrints(row.required("mean_dec").asString(), law.mean(width).value());
            assertEquals(
                    Fractions.value(row.required("variance").asString()),
                    law.variance(width).orElseThrow());
            assertPrints(
                    row.required("sd").asString(),
                    Decimals.root(law.variance(width).orElseThrow()));
            assertEquals(OptionalLong.of(Long.parseLong(row.required("worst").asString())), law.worst(width));
        }
    }

    /** The naive twin: the first point x whose partner x ⊕ s came before it. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 7, 9})
    void theCountOfEveryPeriodIsThatOfTheScan(int width) {
        MomentsByListing listed = new MomentsByListing();
        for (long s = 1; s < 1L << width; s++) {
            long x = 0;
            while ((x ^ s) >= x) {
                x++;
            }
            assertEquals(OptionalLong.of(x + 1), law.queries(width, s));
            listed.add(x + 1);
        }
        listed.assertAre(law, width);
        listed.assertDistributionIs(law, width);
    }

    @Test
    void theMeanAtWidth63IsExact() {
        assertEquals(
                Optional.of("3074457345618258604"),
                law.mean(63).fraction(),
                () -> BigInteger.ONE.shiftLeft(63).toString());
    }
}
