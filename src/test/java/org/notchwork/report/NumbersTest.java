package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumbersTest {

    @ParameterizedTest
    @CsvSource({
        "0, 0.000",
        "0.0625, 0.062",
        "-3.5, -3.500",
        "999.1234, 999.123",
        "1000.26, 1000.3",
        "99999.94, 99999.9",
        "100000.5, 100000",
        "9223372036854775807.4, 9223372036854775807"
    })
    void largeNumbersHaveFewerPlaces(String value, String text) {
        assertEquals(text, Numbers.decimal(new BigDecimal(value)));
    }

    @ParameterizedTest
    @CsvSource({"0, 0 claims", "1, 1 claim", "2, 2 claims"})
    void countsAgreeWithTheirNouns(long count, String text) {
        assertEquals(text, Numbers.count(count, "claim"));
    }
}
