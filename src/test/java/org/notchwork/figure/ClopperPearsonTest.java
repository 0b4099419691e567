package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import tools.jackson.databind.JsonNode;

class ClopperPearsonTest {

    private static final BigDecimal STEP = new BigDecimal("0.000001");
    private static final BigDecimal TAIL = new BigDecimal("0.025");

    /** R. G. Newcombe, Statistics in Medicine 17 (1998) 857–872, Table I, method 5, to four places. */
    @ParameterizedTest
    @CsvSource({"81, 263, 0.2527, 0.3676", "15, 148, 0.0578, 0.1617", "0, 20, 0.0000, 0.1684", "1, 29, 0.0009, 0.1776"})
    void newcombesIntervalsAreMet(long solved, long trials, String low, String high) {
        Interval interval = ClopperPearson.interval(solved, trials);
        assertPrints(low, interval.low());
        assertPrints(high, interval.high());
    }

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("L").required("proportion");
        assertEquals(7, rows.size());
        for (JsonNode row : rows) {
            Interval interval = ClopperPearson.interval(
                    row.required("x").asLong(), row.required("n").asLong());
            JsonNode ends = row.required("clopper_pearson");
            assertEquals(rounded(ends.get(0).asString()), interval.low());
            assertEquals(rounded(ends.get(1).asString()), interval.high());
        }
    }

    private static BigDecimal rounded(String printed) {
        return new BigDecimal(printed).setScale(6, RoundingMode.HALF_EVEN);
    }

    /** P(X = 0) = (1 − p)^n = 0.025 at the upper end of 0 / n; n / n is its mirror image. */
    @Test
    void noneAndAllOfNHaveTheirClosedForms() {
        for (int n = 1; n <= 3000; n++) {
            double closed = 1 - Math.pow(0.025, 1.0 / n);
            Interval none = ClopperPearson.interval(0, n);
            Interval all = ClopperPearson.interval(n, n);
            assertEquals(new BigDecimal("0.000000"), none.low());
            assertEquals(closed, none.high().doubleValue(), 0.5001e-6);
            assertEquals(BigDecimal.ONE.subtract(none.high()), all.low());
            assertEquals(new BigDecimal("1.000000"), all.high());
        }
    }

    /** The definition: one step of the last place beyond either end the tail is on the other side of 2.5 %. */
    @ParameterizedTest
    @CsvSource({"1, 2", "3, 7", "5, 10", "23, 60", "50, 100", "1, 200", "199, 200", "120, 300"})
    void theTailsAtTheEndsAreTwoAndAHalfPercent(int solved, int trials) {
        Interval interval = ClopperPearson.interval(solved, trials);
        BigDecimal low = interval.low();
        assertTrue(atLeast(solved, trials, low.subtract(STEP)).compareTo(TAIL) < 0);
        assertTrue(atLeast(solved, trials, low.add(STEP)).compareTo(TAIL) > 0);
        BigDecimal high = interval.high();
        assertTrue(atMost(solved, trials, high.subtract(STEP)).compareTo(TAIL) > 0);
        assertTrue(atMost(solved, trials, high.add(STEP)).compareTo(TAIL) < 0);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 9, 40})
    void theTailsAreTheSumsOfTheBinomialTerms(int trials) {
        for (int solved = 0; solved <= trials; solved++) {
            for (String p : new String[] {"0.0000005", "0.1234565", "0.5", "0.9999995"}) {
                BigDecimal at = new BigDecimal(p);
                assertClose(atMost(solved, trials, at), ClopperPearson.lowerTail(solved, trials, at));
                assertClose(atLeast(solved, trials, at), ClopperPearson.upperTail(solved, trials, at));
            }
        }
    }

    private static void assertClose(BigDecimal expected, BigDecimal value) {
        assertTrue(expected.subtract(value).abs().compareTo(new BigDecimal("1e-45")) < 0, value::toString);
    }

    private static BigDecimal atMost(int solved, int trials, BigDecimal p) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int k = 0; k <= solved; k++) {
            sum = sum.add(term(k, trials, p));
        }
        return sum;
    }

    private static BigDecimal atLeast(int solved, int trials, BigDecimal p) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int k = solved; k <= trials; k++) {
            sum = sum.add(term(k, trials, p));
        }
        return sum;
    }

    private static BigDecimal term(int k, int n, BigDecimal p) {
        BigInteger ways = BigInteger.ONE;
        for (int i = 1; i <= k; i++) {
            ways = ways.multiply(BigInteger.valueOf(n - i + 1L)).divide(BigInteger.valueOf(i));
        }
        return new BigDecimal(ways)
                .multiply(p.pow(k, Decimals.CONTEXT))
                .multiply(BigDecimal.ONE.subtract(p).pow(n - k, Decimals.CONTEXT));
    }

    @Test
    void aMillionTrialsHaveAnInterval() {
        Interval interval = ClopperPearson.interval(999_999, 1_000_000);
        assertTrue(interval.low().compareTo(new BigDecimal("0.999994")) >= 0);
        assertTrue(interval.high().compareTo(BigDecimal.ONE) <= 0);
    }

    @Test
    void moreTrialsThanTheLibraryTakesAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> ClopperPearson.interval(1, 1L << 31));
    }
}
