package org.notchwork;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;

/** The tables of published and independently derived figures that lie beside the project, where they do. */
public final class CheckValues {

    private static final Path FILE = Path.of("..", "shared", "check-values.json");

    private CheckValues() {}

    /** Returns a section, or skips the test that asks where the tables are not there. */
    public static JsonNode section(String name) {
        assumeTrue(Files.isRegularFile(FILE), "the tables of check values are not beside this project");
        return new ObjectMapper().readTree(FILE.toFile()).get(name);
    }
}
