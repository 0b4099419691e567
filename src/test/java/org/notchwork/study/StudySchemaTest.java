package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Problems;
import org.notchwork.catalogue.Strategies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonBoolean;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/**
 * The schema of a study and its reader say the same of some thousands of documents, right and wrong. The validator is
 * networknt's.
 */
class StudySchemaTest {

    /** What a schema cannot say, by the reader's words. Whatever else the reader refuses, the schema refuses. */
    private static final Pattern READER_ONLY = Pattern.compile("a second (experiment|claim) .*"
            + "|width \\d+ after \\d+"
            + "|no cell .*"
            + "|a cell over itself"
            + "|cells that do not face the same instances"
            + "|\\S+ is above \\S+");

    private static final List<JsonValue> REPLACEMENTS = replacements();

    private final JsonReader reader = new JsonReader(JsonLimits.FILE);
    private final Schema schema = schema();

    @ParameterizedTest
    @ValueSource(strings = {"first-light", "wide-survey"})
    void everyCommittedStudyFits(String name) throws IOException, JsonFault {
        assertEquals("fits", verdict(reader.read(Files.readAllBytes(Path.of("configs", name + ".json")))));
    }

    /** Each value of the small study is left out, replaced by some forty others and, in an array, repeated. */
    @Test
    void schemaAndReaderAgreeOnEveryChangeOfOneValue() throws JsonFault {
        JsonValue small = reader.read(Studies.SMALL.getBytes(StandardCharsets.UTF_8));
        Map<String, Integer> verdicts = new TreeMap<>();
        for (JsonValue changed : changes(small)) {
            verdicts.merge(verdict(changed), 1, Integer::sum);
        }
        assertTrue(verdicts.getOrDefault("fits", 0) > 100, verdicts.toString());
        assertTrue(verdicts.getOrDefault("reader only", 0) > 50, verdicts.toString());
        assertTrue(verdicts.getOrDefault("does not fit", 0) > 3000, verdicts.toString());
    }

    /** Every width against each kind of instance and each engine. */
    @Test
    void schemaAndReaderAgreeOnTheReachOfInstancesAndEngines() throws JsonFault {
        int fit = 0;
        for (String instances : List.of("", ", \"instances\": \"table\"", ", \"instances\": \"permutation\"")) {
            for (String engine : Engines.names()) {
                for (int width = 0; width <= 66; width++) {
                    String text = """
                            {"format": "notchwork-study/1", "title": "T", "question": "Q", "seed": "0123456789abcdef",
                             "experiments": [{"id": "e", "problem": {"kind": "xor-period"%s}, "widths": [%d],
                               "strategies": [{"name": "random-draws"}, {"name": "fourier-sampling", "engine": "%s"}],
                               "trials": 1, "query-limit": 9}]}
                            """.formatted(instances, width, engine);
                    JsonValue study = reader.read(text.getBytes(StandardCharsets.UTF_8));
                    fit += verdict(study).equals("fits") ? 1 : 0;
                }
            }
        }
        // From width 2: tables to min(20, reach) twice, permutations to min(63, reach); reaches 63, 26, 24, 13.
        assertEquals(2 * (19 + 19 + 19 + 12) + 62 + 25 + 23 + 12, fit);
    }

    @Test
    void theSchemaNamesWhatTheCatalogueHolds() throws JsonFault, IOException {
        JsonObject parts =
                object(object(reader.read(Files.readAllBytes(Path.of("schemas", "study.schema.json")))), "$defs");
        assertEquals(new TreeSet<>(Problems.kinds()), names(parts, "problem", "kind"));
        assertEquals(new TreeSet<>(Strategies.names()), names(parts, "strategy", "name"));
        Set<String> engines = new TreeSet<>(Engines.names());
        engines.add("auto");
        assertEquals(engines, names(parts, "strategy", "engine"));
    }

    /** An author who opens the file in an editor is told what each member is. */
    @Test
    void everyMemberIsDescribed() throws JsonFault, IOException {
        List<String> bare = new ArrayList<>();
        JsonObject root = object(reader.read(Files.readAllBytes(Path.of("schemas", "study.schema.json"))));
        collectBare(root, root, "", bare);
        assertEquals(List.of(), bare);
    }

    private static void collectBare(JsonObject root, JsonObject part, String at, List<String> bare) {
        if (part.member("properties").isPresent()) {
            object(part, "properties").members().forEach((name, value) -> {
                JsonObject member = object(value);
                String described = member.member("$ref")
                        .map(ref -> ((JsonText) ref).value().replace("#/$defs/", ""))
                        .map(name2 -> object(object(root, "$defs"), name2).member("description"))
                        .orElse(member.member("description"))
                        .map(CanonicalJson::text)
                        .orElse("");
                if (described.isEmpty()) {
                    bare.add(at + "/" + name);
                }
            });
        }
        if (part.member("$defs").isPresent()) {
            object(part, "$defs")
                    .members()
                    .forEach((name, value) -> collectBare(root, object(value), "#" + name, bare));
        }
    }

    /**
     * Returns the common verdict of schema and reader: "fits", "does not fit", or "reader only" where the schema lets pass
     * what it cannot know. Fails where they differ in anything else.
     */
    private String verdict(JsonValue document) {
        String text = CanonicalJson.text(document);
        List<String> broken = schema.validate(text, InputFormat.JSON).stream()
                .map(e -> e.getInstanceLocation() + ": " + e.getMessage())
                .toList();
        List<String> wrongs =
                StudyReader.read(document).faults().stream().map(Fault::wrong).toList();
        if (wrongs.isEmpty()) {
            assertEquals(List.of(), broken, () -> "the reader accepts " + text);
            return "fits";
        }
        if (broken.isEmpty()) {
            assertTrue(isReaderOnly(wrongs), () -> "the schema accepts, against " + wrongs + ", " + text);
            return "reader only";
        }
        return "does not fit";
    }

    private static boolean isReaderOnly(List<String> wrongs) {
        return wrongs.stream().allMatch(w -> READER_ONLY.matcher(w).matches());
    }

    private static List<JsonValue> replacements() {
        List<JsonValue> values = new ArrayList<>(List.of(
                new JsonBoolean(true),
                new JsonArray(List.of()),
                new JsonObject(Map.of()),
                new JsonObject(Map.of("name", new JsonText("random-draws")))));
        for (long number :
                new long[] {-1, 0, 1, 2, 5, 12, 13, 14, 20, 21, 26, 27, 63, 64, 1_000_000, 1_000_001, JsonInteger.MAX
                }) {
            values.add(new JsonInteger(number));
        }
        for (String text : List.of(
                "",
                "x",
                "id-2",
                "-x",
                "x-",
                "X",
                "x\n",
                "x\u2028y",
                "a".repeat(40),
                "a".repeat(41),
                "x".repeat(200),
                "x".repeat(201),
                "😀".repeat(200),
                "x".repeat(1001),
                "x".repeat(2001),
                "1",
                "0.5\n",
                "1.",
                "1e3",
                "٩",
                "0.1234567890123",
                "table",
                "permutation",
                "difference-cover",
                "fibre",
                "statevector",
                "all/3/random-draws",
                "all/3/random-draws\n",
                "all/03/random-draws",
                "cut/6/fourier-sampling@fibre",
                "all/5/sequential-scan",
                "success-rate",
                "0123456789abcdef",
                "notchwork-study/1\n")) {
            values.add(new JsonText(text));
        }
        return values;
    }

    private static List<JsonValue> changes(JsonValue value) {
        List<JsonValue> changed = new ArrayList<>(REPLACEMENTS);
        if (value instanceof JsonObject object) {
            changed.add(with(object, "unheard-of", new JsonInteger(1)));
            object.members().forEach((name, member) -> {
                Map<String, JsonValue> less = new TreeMap<>(object.members());
                less.remove(name);
                changed.add(new JsonObject(less));
                changes(member).forEach(inner -> changed.add(with(object, name, inner)));
            });
        } else if (value instanceof JsonArray array) {
            for (int i = 0; i < array.items().size(); i++) {
                List<JsonValue> less = new ArrayList<>(array.items());
                JsonValue item = less.remove(i);
                changed.add(new JsonArray(less));
                List<JsonValue> more = new ArrayList<>(array.items());
                more.add(i, item);
                changed.add(new JsonArray(more));
                for (JsonValue inner : changes(item)) {
                    List<JsonValue> items = new ArrayList<>(array.items());
                    items.set(i, inner);
                    changed.add(new JsonArray(items));
                }
            }
        }
        return changed;
    }

    private static JsonObject with(JsonObject object, String name, JsonValue value) {
        Map<String, JsonValue> members = new TreeMap<>(object.members());
        members.put(name, value);
        return new JsonObject(members);
    }

    /** Returns every value that a member can have, over all shapes of a part. */
    private static Set<String> names(JsonObject parts, String part, String member) {
        Set<String> names = new TreeSet<>();
        for (JsonValue shape : ((JsonArray)
                        object(parts.member(part).orElseThrow()).member("oneOf").orElseThrow())
                .items()) {
            object(object(shape), "properties").members().entrySet().stream()
                    .filter(e -> e.getKey().equals(member))
                    .map(e -> object(e.getValue()))
                    .forEach(value -> {
                        value.member("const").ifPresent(c -> names.add(((JsonText) c).value()));
                        value.member("enum")
                                .ifPresent(
                                        c -> ((JsonArray) c).items().forEach(i -> names.add(((JsonText) i).value())));
                    });
        }
        return names;
    }

    private static JsonObject object(JsonObject parent, String name) {
        return object(parent.member(name).orElseThrow());
    }

    private static JsonObject object(JsonValue value) {
        return (JsonObject) value;
    }

    private static Schema schema() {
        try {
            return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                    .getSchema(Files.readString(Path.of("schemas", "study.schema.json")), InputFormat.JSON);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
