package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.notchwork.CheckValues;
import org.notchwork.exact.Decimals;
import tools.jackson.databind.JsonNode;

/** The laws against tables made apart from this program (exhaustive enumeration and exact rationals). */
class LawTablesTest {

    private final SequentialScanLaw scan = new SequentialScanLaw();
    private final RandomDrawsLaw draws = new RandomDrawsLaw();
    private final DifferenceCoverLaw cover = new DifferenceCoverLaw();
    private final FourierRoundsLaw rounds = new FourierRoundsLaw();

    @Test
    void sequentialScanAgreesWithItsTable() {
        for (JsonNode row : CheckValues.section("A").get("table")) {
            int n = row.get("n").intValue();
            assertEquals(Optional.of(row.get("mean").asString()), scan.mean(n).fraction());
            assertDigits(row.get("mean_dec").asString(), scan.mean(n).value());
            assertDigits(
                    row.get("sd").asString(), Decimals.root(scan.variance(n).orElseThrow()));
            assertEquals(
                    row.get("worst").asString(), Long.toString(scan.worst(n).orElseThrow()));
        }
    }

    @Test
    void randomDrawsAgreeWithTheirTable() {
        for (JsonNode row : CheckValues.section("B").get("table")) {
            int n = row.get("n").intValue();
            assertDigits(row.get("mean_without").asString(), draws.mean(n).value());
            assertDigits(row.get("var_without").asString(), draws.variance(n).orElseThrow());
            if (row.hasNonNull("mean_without_exact")
                    && row.get("mean_without_exact").asString().length() < 40
                    && !row.get("mean_without_exact").asString().isEmpty()) {
                assertEquals(
                        Optional.of(row.get("mean_without_exact").asString()),
                        draws.mean(n).fraction());
            }
        }
    }

    @Test
    void differenceCoverAgreesWithItsTable() {
        for (JsonNode row : CheckValues.section("C").get("table")) {
            int n = row.get("n").intValue();
            assertEquals(
                    Optional.of(row.get("mean_floor").asString()), cover.mean(n).fraction());
            assertDigits(row.get("mean_floor_dec").asString(), cover.mean(n).value());
            assertEquals(
                    row.get("worst").asString(), Long.toString(cover.worst(n).orElseThrow()));
        }
    }

    @Test
    void fourierRoundsAgreeWithTheirTable() {
        for (JsonNode row : CheckValues.section("F").get("table")) {
            int n = row.get("n").intValue();
            assertDigits(row.get("mean_dec").asString(), rounds.mean(n).value());
            assertDigits(row.get("variance").asString(), rounds.variance(n).orElseThrow());
            assertDigits(
                    row.get("p_min_dec").asString(), rounds.within(n, n - 1).value());
            assertDigits(row.get("p_n").asString(), rounds.within(n, n).value());
            assertDigits(row.get("p_np4").asString(), rounds.within(n, n + 4).value());
            assertDigits(row.get("p_np9").asString(), rounds.within(n, n + 9).value());
        }
    }

    /** Limit of the product of 1 − 2^−k: OEIS A048651. */
    @Test
    void independentWordsAppearWithTheLimitProbability() {
        assertEquals("0.28878809508660242", Decimals.text(rounds.within(63, 62).value(), 17));
    }

    /** Erdős–Borwein constant: OEIS A065442. The excess over n − 1 rounds tends to it. */
    @Test
    void theExcessOfRoundsIsTheErdosBorweinConstant() {
        BigDecimal excess = rounds.mean(63).value().subtract(BigDecimal.valueOf(62));
        assertEquals("1.60669515241529176", Decimals.text(excess, 17));
    }

    /** Mean 128/35 of the first match among four pairs: the sock problem, derived by enumeration of all orders. */
    @Test
    void smallExactValuesAreTheTypedOnes() {
        assertEquals(Optional.of("128/35"), draws.mean(3).fraction());
        assertEquals(Optional.of("32768/6435"), draws.mean(4).fraction());
        assertEquals(Optional.of("20/3"), scan.mean(4).fraction());
        assertEquals(Optional.of("225/31"), cover.mean(5).fraction());
        assertEquals(Optional.of("94/21"), rounds.mean(4).fraction());
        assertEquals(OptionalLong.of(31), cover.worst(8));
    }

    /** Wallis: E(M) / E(M/2)... the series continues the exact product: g(M) g(M − 1/2) = M, checked by doubling. */
    @Test
    void theSeriesContinuesTheExactProduct() {
        BigDecimal exact = draws.mean(12).value();
        // E for M = 4096 from E for M = 2048 by the product of 2i / (2i - 1).
        BigDecimal product = exact;
        for (long i = (1L << 11) + 1; i <= 1L << 12; i++) {
            product = product.multiply(Decimals.quotient(2 * i, 2 * i - 1), Decimals.CONTEXT);
        }
        BigDecimal series = draws.mean(13).value();
        assertTrue(
                series.subtract(product).abs().compareTo(new BigDecimal("1e-42")) < 0,
                () -> series + " against the product");
    }

    @Test
    void theVarianceOfTheCoverIsThatOfItsDistribution() {
        for (int n = 2; n <= 10; n++) {
            long size = (1L << n) - 1;
            long sum = 0;
            long squares = 0;
            for (long s = 1; s <= size; s++) {
                long q = cover.queries(n, s).orElseThrow();
                sum += q;
                squares += q * q;
            }
            BigDecimal expected = Decimals.quotient(squares * size - sum * sum, size * size);
            assertEquals(
                    0,
                    expected.round(new MathContext(40))
                            .compareTo(cover.variance(n).orElseThrow().round(new MathContext(40))));
        }
    }

    /** Asserts that a number rounds to a printed one, to the digits that are printed. */
    private static void assertDigits(String printed, BigDecimal number) {
        BigDecimal expected = new BigDecimal(printed);
        BigDecimal unit = expected.ulp();
        BigDecimal off = number.setScale(Math.max(0, expected.scale()) + 4, RoundingMode.HALF_EVEN)
                .subtract(expected)
                .abs();
        assertTrue(off.compareTo(unit) <= 0, () -> printed + " against " + number);
    }
}
