package org.notchwork.strategy.quantum.decoder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class NaturalLogarithmTest {

    private static long scaled(String decimal, int scale) {
        return new BigDecimal(decimal)
                .multiply(new BigDecimal(BigInteger.ONE.shiftLeft(scale)))
                .setScale(0, RoundingMode.HALF_UP)
                .longValueExact();
    }

    /** Printed values: ln 2, ln 3 and ln 10 are OEIS A002162, A002391 and A002392. */
    @ParameterizedTest
    @CsvSource({
        "2, 0.693147180559945309417232121458",
        "3, 1.098612288668109691395245236923",
        "10, 2.302585092994045684017991454684",
        "0.5, -0.693147180559945309417232121458",
        "0.1, -2.302585092994045684017991454684",
        "8, 2.079441541679835928251696364374",
        "1, 0"
    })
    void printedValuesComeOutToTheLastBit(String x, String logarithm) {
        for (int scale : new int[] {10, 40, 60}) {
            assertEquals(scaled(logarithm, scale), NaturalLogarithm.scaled(new BigDecimal(x), scale), "scale " + scale);
        }
    }

    /** 12 digits and more at the scale that the decoder uses: an error below 2^−41. */
    @Test
    void aProductsLogarithmIsTheSum() {
        RandomStream stream = Streams.named("logarithm");
        for (int i = 0; i < 2000; i++) {
            BigDecimal a = BigDecimal.valueOf(1 + stream.bits(40), 12);
            BigDecimal b = BigDecimal.valueOf(1 + stream.bits(40), 12);
            long sum = NaturalLogarithm.scaled(a, 40) + NaturalLogarithm.scaled(b, 40);
            assertTrue(Math.abs(sum - NaturalLogarithm.scaled(a.multiply(b), 40)) <= 1, a + " and " + b);
        }
    }

    @Test
    void theInverseIsTheNegative() {
        RandomStream stream = Streams.named("inverse");
        for (int i = 0; i < 500; i++) {
            long power = 1 + stream.below(30);
            BigDecimal x = BigDecimal.valueOf(2).pow((int) power);
            assertEquals(
                    -NaturalLogarithm.scaled(x, 40),
                    NaturalLogarithm.scaled(BigDecimal.ONE.divide(x), 40),
                    "2^" + power);
        }
    }

    /** The machine's own logarithm is good to about 2^−52: no further off than one unit of 2^−40 after rounding. */
    @Test
    void itAgreesWithTheMachinesLogarithm() {
        RandomStream stream = Streams.named("machine");
        for (int i = 0; i < 2000; i++) {
            BigDecimal x = BigDecimal.valueOf(1 + stream.bits(45), 13);
            double exact = Math.log(x.doubleValue()) * Math.pow(2, 40);
            assertEquals(exact, (double) NaturalLogarithm.scaled(x, 40), 1);
        }
    }

    @Test
    void itGrowsWithItsArgument() {
        long before = Long.MIN_VALUE;
        for (int i = 1; i <= 4000; i++) {
            long now = NaturalLogarithm.scaled(BigDecimal.valueOf(i, 3), 40);
            assertTrue(now > before, "at " + i);
            before = now;
        }
    }
}
