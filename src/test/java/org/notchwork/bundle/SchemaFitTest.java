package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;
import org.notchwork.study.StudyJson;
import org.notchwork.trial.ControlOutcome;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialRecord;

/** The schemas against what is written and against the same spoiled at every place. The validator is networknt's. */
class SchemaFitTest {

    private static final SampleRun RUN = new SampleRun();

    static Stream<String> names() {
        return Schemas.NAMES.stream();
    }

    @ParameterizedTest
    @MethodSource("names")
    void whatIsWrittenFitsItsSchema(String name) {
        for (String sample : samples(name)) {
            assertEquals(List.of(), faults(schema(name), sample), sample);
        }
    }

    /** In every object of a sample, an unknown member is put in and each member is left out or made another type. */
    @ParameterizedTest
    @MethodSource("names")
    void aSpoiledDocumentDoesNotFit(String name) {
        Schema schema = schema(name);
        JsonObject sample = documents(name).get(0);
        int spoiled = 0;
        for (JsonValue changed : spoil(sample)) {
            assertFalse(faults(schema, CanonicalJson.text(changed)).isEmpty(), CanonicalJson.text(changed));
            spoiled++;
        }
        assertTrue(spoiled > 5, "only " + spoiled + " changes tried");
    }

    @ParameterizedTest
    @MethodSource("names")
    void theCompoundDocumentHoldsTheSameSchema(String name) {
        SchemaRegistry registry = SchemaRegistry.withDefaultDialect(
                SpecificationVersion.DRAFT_2020_12,
                builder -> builder.schemas(Map.of("urn:notchwork:schemas:1", CanonicalJson.text(Schemas.document()))));
        Schema outer = registry.getSchema(SchemaLocation.of("urn:notchwork:schemas:1#/$defs/" + name));
        for (String sample : samples(name)) {
            assertEquals(List.of(), faults(outer, sample));
        }
        assertFalse(faults(outer, "{}").isEmpty());
    }

    @ParameterizedTest
    @MethodSource("names")
    void everySchemaIsClosedNamedAndAnchored(String name) {
        JsonObject schema = Schemas.schema(name);
        assertEquals(
                new JsonText("urn:notchwork:schema:" + name + ":1"),
                schema.member("$id").orElseThrow());
        closed(schema, name);
    }

    @ParameterizedTest
    @ValueSource(strings = {"07", "0G", "", "0123456789abcdef0", "0x1"})
    void aHiddenWordOfAnotherFormDoesNotFit(String word) {
        String line = CanonicalJson.text(documents("trial").get(0));
        String changed =
                line.replaceFirst("\"hidden\":\\{\"period\":\"[0-9a-f]*\"", "\"hidden\":{\"period\":\"" + word + "\"");
        assertNotEquals(line, changed);
        boolean fits = faults(schema("trial"), changed).isEmpty();
        // The number of digits goes with the width, which a schema cannot say; the reader does.
        assertEquals(word.equals("07") || word.equals("0123456789abcdef0"), fits);
    }

    @Test
    void aCensoredLineHasNoAnswerAndASolvedOneHas() {
        String censored = lines().stream()
                .filter(l -> l.contains("\"censored\""))
                .findFirst()
                .orElseThrow();
        String solved = lines().stream()
                .filter(l -> l.contains("\"solved\""))
                .findFirst()
                .orElseThrow();
        Schema schema = schema("trial");
        assertFalse(
                faults(schema, censored.replace("\"censored\"", "\"solved\"")).isEmpty());
        assertFalse(faults(schema, solved.replace("\"solved\"", "\"censored\"")).isEmpty());
    }

    private static void closed(JsonValue value, String at) {
        if (value instanceof JsonObject object) {
            Map<String, JsonValue> members = object.members();
            if (new JsonText("object").equals(members.get("type"))) {
                assertTrue(members.containsKey("additionalProperties"), at + " is open");
            }
            if (members.get("pattern") instanceof JsonText pattern) {
                assertTrue(pattern.value().startsWith("^") && pattern.value().endsWith("$"), at + " is not anchored");
                assertFalse(pattern.value().matches(".*[*+](?![^\\[]*\\]).*"), at + " is not bounded");
            }
            members.forEach((name, member) -> closed(member, at + "/" + name));
        } else if (value instanceof JsonArray array) {
            array.items().forEach(item -> closed(item, at + "/"));
        }
    }

    /** Returns copies of an object, each with one change somewhere inside. */
    private static List<JsonValue> spoil(JsonValue value) {
        List<JsonValue> changed = new ArrayList<>();
        if (value instanceof JsonObject object) {
            changed.add(with(object, "unheard-of", new JsonInteger(1)));
            object.members().forEach((name, member) -> {
                changed.add(with(object, name, otherType(member)));
                spoil(member).forEach(inner -> changed.add(with(object, name, inner)));
            });
        } else if (value instanceof JsonArray array && !array.items().isEmpty()) {
            for (JsonValue inner : spoil(array.items().get(0))) {
                List<JsonValue> items = new ArrayList<>(array.items());
                items.set(0, inner);
                changed.add(new JsonArray(items));
            }
        }
        return changed;
    }

    private static JsonValue otherType(JsonValue value) {
        return value instanceof JsonText ? new JsonInteger(7) : new JsonText("\u0000");
    }

    private static JsonObject with(JsonObject object, String name, JsonValue value) {
        Map<String, JsonValue> members = new LinkedHashMap<>(object.members());
        members.put(name, value);
        return new JsonObject(members);
    }

    private static List<String> faults(Schema schema, String document) {
        return schema.validate(document, InputFormat.JSON).stream()
                .map(e -> e.getInstanceLocation() + ": " + e.getMessage())
                .toList();
    }

    private static Schema schema(String name) {
        return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(CanonicalJson.text(Schemas.schema(name)), InputFormat.JSON);
    }

    private static List<String> samples(String name) {
        return name.equals("trial")
                ? lines()
                : documents(name).stream().map(CanonicalJson::text).toList();
    }

    private static List<String> lines() {
        return RUN.lines().stream()
                .map(l -> new String(l, StandardCharsets.UTF_8))
                .toList();
    }

    private static List<JsonObject> documents(String name) {
        Results results = RUN.results();
        return switch (name) {
            case "claims" -> List.of(ClaimsFile.write(results.claims()));
            case "control" -> List.of(ControlLine.write(control()));
            case "cross-checks" -> List.of(CrossChecksFile.write(results.checks()));
            case "environment" -> List.of(EnvironmentFile.write(SampleRun.ENVIRONMENT));
            case "seal" -> List.of(seal().write());
            case "study" -> List.of(StudyJson.write(results.study()));
            case "summary" -> List.of(SummaryFile.write(results.summary(), results.checks()));
            case "trial" ->
                List.of(TrialLine.write(
                        RUN.groups().get(0).records().get(2),
                        RUN.study().experiments().get(0).strategies().get(2)));
            default -> throw new IllegalArgumentException(name);
        };
    }

    /** A control that named something else than the secret of its trial. */
    private static ControlRecord control() {
        TrialRecord record = RUN.groups().get(0).records().get(2);
        return new ControlRecord(
                record.cell(),
                record.trial(),
                record.hidden(),
                ControlOutcome.FAILED,
                record.answer(),
                record.certificate(),
                record.counts());
    }

    private static Seal seal() {
        Map<String, String> files = new LinkedHashMap<>();
        Layout.sealed(RUN.study()).forEach(name -> files.put(name, "0".repeat(64)));
        return new Seal(files, 58, "f".repeat(64));
    }
}
