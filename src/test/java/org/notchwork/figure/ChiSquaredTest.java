package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class ChiSquaredTest {

    private static final MathContext WIDE = new MathContext(250);
    private static final BigDecimal TWO = BigDecimal.valueOf(2);

    /**
     * Table of the percentage points, M. Abramowitz and I. A. Stegun (1964), table 26.8; from memory, to the three
     * places there are. The tail is on the other side of its probability one step of the last place away.
     */
    @ParameterizedTest
    @CsvSource({
        "1, 3.841, 0.05",
        "1, 6.635, 0.01",
        "1, 10.828, 0.001",
        "2, 5.991, 0.05",
        "3, 7.815, 0.05",
        "4, 9.488, 0.05",
        "5, 15.086, 0.01",
        "10, 18.307, 0.05",
        "10, 23.209, 0.01",
        "20, 31.410, 0.05",
        "30, 43.773, 0.05",
        "100, 124.342, 0.05"
    })
    void theTableIsMet(int degrees, BigDecimal point, BigDecimal tail) {
        BigDecimal step = new BigDecimal("0.0005");
        assertTrue(ChiSquared.pValue(point.subtract(step), degrees).compareTo(tail) >= 0);
        assertTrue(ChiSquared.pValue(point.add(step), degrees).compareTo(tail) <= 0);
    }

    /** Quantiles as statistical systems print them, from memory: right to half a unit of their last place. */
    @ParameterizedTest
    @CsvSource({"1, 3.841458820694124, 0.05", "10, 18.307038053275146, 0.05", "5, 15.08627246938899, 0.01"})
    void quantilesInDoublesAreMet(int degrees, BigDecimal quantile, BigDecimal tail) {
        BigDecimal step = BigDecimal.valueOf(1, quantile.scale() - 1);
        assertTrue(ChiSquared.pValue(quantile.subtract(step), degrees).compareTo(tail) > 0);
        assertTrue(ChiSquared.pValue(quantile.add(step), degrees).compareTo(tail) < 0);
    }

    /** Mendel's 0.47 and the documented 0.84914503608; the others are computed. */
    @Test
    void theExamplesOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("L").required("chi2");
        assertEquals(3, rows.size());
        for (JsonNode row : rows) {
            BigDecimal statistic = Fractions.value(row.required("stat").asString());
            assertPrints(
                    row.required("p").asString(),
                    ChiSquared.pValue(statistic, row.required("df").asInt()));
        }
        assertPrints("0.84914503608", ChiSquared.pValue(TWO, 5));
    }

    /** Computed with mpmath 1.3.0, 90 digits, as regularised incomplete gamma functions. */
    @ParameterizedTest
    @CsvSource({
        "0.001, 1, 0.974772879369960388542257546454579235796829874",
        "3.84, 1, 0.0500435212487050989476636641624144102691726153",
        "59.999, 1, 9.49055827402565010770685045742895484868865907e-15",
        "60, 1, 9.48573757107384838848042894860281013012137026e-15",
        "60.001, 3, 0.000000000000587533975198736584377455384170368639249462675",
        "700, 1, 2.99022697512462033691191162669734055569748973e-154",
        "4999.5, 499, 7.61712608015244512449184535765282498412540595e-731",
        "123.456, 77, 0.000618007071550583595816270608353568030069304984",
        "18.3, 10, 0.0501090614114624626146473267530931461360646399",
        "1000, 500, 1.20851836113297665757674628856732710486350307e-35",
        "480.25, 499, 0.71902591626040882744658202134373078910717461",
        "5000, 2, 1.8356726691621568930772530518731475674697467e-1086"
    })
    void fortyDigitsAreMet(BigDecimal statistic, int degrees, BigDecimal expected) {
        BigDecimal error = ChiSquared.pValue(statistic, degrees).subtract(expected);
        assertTrue(error.abs().compareTo(expected.multiply(new BigDecimal("1e-43"))) <= 0, error::toString);
    }

    /**
     * The naive twin of erfc, on both sides of where the fraction takes over: 1 − √(2x/π) Σ (−x/2)^n / (n! (2n + 1))
     * (Abramowitz and Stegun, 7.1.5), which alternates, with 250 digits.
     */
    @ParameterizedTest
    @ValueSource(strings = {"0.000001", "0.5", "1", "7.25", "33", "59.9999", "60", "61", "75", "150", "200"})
    void oneDegreeOfFreedomIsTheErrorFunction(String text) {
        BigDecimal x = new BigDecimal(text);
        BigDecimal half = x.divide(TWO).negate();
        BigDecimal power = BigDecimal.ONE;
        BigDecimal sum = BigDecimal.ZERO;
        for (long n = 0; n < 1500; n++) {
            sum = sum.add(power.divide(BigDecimal.valueOf((2 * n) + 1), WIDE), WIDE);
            power = power.multiply(half, WIDE).divide(BigDecimal.valueOf(n + 1), WIDE);
        }
        BigDecimal factor = x.multiply(TWO).divide(pi(), WIDE).sqrt(WIDE);
        BigDecimal expected = BigDecimal.ONE.subtract(factor.multiply(sum, WIDE));
        BigDecimal error = ChiSquared.pValue(x, 1).subtract(expected);
        assertTrue(error.abs().compareTo(expected.multiply(new BigDecimal("1e-48"))) <= 0, error::toString);
    }

    /** J. Machin's formula: π = 16 arctan(1/5) − 4 arctan(1/239). */
    @Test
    void piIsPi() {
        assertEquals(Pi.VALUE, pi().setScale(100, RoundingMode.DOWN));
    }

    private static BigDecimal pi() {
        return arcTangent(5)
                .multiply(BigDecimal.valueOf(16))
                .subtract(arcTangent(239).multiply(BigDecimal.valueOf(4)));
    }

    private static BigDecimal arcTangent(long inverse) {
        BigDecimal power = BigDecimal.ONE.divide(BigDecimal.valueOf(inverse), WIDE);
        BigDecimal sum = BigDecimal.ZERO;
        for (long k = 0; k < 400; k++) {
            BigDecimal term = power.divide(BigDecimal.valueOf((2 * k) + 1), WIDE);
            sum = k % 2 == 0 ? sum.add(term) : sum.subtract(term);
            power = power.divide(BigDecimal.valueOf(inverse * inverse), WIDE);
        }
        return sum;
    }

    /** Q(a + 1, x) = Q(a, x) + x^a e^−x / Γ(a + 1): here as a ratio of neighbouring steps, which are x / (2a + 2). */
    @ParameterizedTest
    @ValueSource(strings = {"0.01", "1", "17.5", "59", "61", "300", "777.125"})
    void twoMoreDegreesAddTheNextTerm(String text) {
        BigDecimal x = new BigDecimal(text);
        for (int degrees = 1; degrees + 4 <= ChiSquared.MOST_DEGREES; degrees++) {
            BigDecimal here = ChiSquared.pValue(x, degrees);
            BigDecimal next = ChiSquared.pValue(x, degrees + 2);
            BigDecimal last = ChiSquared.pValue(x, degrees + 4);
            BigDecimal left = last.subtract(next).multiply(BigDecimal.valueOf(degrees + 2L));
            BigDecimal right = next.subtract(here).multiply(x);
            assertTrue(left.subtract(right).abs().compareTo(new BigDecimal("1e-45")) < 0, x + ", " + degrees);
        }
    }

    @Test
    void theTailFallsWithTheStatisticAndRisesWithTheDegrees() {
        for (int degrees : new int[] {1, 2, 3, 10, 11, 199, 499, 500}) {
            BigDecimal before = BigDecimal.ONE;
            for (BigDecimal x = new BigDecimal("0.5");
                    x.compareTo(BigDecimal.valueOf(2000)) < 0;
                    x = x.multiply(new BigDecimal("1.3"))) {
                BigDecimal here = ChiSquared.pValue(x, degrees);
                boolean nearOne = before.compareTo(BigDecimal.ONE) == 0;
                assertTrue(here.compareTo(before) < 0 || nearOne, degrees + ", " + x);
                assertTrue(degrees == 1 || ChiSquared.pValue(x, degrees - 1).compareTo(here) <= 0);
                before = here;
            }
        }
    }

    /** The doubles of the library, which the other tests of fit use. */
    @ParameterizedTest
    @CsvSource({"1, 0.3", "1, 5", "2, 4.5", "7, 12.25", "12, 3.5", "63, 70", "64, 40.5", "199, 230", "500, 480"})
    void theLibrarysDoublesAgree(int degrees, BigDecimal statistic) {
        double p = new org.notchwork.support.ChiSquared(statistic.doubleValue(), degrees).p();
        assertEquals(p, ChiSquared.pValue(statistic, degrees).doubleValue(), 1e-12);
    }

    /** e to 50 places: OEIS A001113; e^x e^−x = 1. */
    @Test
    void theExponentialIsRight() {
        MathContext fifty = new MathContext(50);
        assertEquals(
                new BigDecimal("2.7182818284590452353602874713526624977572470937000"),
                Exponential.of(BigDecimal.ONE, fifty));
        assertEquals(0, Exponential.of(BigDecimal.ZERO, fifty).compareTo(BigDecimal.ONE));
        for (String text : new String[] {"1e-30", "0.5", "3.75", "255", "2500"}) {
            BigDecimal x = new BigDecimal(text);
            BigDecimal product = Exponential.of(x, fifty).multiply(Exponential.of(x.negate(), fifty));
            assertTrue(product.subtract(BigDecimal.ONE).abs().compareTo(new BigDecimal("1e-48")) < 0, text);
        }
    }

    @Test
    void theEndsAreExact() {
        assertEquals(BigDecimal.ONE, ChiSquared.pValue(new BigDecimal("0.000"), 3));
        assertEquals(BigDecimal.ZERO, ChiSquared.pValue(new BigDecimal("5000.1"), 3));
        BigDecimal last = ChiSquared.pValue(BigDecimal.valueOf(5000), 500);
        assertTrue(last.signum() > 0 && last.compareTo(new BigDecimal("1e-700")) < 0);
    }

    @Test
    void whatIsNoStatisticIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> ChiSquared.pValue(BigDecimal.ONE, 0));
        assertThrows(IllegalArgumentException.class, () -> ChiSquared.pValue(BigDecimal.ONE, 501));
        assertThrows(IllegalArgumentException.class, () -> ChiSquared.pValue(new BigDecimal("-0.1"), 1));
    }
}
