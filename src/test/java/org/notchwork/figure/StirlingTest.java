package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import org.junit.jupiter.api.Test;

class StirlingTest {

    private static final MathContext WORK = new MathContext(90);

    /** m! = √(2π m) (m / e)^m e^μ(m), with the factorial multiplied out. */
    @Test
    void withTheRemainderTheFormulaGivesTheFactorial() {
        for (int m : new int[] {64, 65, 100, 1000}) {
            BigInteger factorial = BigInteger.ONE;
            for (int i = 2; i <= m; i++) {
                factorial = factorial.multiply(BigInteger.valueOf(i));
            }
            BigDecimal size = BigDecimal.valueOf(m);
            BigDecimal formula = Pi.VALUE
                    .multiply(size.add(size))
                    .sqrt(WORK)
                    .multiply(size.pow(m, WORK), WORK)
                    .multiply(Exponential.of(Stirling.remainder(m).subtract(size), WORK), WORK);
            BigDecimal error = formula.divide(new BigDecimal(factorial), WORK).subtract(BigDecimal.ONE);
            assertTrue(error.abs().compareTo(new BigDecimal("1e-65")) < 0, m + ": " + error);
        }
    }

    @Test
    void aNumberTooSmallForTheSeriesIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> Stirling.remainder(63));
    }
}
