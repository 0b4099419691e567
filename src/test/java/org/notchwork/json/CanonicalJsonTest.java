package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.erdtman.jcs.JsonCanonicalizer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/** The canonical form against RFC 8785 and against the published canonicaliser. */
class CanonicalJsonTest {

    private static final Path JCS = Path.of("..", "shared", "vectors", "jcs");

    private final JsonReader reader = new JsonReader(JsonLimits.FILE);

    /** RFC 8785, section 3.2.3: the sorting example, its euro sign among them. */
    @Test
    void sortsMembersByTheirUtf16Units() throws JsonFault {
        String document =
                "{\"\\u20ac\":\"Euro Sign\",\"\\r\":\"Carriage Return\",\"\\ufb33\":\"Hebrew Letter Dalet With"
                        + " Dagesh\",\"1\":\"One\",\"\\ud83d\\ude00\":\"Emoji: Grinning Face\",\"\\u0080\":\"Control\","
                        + "\"\\u00f6\":\"Latin Small Letter O With Diaeresis\"}";
        JsonObject object = (JsonObject) reader.read(document.getBytes(StandardCharsets.UTF_8));
        assertEquals(
                List.of("\r", "1", "\u0080", "\u00f6", "\u20ac", "\ud83d\ude00", "\ufb33"),
                List.copyOf(object.members().keySet()));
    }

    /** RFC 8785, section 3.2.2.2: which characters are escaped, and how. */
    @Test
    void escapesWhatTheStandardEscapesAndNothingElse() {
        assertEquals(
                "\"\\b\\t\\n\\f\\r\\\"\\\\\\u0000\\u001f/\u007f\u0080é€\"",
                CanonicalJson.text(new JsonText("\b\t\n\f\r\"\\\u0000\u001f/\u007f\u0080é€")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"french", "unicode", "weird"})
    void agreesWithThePublishedPairs(String name) throws IOException, JsonFault {
        Path input = JCS.resolve(name + ".input.json");
        assumeTrue(Files.isRegularFile(input), "the published pairs are not beside this project");
        assertArrayEquals(
                Files.readAllBytes(JCS.resolve(name + ".output.json")),
                CanonicalJson.bytes(reader.read(Files.readAllBytes(input))));
    }

    /** The pair "weird" of the published vectors of RFC 8785, typed in. */
    @Test
    void writesThePublishedWeirdPair() throws JsonFault {
        String input = """
                {
                  "\\u20ac": "Euro Sign",
                  "\\r": "Carriage Return",
                  "\\u000a": "Newline",
                  "1": "One",
                  "\\u0080": "Control\\u007f",
                  "\\ud83d\\ude02": "Smiley",
                  "\\u00f6": "Latin Small Letter O With Diaeresis",
                  "\\ufb33": "Hebrew Letter Dalet With Dagesh",
                  "</script>": "Browser Challenge"
                }
                """;
        assertEquals(
                "{\"\\n\":\"Newline\",\"\\r\":\"Carriage Return\",\"1\":\"One\",\"</script>\":\"Browser Challenge\","
                        + "\"\u0080\":\"Control\u007f\",\"\u00f6\":\"Latin Small Letter O With Diaeresis\","
                        + "\"\u20ac\":\"Euro Sign\",\"\ud83d\ude02\":\"Smiley\","
                        + "\"\ufb33\":\"Hebrew Letter Dalet With Dagesh\"}",
                CanonicalJson.text(reader.read(input.getBytes(StandardCharsets.UTF_8))));
    }

    /**
     * Third opinion: {@code jq -cjS .} writes the same bytes, names being ASCII and DEL not used, as in every sealed file
     * (jq orders names by code point, and escapes DEL).
     */
    @Test
    void jqWritesTheSameBytes() throws IOException, InterruptedException {
        assumeTrue(hasJq(), "jq is not on this machine");
        SeedTree seeds = new SeedTree(new Seed("random documents for another program"));
        for (int i = 0; i < 20; i++) {
            List<JsonValue> rows = new ArrayList<>();
            for (int row = 0; row < 50; row++) {
                RandomStream stream = seeds.stream(new Address("documents", row + 1, i, "test"));
                rows.add(JsonObject.builder()
                        .put("z" + stream.bits(8), value(stream, 0))
                        .put("a" + stream.bits(8), new JsonText(text(stream).replace("\u007f", "")))
                        .put("B", new JsonInteger(stream.bits(53) - (1L << 52)))
                        .build());
            }
            byte[] ours = CanonicalJson.bytes(new JsonArray(rows.stream()
                    .map(row -> CanonicalJson.text(row).contains("\u007f") ? new JsonBoolean(true) : row)
                    .toList()));
            assertArrayEquals(ours, jq(ours), "document " + i);
        }
    }

    private static boolean hasJq() throws InterruptedException {
        try {
            return new ProcessBuilder("jq", "--version").start().waitFor() == 0;
        } catch (IOException e) {
            return false;
        }
    }

    private static byte[] jq(byte[] document) throws IOException, InterruptedException {
        Path file = Files.createTempFile("document", ".json");
        try {
            Files.write(file, document);
            Process process = new ProcessBuilder("jq", "-cjS", ".", file.toString()).start();
            byte[] written = process.getInputStream().readAllBytes();
            assertEquals(0, process.waitFor());
            return written;
        } finally {
            Files.delete(file);
        }
    }

    /** Second opinion: io.github.erdtman java-json-canonicalization 1.1. */
    @Test
    void agreesWithThePublishedCanonicaliserOnRandomDocuments() throws IOException, JsonFault {
        SeedTree seeds = new SeedTree(new Seed("random documents for the writer"));
        for (int i = 0; i < 500; i++) {
            JsonValue value = object(seeds.stream(new Address("documents", 1, i, "test")), 3);
            byte[] ours = CanonicalJson.bytes(value);
            assertArrayEquals(new JsonCanonicalizer(ours).getEncodedUTF8(), ours, "document " + i);
            assertEquals(value, reader.readCanonical(ours), "document " + i);
        }
    }

    private static JsonValue value(RandomStream stream, int depth) {
        return switch ((int) stream.below(depth > 0 ? 5 : 3)) {
            case 0 -> new JsonInteger(stream.bits(53) - (1L << 52));
            case 1 -> new JsonText(text(stream));
            case 2 -> new JsonBoolean(stream.below(2) == 0);
            case 3 -> array(stream, depth - 1);
            default -> object(stream, depth - 1);
        };
    }

    private static JsonArray array(RandomStream stream, int depth) {
        List<JsonValue> items = new ArrayList<>();
        for (long i = stream.below(5); i > 0; i--) {
            items.add(value(stream, depth));
        }
        return new JsonArray(items);
    }

    private static JsonObject object(RandomStream stream, int depth) {
        Map<String, JsonValue> members = new TreeMap<>();
        for (long i = stream.below(5); i > 0; i--) {
            members.put(text(stream), value(stream, depth));
        }
        return new JsonObject(members);
    }

    private static String text(RandomStream stream) {
        int[] ranges = {0x20, 0x80, 0x800, 0xd800, 0x20000};
        StringBuilder text = new StringBuilder();
        for (long i = stream.below(6); i > 0; i--) {
            int point = (int) stream.below(ranges[(int) stream.below(ranges.length)]);
            boolean surrogate = point >= 0xd800 && point < 0xe000;
            text.appendCodePoint(surrogate ? 'x' : point);
        }
        return text.toString();
    }
}
