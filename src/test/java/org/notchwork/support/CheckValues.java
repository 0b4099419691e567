package org.notchwork.support;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The check values beside the project; tests that read them are skipped where they are missing. */
public final class CheckValues {

    private static final Path FILE = Path.of("..", "shared", "check-values.json");

    private CheckValues() {}

    /** Returns a section of the check values. */
    public static JsonNode section(String name) throws IOException {
        assumeTrue(Files.isRegularFile(FILE), "the check values are not there");
        return JsonMapper.builder().build().readTree(Files.readString(FILE)).required(name);
    }

    /** Asserts that a number lies within half a unit of the last place of a printed decimal. */
    public static void assertPrints(String printed, BigDecimal value) {
        BigDecimal expected = new BigDecimal(printed);
        BigDecimal halfUnit = BigDecimal.valueOf(5, expected.scale() + 1);
        assertTrue(
                value.subtract(expected).abs().compareTo(halfUnit) <= 0,
                () -> printed + " is not the rounded " + value.toPlainString());
    }
}
