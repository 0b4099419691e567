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
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class RandomDrawsLawTest {

    private final RandomDrawsLaw law = new RandomDrawsLaw();

    /** First match among M pairs of socks: 8/3 for two pairs, 128/35 for four; longer ones by exact sums. */
    @ParameterizedTest
    @CsvSource({
        "2, 8/3, 2.66666666667, 0.222222222222, 3",
        "3, 128/35, 3.65714285714, 0.968163265306, 5",
        "4, 32768/6435, 5.09215229215, 2.97783274138, 9",
        "5, 2147483648/300540195, 7.14541243976, 7.79766862601, 17"
    })
    void smallWidthsHaveTheseMeansVariancesAndWorstCases(
            int width, String mean, String decimal, String variance, long worst) {
        assertEquals(Optional.of(mean), law.mean(width).fraction());
        assertPrints(decimal, law.mean(width).value());
        assertPrints(variance, law.variance(width).orElseThrow());
        assertEquals(OptionalLong.of(worst), law.worst(width));
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("B").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            if (!row.required("mean_without_exact").isNull()) {
                assertEquals(
                        Optional.of(row.required("mean_without_exact").asString()),
                        law.mean(width).fraction());
            }
            assertPrints(
                    row.required("mean_without").asString(), law.mean(width).value());
            BigDecimal variance = law.variance(width).orElseThrow();
            assertPrints(row.required("var_without").asString(), variance);
            assertPrints(row.required("sd_without").asString(), Decimals.root(variance));
            assertEquals(
                    OptionalLong.of(Long.parseLong(row.required("worst_without").asString())), law.worst(width));
        }
    }

    /** The naive twin: Σ P(Q > m) with P(Q = m + 1 | Q > m) = m / (2^n − m). */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 6, 8})
    void meanAndVarianceAreThoseOfTheDrawsOneByOne(int width) {
        BigInteger size = BigInteger.ONE.shiftLeft(width);
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        BigDecimal mean = BigDecimal.ZERO;
        BigDecimal square = BigDecimal.ZERO;
        for (int m = 0; m <= 1 << (width - 1); m++) {
            BigDecimal more = Decimals.quotient(top, bottom);
            mean = mean.add(more);
            square = square.add(more.multiply(BigDecimal.valueOf(2L * m + 1)));
            top = top.multiply(size.subtract(BigInteger.valueOf(2L * m)));
            bottom = bottom.multiply(size.subtract(BigInteger.valueOf(m)));
        }
        assertEquals(Decimals.text(mean, 40), Decimals.text(law.mean(width).value(), 40));
        assertEquals(
                Decimals.text(square.subtract(mean.multiply(mean)), 40),
                Decimals.text(law.variance(width).orElseThrow(), 40));
    }

    @ParameterizedTest
    @ValueSource(ints = {12, 13, 14})
    void productAndSeriesMeetWhereTheLawChangesFromOneToTheOther(int width) {
        BigDecimal product = product(width);
        assertClose(product, law.mean(width).value());
        assertClose(product, series(width));
    }

    private static void assertClose(BigDecimal expected, BigDecimal value) {
        BigDecimal relative = value.divide(expected, Decimals.CONTEXT)
                .subtract(BigDecimal.ONE)
                .abs();
        assertTrue(relative.compareTo(new BigDecimal("1e-42")) < 0, relative::toString);
    }

    /** 4^M / C(2M, M) in exact integers. */
    private static BigDecimal product(int width) {
        BigInteger top = BigInteger.ONE;
        BigInteger bottom = BigInteger.ONE;
        int pairs = 1 << (width - 1);
        for (int i = 1; i <= pairs; i++) {
            top = top.multiply(BigInteger.valueOf(4L * i));
            bottom = bottom.multiply(BigInteger.valueOf((long) pairs + i));
        }
        return Decimals.quotient(top, bottom);
    }

    /** √(πM) Σ c_k M^−k by Horner's rule; π by the formula of J. Machin (1706). */
    private static BigDecimal series(int width) {
        BigDecimal pairs = BigDecimal.valueOf(1L << (width - 1));
        List<BigDecimal> coefficients = GammaRatioSeries.coefficients();
        BigDecimal sum = BigDecimal.ZERO;
        for (int k = coefficients.size() - 1; k >= 0; k--) {
            sum = sum.divide(pairs, Decimals.CONTEXT).add(coefficients.get(k), Decimals.CONTEXT);
        }
        BigDecimal pi = arcCotangent(5)
                .multiply(BigDecimal.valueOf(16))
                .subtract(arcCotangent(239).multiply(BigDecimal.valueOf(4)));
        return Decimals.root(pi.multiply(pairs)).multiply(sum, Decimals.CONTEXT);
    }

    private static BigDecimal arcCotangent(long x) {
        BigInteger power = BigInteger.valueOf(x);
        BigInteger square = power.multiply(power);
        BigDecimal sum = BigDecimal.ZERO;
        for (int k = 0; k < 50; k++) {
            BigDecimal term = Decimals.quotient(BigInteger.ONE, power.multiply(BigInteger.valueOf(2L * k + 1)));
            sum = k % 2 == 0 ? sum.add(term) : sum.subtract(term);
            power = power.multiply(square);
        }
        return sum;
    }

    @Test
    void countsOfAPeriodDependOnChance() {
        assertEquals(OptionalLong.empty(), law.queries(8, 1));
    }

    /** Section B, the full distributions at n = 2, 3, 4. */
    @Test
    void theDistributionsOfTheCheckValuesAreMet() throws IOException {
        JsonNode distributions = CheckValues.section("B").required("distribution");
        assertEquals(3, distributions.size());
        for (Map.Entry<String, JsonNode> width : distributions.properties()) {
            Fraction sum = Fraction.ZERO;
            for (Map.Entry<String, JsonNode> count : width.getValue().properties()) {
                List<String> parts = List.of(count.getValue().asString().split("/", -1));
                sum = sum.plus(new Fraction(new BigInteger(parts.get(0)), new BigInteger(parts.get(1))));
                assertEquals(
                        Optional.of(sum.prediction()),
                        law.within(Integer.parseInt(width.getKey()), Long.parseLong(count.getKey())));
            }
            assertEquals(Fraction.ONE.prediction(), sum.prediction());
        }
    }

    /** Section B, the least m with P(Q ≤ m) ≥ p, where the law gives a probability. */
    @Test
    void theQuantilesOfTheCheckValuesAreMet() throws IOException {
        int checked = 0;
        for (JsonNode row : CheckValues.section("B").required("table")) {
            int width = row.required("n").asInt();
            for (Map.Entry<String, JsonNode> quantile :
                    row.required("quantiles_without").properties()) {
                long m = quantile.getValue().asLong();
                if (law.within(width, m).isPresent()) {
                    BigDecimal p = new BigDecimal(quantile.getKey());
                    assertTrue(law.within(width, m).orElseThrow().value().compareTo(p) >= 0);
                    assertTrue(law.within(width, m - 1).orElseThrow().value().compareTo(p) < 0);
                    checked++;
                }
            }
        }
        assertEquals(15 * 7 - 10, checked);
    }

    @Test
    void aProbabilityThatTakesTooManyFactorsIsNotGiven() {
        assertEquals(Optional.empty(), law.within(20, Fraction.MOST_FACTORS + 1));
        assertEquals(Optional.of(Fraction.ONE.prediction()), law.within(20, (1L << 19) + 1));
    }
}
