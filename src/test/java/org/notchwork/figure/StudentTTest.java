package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.exact.Decimals;

class StudentTTest {

    private static final BigDecimal PI = new BigDecimal("3.14159265358979323846264338327950288419716939937510582");
    private static final BigDecimal HALF_STEP = new BigDecimal("0.0000005");

    /** Table of the 97.5 % points, M. Abramowitz and I. A. Stegun (1964), table 26.10, three places. */
    @ParameterizedTest
    @CsvSource({
        "1, 12.706",
        "2, 4.303",
        "3, 3.182",
        "5, 2.571",
        "10, 2.228",
        "20, 2.086",
        "30, 2.042",
        "60, 2.000",
        "120, 1.980"
    })
    void theTableIsMet(long degrees, String quantile) {
        assertEquals(new BigDecimal(quantile), StudentT.quantile(degrees).setScale(3, RoundingMode.HALF_EVEN));
    }

    /** tan(0.475 π) for one degree of freedom and 0.95 √(2 / (1 − 0.95²)) for two. */
    @Test
    void oneAndTwoDegreesOfFreedomHaveTheirClosedForms() {
        assertEquals(Math.tan(0.475 * Math.PI), StudentT.exact(1), 1e-12);
        assertEquals(0.95 * Math.sqrt(2 / (1 - 0.95 * 0.95)), StudentT.exact(2), 1e-13);
    }

    /**
     * No quantile of 1 to 20 000 degrees of freedom, as computed, lies within 10^−11 of a rounding boundary; a double
     * of this size is spaced by 4 · 10^−16. Where one lies within 10^−9, the exact distribution confirms its side.
     */
    @Test
    void noQuantileLiesSoNearABoundaryThatItsSixPlacesAreInDoubt() {
        int near = 0;
        for (long degrees = 1; degrees <= 20_000; degrees++) {
            BigDecimal quantile = new BigDecimal(StudentT.exact(degrees));
            BigDecimal boundary = quantile.setScale(6, RoundingMode.FLOOR).add(HALF_STEP);
            BigDecimal distance = quantile.subtract(boundary).abs();
            assertTrue(distance.compareTo(new BigDecimal("1e-11")) > 0, "degrees " + degrees);
            if (distance.compareTo(new BigDecimal("1e-9")) < 0) {
                near++;
                boolean below = within(boundary, degrees).compareTo(new BigDecimal("0.95")) > 0;
                assertEquals(below, quantile.compareTo(boundary) < 0, "degrees " + degrees);
            }
        }
        assertTrue(near > 10, "boundaries that come near are there to be examined");
    }

    /** The rounded quantile brackets 95 % between half a step below and half a step above. */
    @ParameterizedTest
    @CsvSource({"100", "101", "499", "999", "1999", "4999", "9999", "19999"})
    void sixPlacesAreThoseOfTheExactDistribution(long degrees) {
        BigDecimal quantile = StudentT.quantile(degrees);
        BigDecimal wanted = new BigDecimal("0.95");
        assertTrue(within(quantile.subtract(HALF_STEP), degrees).compareTo(wanted) < 0);
        assertTrue(within(quantile.add(HALF_STEP), degrees).compareTo(wanted) > 0);
    }

    /** P(|T| ≤ t) as a finite series in θ = arctan(t / √ν), Abramowitz and Stegun, 26.7.3 and 26.7.4. */
    private static BigDecimal within(BigDecimal t, long degrees) {
        BigDecimal nu = BigDecimal.valueOf(degrees);
        BigDecimal all = nu.add(t.multiply(t));
        BigDecimal square = nu.divide(all, Decimals.CONTEXT);
        BigDecimal sine = t.divide(Decimals.root(all), Decimals.CONTEXT);
        boolean odd = degrees % 2 != 0;
        BigDecimal term = odd ? Decimals.root(square) : BigDecimal.ONE;
        BigDecimal sum = BigDecimal.ZERO;
        for (long k = odd ? 1 : 0; k <= degrees - 2; k += 2) {
            sum = sum.add(term, Decimals.CONTEXT);
            term = term.multiply(square, Decimals.CONTEXT).multiply(Decimals.quotient(k + 1, k + 2), Decimals.CONTEXT);
        }
        BigDecimal product = sine.multiply(sum, Decimals.CONTEXT);
        if (!odd) {
            return product;
        }
        BigDecimal angle = arcTangent(t.divide(Decimals.root(nu), Decimals.CONTEXT));
        return angle.add(product).multiply(BigDecimal.valueOf(2)).divide(PI, Decimals.CONTEXT);
    }

    private static BigDecimal arcTangent(BigDecimal x) {
        BigDecimal power = x;
        BigDecimal sum = BigDecimal.ZERO;
        for (int k = 0; k < 60; k++) {
            BigDecimal term = power.divide(BigDecimal.valueOf(2L * k + 1), Decimals.CONTEXT);
            sum = k % 2 == 0 ? sum.add(term, Decimals.CONTEXT) : sum.subtract(term, Decimals.CONTEXT);
            power = power.multiply(x, Decimals.CONTEXT).multiply(x, Decimals.CONTEXT);
        }
        return sum;
    }
}
