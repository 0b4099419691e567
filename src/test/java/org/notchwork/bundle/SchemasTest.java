package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.study.StudyReader;
import org.notchwork.verify.BundleFixture;

/** The published schemas against what is written, and against what the readers refuse. */
class SchemasTest {

    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);

    @TempDir
    static Path home;

    private static Path bundle;

    @BeforeAll
    static void makeOneBundle() throws IOException, InterruptedException {
        bundle = BundleFixture.make(home.resolve("bundle"));
    }

    @Test
    void everyFileOfABundleFitsItsSchema() throws IOException {
        for (String name : List.of("claims", "cross-checks", "environment", "seal", "study", "summary")) {
            assertEquals(List.of(), faults(name, Files.readString(bundle.resolve("data/" + name + ".json"))), name);
        }
        for (String file : List.of("trials-all.jsonl", "trials-cut.jsonl")) {
            for (String line : Files.readAllLines(bundle.resolve("data/" + file), StandardCharsets.UTF_8)) {
                assertEquals(List.of(), faults("trial", line));
            }
        }
    }

    @Test
    void everySchemaIsValidAndHasNoKeywordThatTheStandardDoesNotKnow() {
        Schema strict = REGISTRY.getSchema("""
                {"$schema":"https://json-schema.org/draft/2020-12/schema","$id":"urn:test:strict","$dynamicAnchor":"meta",
                 "$ref":"https://json-schema.org/draft/2020-12/schema","unevaluatedProperties":false}
                """, InputFormat.JSON);
        for (String name : Schemas.NAMES) {
            String text = CanonicalJson.text(Schemas.schema(name));
            assertEquals(List.of(), strict.validate(text, InputFormat.JSON), name);
        }
        // The strict schema is not blind: a misspelt keyword is found.
        assertFalse(strict.validate("{\"maximun\":3}", InputFormat.JSON).isEmpty());
    }

    /** Faults that a schema can express: schema and reader both refuse. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            notchwork-study/1                                | notchwork-study/3
            "title": "A small study of an invented lock"     | "title": ""
            "seed": "a seed of the small study"              | "seed": "short"
            "cross-check-width": 5                           | "cross-check-width": 13
            "cross-check-width": 5                           | "cross-check-width": "5"
            "trials": 8                                      | "trails": 8
            "trials": 8                                      | "trials": 0
            "trials": 8                                      | "trials": 1000001
            "widths": [3, 5]                                 | "widths": []
            "widths": [3, 5]                                 | "widths": [1]
            "widths": [3, 5]                                 | "widths": [3, 3]
            "widths": [6]                                    | "widths": [64]
            "query-limit": 9                                 | "query-limit": 0
            "kind": "xor-period", "instances": "permutation" | "kind": "other"
            "instances": "permutation"                       | "instances": "other"
            "name": "random-draws"                           | "name": "other"
            "engine": "statevector"                          | "engine": "other"
            { "name": "random-draws" }                       | { "name": "random-draws", "engine": "fibre" }
            "fourier-sampling", "engine": "statevector"      | "fourier-sampling"
            "id": "cut"                                      | "id": "Cut"
            "at-most": "9"                                   | "at-most": 9
            "at-most": "9"                                   | "at-most": "1e9"
            , "at-most": "9"                                 |
            "at-most": "9"                                   | "at-most": "9", "at-least": "1"
            ["0.5", "1"]                                     | ["0.5"]
            "figure": "success-rate"                         | "figure": "other"
            "ratio":                                         | "figure": "queries-mean", "ratio":
            """)
    void schemaAndReaderRefuseTheSameStudies(String from, String to) {
        String text = Studies.SMALL.replace(from.strip(), to == null ? "" : to.strip());
        assertFalse(text.equals(Studies.SMALL), from);
        assertFalse(faults("study", text).isEmpty(), "schema accepts: " + to);
        assertTrue(
                StudyReader.read(text.getBytes(StandardCharsets.UTF_8)).study().isEmpty(), "reader accepts: " + to);
    }

    /**
     * What only the reader can know: repeated ids, ascending widths, widths against instances and engines, cells that
     * exist, bounds in order, members named twice.
     */
    @Test
    void theSchemaLeavesTheseRulesToTheReader() {
        Map<String, String> changes = Map.of(
                "\"id\": \"cut\"", "\"id\": \"all\"",
                "[3, 5]", "[5, 3]",
                "[\"0.5\", \"1\"]", "[\"1\", \"0.5\"]",
                "all/3/random-draws", "all/4/random-draws");
        changes.forEach((from, to) -> {
            String text = Studies.SMALL.replace(from, to);
            assertEquals(List.of(), faults("study", text), to);
            assertTrue(
                    StudyReader.read(text.getBytes(StandardCharsets.UTF_8))
                            .study()
                            .isEmpty(),
                    to);
        });
    }

    @Test
    void aWrongTrialLineIsRefusedByItsSchema() throws IOException {
        String line =
                Files.readAllLines(bundle.resolve("data/trials-all.jsonl")).get(3);
        for (String[] change : new String[][] {
            {"\"sight\":\"blind\"", "\"sight\":\"open\""},
            {",\"sight\":\"blind\"", ""},
            {"\"outcome\":\"solved\"", "\"outcome\":\"censored\""},
            {"\"width\":3", "\"width\":3,\"more\":1"},
            {"\"memory-words\":", "\"memory-words\":-"},
            {"notchwork-trial/1", "notchwork-trial/2"}
        }) {
            assertTrue(line.contains(change[0]), line);
            assertFalse(faults("trial", line.replace(change[0], change[1])).isEmpty(), change[1]);
        }
    }

    @Test
    void theBundledDocumentHoldsEverySchema() throws IOException {
        String text = Files.readString(bundle.resolve("data/schemas.json"));
        Schemas.NAMES.forEach(name -> assertTrue(text.contains("\"urn:notchwork:schema:" + name + ":1\""), name));
    }

    private static List<String> faults(String schema, String document) {
        String text = CanonicalJson.text(Schemas.schema(schema));
        return REGISTRY.getSchema(text, InputFormat.JSON).validate(document, InputFormat.JSON).stream()
                .map(Object::toString)
                .toList();
    }
}
