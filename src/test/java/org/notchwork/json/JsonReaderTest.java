package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Base64;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the reader refuses, and that it says so in one plain line. */
class JsonReaderTest {

    private static final Path VECTORS = Path.of("..", "shared", "vectors");

    private final JsonReader reader = new JsonReader(JsonLimits.FILE);

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            {"a":1,"a":2}           | line 1
            {"a":null,"a":2}        | line 1
            [1.5]                   | line 1, column 2
            [1e3]                   | line 1, column 2
            [1e400]                 | line 1, column 2
            [-0]                    | line 1, column 2
            [007]                   | line 1
            [NaN]                   | line 1
            [9007199254740992]      | line 1, column 2
            [-9007199254740992]     | line 1, column 2
            [123456789012345678901] | line 1, column 2
            [1,]                    | line 1
            {"a":1} x               | line 1
            [1] [2]                 | line 1
            // comment              | line 1
            ["\\ud800"]              | line 1, column 2
            {"\\udc00":1}            | line 1
            [null]                  | line 1, column 2
            """)
    void refusesWhatTwoReadersCouldUnderstandDifferently(String document, String place) {
        JsonFault fault = refused(document.getBytes(StandardCharsets.UTF_8));
        assertTrue(fault.place().startsWith(place.strip()), () -> document + ": " + fault.place());
    }

    @Test
    void acceptsTheLargestExactNumbers() throws JsonFault {
        assertEquals(
                new JsonArray(List.of(new JsonInteger((1L << 53) - 1), new JsonInteger(1 - (1L << 53)))),
                reader.read("[9007199254740991,-9007199254740991]".getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void refusesBytesThatAreNotUtf8WithTheirPlace() {
        assertEquals(
                "byte 2",
                refused(new byte[] {'[', '"', (byte) 0xc0, (byte) 0xaf, '"', ']'})
                        .place());
        assertEquals(
                "byte 2", refused(new byte[] {'[', '"', (byte) 0xff, '"', ']'}).place());
        assertEquals(
                "byte 2",
                refused(new byte[] {'[', '"', (byte) 0xed, (byte) 0xa0, (byte) 0x80, '"', ']'})
                        .place());
        assertEquals(
                "byte 0", refused("\uFEFF[1]".getBytes(StandardCharsets.UTF_8)).place());
        refused("[1]".getBytes(StandardCharsets.UTF_16LE));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\n\t "})
    void refusesAnEmptyDocument(String document) {
        assertTrue(
                refused(document.getBytes(StandardCharsets.UTF_8)).getMessage().contains("empty"));
    }

    @Test
    void refusesDeepLongAndHugeDocumentsAtOnce() {
        assertTimeoutPreemptively(Duration.ofSeconds(5), () -> {
            refused("[".repeat(10_000).getBytes(StandardCharsets.UTF_8));
            refused(("[" + "9".repeat(1_000_000) + "]").getBytes(StandardCharsets.UTF_8));
            refused("[1e20000000]".getBytes(StandardCharsets.UTF_8));
            refused(("[\"" + "x".repeat(JsonLimits.FILE.text() + 1) + "\"]").getBytes(StandardCharsets.UTF_8));
        });
    }

    @Test
    void acceptsTheDeepestDocumentAndRefusesOneDeeper() throws JsonFault {
        int depth = JsonLimits.FILE.depth();
        reader.read(("[".repeat(depth) + "]".repeat(depth)).getBytes(StandardCharsets.UTF_8));
        refused(("[".repeat(depth + 1) + "]".repeat(depth + 1)).getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void refusesADocumentOverTheLimitOfBytes() {
        JsonReader small = new JsonReader(new JsonLimits(4, 8, 8));
        assertThrows(JsonFault.class, () -> small.read("[1,2]".getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void aDocumentThatIsNotCanonicalIsRefusedWithTheFirstByte() {
        JsonFault fault = assertThrows(
                JsonFault.class, () -> reader.readCanonical("{\"b\":1,\"a\":2}".getBytes(StandardCharsets.UTF_8)));
        assertEquals("byte 2", fault.place());
        assertThrows(JsonFault.class, () -> reader.readCanonical("[1]\n".getBytes(StandardCharsets.UTF_8)));
        assertThrows(JsonFault.class, () -> reader.readCanonical("[\"\\u0041\"]".getBytes(StandardCharsets.UTF_8)));
    }

    /**
     * Every document of the public parsing suite that must be refused is refused; those that must be accepted are,
     * or hold what this project has no use for: null, fractions, exponents, numbers beyond 2^53 - 1, repeated names,
     * -0. Source: nst/JSONTestSuite, test_parsing.
     */
    @Test
    void agreesWithThePublishedParsingSuite() throws IOException {
        Path cases = VECTORS.resolve("json-parsing").resolve("cases.tsv");
        assumeTrue(Files.isRegularFile(cases), "the published cases are not beside this project");
        int refused = 0;
        int accepted = 0;
        for (String line : Files.readAllLines(cases, StandardCharsets.UTF_8)) {
            String[] fields = line.split("\t", -1);
            if (fields.length < 2 || !fields[0].matches("[yni]_.*")) {
                continue;
            }
            byte[] document = Base64.getDecoder().decode(fields[fields.length - 1]);
            Optional<String> refusal = refusal(document);
            if (fields[0].startsWith("n_")) {
                assertTrue(refusal.isPresent(), fields[0]);
                refused++;
            } else if (fields[0].startsWith("y_")) {
                assertTrue(
                        refusal.isEmpty()
                                || refusal.get()
                                        .matches(
                                                "(null is|a number with a fraction|a whole number beyond|-0|a second member).*")
                                || (fields[0].startsWith("y_number")
                                        && refusal.get().contains("number longer than")),
                        () -> fields[0] + ": " + refusal);
                accepted += refusal.isEmpty() ? 1 : 0;
            }
        }
        assertTrue(refused > 150, refused + " refused");
        assertTrue(accepted > 50, accepted + " accepted");
    }

    private Optional<String> refusal(byte[] document) {
        try {
            reader.read(document);
            return Optional.empty();
        } catch (JsonFault e) {
            assertPlain(e);
            return Optional.of(e.getMessage());
        }
    }

    private JsonFault refused(byte[] document) {
        JsonFault fault = assertThrows(JsonFault.class, () -> reader.read(document));
        assertPlain(fault);
        return fault;
    }

    /** A message is one short line without the words of the library below. */
    private static void assertPlain(JsonFault fault) {
        String text = fault.getMessage();
        assertFalse(text.contains("\n"), text);
        assertTrue(text.length() < 200, text);
        assertFalse(text.matches("(?s).*(Stream|Source|Feature|Jackson|Json[A-Z]|Exception|`|\\bToken\\b).*"), text);
    }

    @Test
    void textIsReadAsItStands() throws JsonFault {
        byte[] document = "[\"a\\u00e9\\n\\ud83d\\ude00\"]".getBytes(StandardCharsets.UTF_8);
        JsonArray array = (JsonArray) reader.read(document);
        assertEquals(new JsonText("aé\n😀"), array.items().get(0));
        assertArrayEquals("[\"aé\\n😀\"]".getBytes(StandardCharsets.UTF_8), CanonicalJson.bytes(array));
    }
}
