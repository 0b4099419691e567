package org.notchwork.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** The one rule for decimals: half to even, six places, plain digits, never -0. */
class DecimalsTest {

    @ParameterizedTest
    @CsvSource({
        "0.0000005, 0.000000",
        "0.0000015, 0.000002",
        "0.0000025, 0.000002",
        "0.0000035, 0.000004",
        "0.00000050000000000000000000000000000001, 0.000001",
        "0.00000149999999999999999999999999999999, 0.000001",
        "2.5, 2.500000",
        "-0.0000015, -0.000002",
        "-0.0000025, -0.000002",
        "0.9999995, 1.000000",
        "9.9999985, 9.999998",
        "1E+12, 1000000000000.000000",
        "1E-30, 0.000000",
        "12345678901234567890123456789012345678.5, 12345678901234567890123456789012345678.500000"
    })
    void aTieGoesToTheEvenDigitAndDigitsStayPlain(String value, String written) {
        assertEquals(written, Decimals.text(new BigDecimal(value)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-0", "0E+9", "-0.0", "-0.0000001", "-0.0000005", "-1E-40", "0E-12"})
    void whatRoundsToZeroIsWrittenWithoutASign(String value) {
        assertEquals("0.000000", Decimals.text(new BigDecimal(value)));
        assertEquals("0", Decimals.text(new BigDecimal(value), 0));
    }

    @Test
    void theNumberOfPlacesIsAsAskedFor() {
        assertEquals("2", Decimals.text(new BigDecimal("2.5"), 0));
        assertEquals("4", Decimals.text(new BigDecimal("3.5"), 0));
        assertEquals("0.12", Decimals.text(new BigDecimal("0.125"), 2));
        assertEquals("0.500000000000", Decimals.text(new BigDecimal("0.5"), 12));
    }

    /** A naive twin: round the integer part of 10^6 p / q by hand. */
    @Test
    void roundingAgreesWithIntegerArithmetic() {
        RandomStream stream = Streams.named("rounding");
        for (int i = 0; i < 2_000; i++) {
            long p = stream.bits(30) - (1L << 29);
            long q = 2L << stream.below(20);
            assertEquals(byHand(p, q), Decimals.text(Decimals.quotient(p, q)), p + "/" + q);
        }
    }

    private static String byHand(long p, long q) {
        BigInteger[] parts = BigInteger.valueOf(Math.abs(p))
                .multiply(BigInteger.valueOf(1_000_000))
                .divideAndRemainder(BigInteger.valueOf(q));
        int side = parts[1].shiftLeft(1).compareTo(BigInteger.valueOf(q));
        boolean up = side > 0 || (side == 0 && parts[0].testBit(0));
        BigInteger millionths = up ? parts[0].add(BigInteger.ONE) : parts[0];
        String digits = millionths.toString();
        String padded = "0".repeat(Math.max(0, 7 - digits.length())) + digits;
        int point = padded.length() - 6;
        String sign = p < 0 && millionths.signum() != 0 ? "-" : "";
        return sign + padded.substring(0, point) + "." + padded.substring(point);
    }

    /** sqrt 2 to 49 places after the point: OEIS A002193; 1/7 = 0.(142857). */
    @Test
    void quotientsAndRootsHaveFiftyDigits() {
        assertEquals(
                "1.4142135623730950488016887242096980785696718753769",
                Decimals.root(BigDecimal.valueOf(2)).toPlainString());
        assertEquals("0." + "142857".repeat(8) + "14", Decimals.quotient(1, 7).toPlainString());
        assertEquals(Decimals.quotient(22, 7), Decimals.quotient(BigInteger.valueOf(22), BigInteger.valueOf(7)));
        assertThrows(ArithmeticException.class, () -> Decimals.quotient(1, 0));
        assertThrows(ArithmeticException.class, () -> Decimals.root(BigDecimal.valueOf(-1)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "12", "-3", "0.5", "-0.25", "10.000000", "9007199254740993", "1.123456789012"})
    void aWrittenDecimalHasTheForm(String text) {
        assertTrue(Decimals.FORM.matcher(text).matches(), text);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                " 1",
                "1 ",
                "1.",
                ".5",
                "01",
                "+1",
                "1e3",
                "1E3",
                "0x1",
                "1,5",
                "1.1234567890123",
                "NaN",
                "1\n",
                "--1",
                "٩",
                "12345678901234567890123456789012345678901"
            })
    void anythingElseHasNot(String text) {
        assertFalse(Decimals.FORM.matcher(text).matches(), text);
    }
}
