package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class FourierRoundsLawTest {

    private final FourierRoundsLaw law = new FourierRoundsLaw();

    /** Summed by hand. */
    @ParameterizedTest
    @CsvSource({"2, 2", "3, 10/3", "4, 94/21", "5, 194/35", "6, 7134/1085", "8, 10663922/1240155"})
    void smallWidthsHaveTheseMeans(int width, String mean) {
        assertEquals(Optional.of(mean), law.mean(width).fraction());
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("F").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            if (!row.required("mean").isNull()) {
                assertEquals(
                        Optional.of(row.required("mean").asString()),
                        law.mean(width).fraction());
            }
            assertPrints(row.required("mean_dec").asString(), law.mean(width).value());
            assertPrints(
                    row.required("excess").asString(), law.mean(width).value().subtract(BigDecimal.valueOf(width - 1)));
            BigDecimal variance = law.variance(width).orElseThrow();
            assertPrints(row.required("variance").asString(), variance);
            assertPrints(row.required("sd").asString(), Decimals.root(variance));
            if (!row.required("p_min").isNull()) {
                assertEquals(
                        Fractions.value(row.required("p_min").asString()),
                        law.within(width, width - 1).orElseThrow().value());
            }
            assertPrints(
                    row.required("p_min_dec").asString(),
                    law.within(width, width - 1).orElseThrow().value());
            assertPrints(
                    row.required("p_n").asString(),
                    law.within(width, width).orElseThrow().value());
            assertPrints(
                    row.required("p_np4").asString(),
                    law.within(width, width + 4).orElseThrow().value());
            assertPrints(
                    row.required("p_np9").asString(),
                    law.within(width, width + 9).orElseThrow().value());
            assertQuantiles(width, row.required("quantiles"));
        }
    }

    private void assertQuantiles(int width, JsonNode quantiles) {
        assertEquals(9, quantiles.size());
        for (Map.Entry<String, JsonNode> quantile : quantiles.properties()) {
            BigDecimal p = new BigDecimal(quantile.getKey());
            int rounds = quantile.getValue().asInt();
            assertTrue(law.within(width, rounds).orElseThrow().value().compareTo(p) >= 0);
            assertTrue(law.within(width, rounds - 1).orElseThrow().value().compareTo(p) < 0);
        }
    }

    /** ∏(1 − 2^−k) over all k, OEIS A048651. */
    @Test
    void independentWordsAppearAtOnceWithTheLimitProbability() {
        assertPrints("0.28878809508660242", law.within(63, 62).orElseThrow().value());
    }

    /** Limits of P(R ≤ n − 1 + e), e = 0 … 11: the product of OEIS A048651 divided by its first e factors. */
    @Test
    void afterEveryFurtherRoundTheProbabilityIsTheLimitOverOneMoreFactor() {
        List<String> limits = List.of(
                "0.2887880950866",
                "0.5775761901732",
                "0.7701015868976",
                "0.8801160993116",
                "0.9387905059323",
                "0.9690740706398",
                "0.9844561987452",
                "0.9922078223574",
                "0.9960988334254",
                "0.9980481462110",
                "0.9990237553471",
                "0.9995117982173");
        for (int e = 0; e < limits.size(); e++) {
            assertPrints(limits.get(e), law.within(63, 62 + e).orElseThrow().value());
        }
    }

    /** The sum of 1 / (2^k − 1) over all k, the constant of Erdős and Borwein, OEIS A065442. */
    @Test
    void theMeanExceedsTheRankByTheLimitExcess() {
        assertPrints("1.60669515241529176", law.mean(63).value().subtract(BigDecimal.valueOf(62)));
    }

    /** The naive twin: all tuples of words orthogonal to the period 2^(n−1), which are all words of n − 1 bits. */
    @ParameterizedTest
    @CsvSource({"2, 1", "2, 4", "3, 1", "3, 2", "3, 5", "4, 3", "4, 5", "5, 4"})
    void theProbabilityIsTheFractionOfAllTuplesThatSpan(int width, int rounds) {
        long tuples = 1L << (rounds * (width - 1));
        long spanning = 0;
        for (long tuple = 0; tuple < tuples; tuple++) {
            EchelonBasis basis = new EchelonBasis(width - 1);
            for (int i = 0; i < rounds; i++) {
                basis.add(tuple >>> (i * (width - 1)) & ((1L << (width - 1)) - 1));
            }
            spanning += basis.rank() == width - 1 ? 1 : 0;
        }
        assertEquals(
                Prediction.ratio(BigInteger.valueOf(spanning), BigInteger.valueOf(tuples)),
                law.within(width, rounds).orElseThrow());
    }

    /** E[R] = Σ P(R > m) and E[R²] = Σ (2m + 1) P(R > m). */
    @ParameterizedTest
    @CsvSource({"2", "5", "12"})
    void meanAndVarianceAreThoseOfTheDistribution(int width) {
        BigDecimal mean = BigDecimal.ZERO;
        BigDecimal square = BigDecimal.ZERO;
        for (int m = 0; m < width + 130; m++) {
            BigDecimal more =
                    BigDecimal.ONE.subtract(law.within(width, m).orElseThrow().value());
            mean = mean.add(more);
            square = square.add(more.multiply(BigDecimal.valueOf(2L * m + 1)));
        }
        assertEquals(Decimals.text(mean, 30), Decimals.text(law.mean(width).value(), 30));
        assertEquals(
                Decimals.text(square.subtract(mean.multiply(mean)), 30),
                Decimals.text(law.variance(width).orElseThrow(), 30));
    }

    @Test
    void thereIsNoWorstCaseAndNoCountOfAPeriod() {
        assertEquals(OptionalLong.empty(), law.worst(8));
        assertEquals(OptionalLong.empty(), law.queries(8, 1));
    }
}
