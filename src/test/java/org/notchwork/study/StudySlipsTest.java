package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
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
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/**
 * The published schema and the reader, which know nothing of each other, judge the same documents alike. The validator
 * is com.networknt json-schema-validator 3.0.9.
 */
class StudySlipsTest {

    /** What a schema cannot say, as the reader's faults begin after their pointer. */
    private static final Map<String, Pattern> READER_ONLY = new TreeMap<>(Map.of(
            "ids differ", Pattern.compile("a second (experiment|claim) \".*"),
            "widths ascend", Pattern.compile("width \\d+ after \\d+; .*"),
            "a claim names a cell that there is", Pattern.compile("no cell \".*"),
            "a ratio is of two strategies", Pattern.compile("a cell over itself; .*"),
            "a ratio is on the same instances", Pattern.compile("cells that do not face the same instances; .*"),
            "the lower bound goes first", Pattern.compile(".* is above .*; the lower bound goes first")));

    private final Schema schema = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
            .getSchema(read(Path.of("schemas", "study.schema.json")), InputFormat.JSON);

    private final Map<String, Integer> refusedByReaderOnly = new TreeMap<>();

    @Test
    void everyStudyWithOneSlipIsJudgedAlikeButForWhatOnlyTheReaderKnows() throws JsonFault {
        List<JsonValue> slips = Mutations.of(parse(Studies.SMALL));
        int refused = 0;
        for (JsonValue document : slips) {
            refused += judgedAlike(document) ? 0 : 1;
        }
        assertEquals(READER_ONLY.keySet(), refusedByReaderOnly.keySet());
        assertTrue(refused > slips.size() / 2 && refused < slips.size(), refused + " of " + slips.size());
    }

    @Test
    void studiesWithSeveralSlipsAreJudgedAlikeAsWell() throws JsonFault {
        JsonValue small = parse(Studies.SMALL);
        for (int i = 0; i < 300; i++) {
            RandomStream stream = Streams.numbered("several slips", i);
            JsonValue document = small;
            for (int slip = 0; slip < 3; slip++) {
                List<JsonValue> next = Mutations.of(document);
                document = next.get((int) stream.below(next.size()));
            }
            judgedAlike(document);
        }
    }

    @Test
    void bothAcceptEveryStudyThatKeepsTheRulesAndItsWrittenForm() {
        for (int i = 0; i < 300; i++) {
            JsonValue document = new RandomStudies(Streams.numbered("random studies", i)).next();
            assertTrue(judgedAlike(document), CanonicalJson.text(document));
            Study study = StudyReader.read(document).study().orElseThrow();
            JsonValue written = StudyJson.write(study);
            assertTrue(judgedAlike(written), CanonicalJson.text(written));
            assertEquals(Optional.of(study), StudyReader.read(written).study());
            assertEquals(
                    written, StudyJson.write(StudyReader.read(written).study().orElseThrow()));
        }
    }

    /** In the standard "$" is the end of the text; in Java it also stands before a last line break. */
    @Test
    void neitherAcceptsALineBreakBehindAWordOfAForm() {
        for (String word : List.of(
                "notchwork-study/1",
                "a seed of the small study",
                "all",
                "xor-period",
                "table",
                "random-draws",
                "fibre",
                "queries-mean",
                "9")) {
            String text = Studies.SMALL.replaceFirst("\"" + word + "\"", "\"" + word + "\\\\n\"");
            assertNotEquals(Studies.SMALL, text);
            assertFalse(schemaAccepts(text), "schema accepts " + word);
            assertTrue(
                    StudyReader.read(text.getBytes(StandardCharsets.UTF_8))
                            .study()
                            .isEmpty(),
                    "reader accepts " + word);
        }
    }

    /** Asserts that schema and reader agree, or that only rules of the reader are broken; returns the reader's answer. */
    private boolean judgedAlike(JsonValue document) {
        String text = CanonicalJson.text(document);
        StudyReading reading = StudyReader.read(text.getBytes(StandardCharsets.UTF_8));
        boolean fits = schemaAccepts(text);
        boolean accepted = reading.study().isPresent();
        if (accepted) {
            assertTrue(fits, () -> "the schema refuses what the reader accepts: " + text);
        } else if (fits) {
            reading.faults().forEach(fault -> noteReaderOnly(fault, text));
        }
        return accepted;
    }

    private void noteReaderOnly(Fault fault, String document) {
        String line = fault.wrong() + "; " + fault.mend();
        String rule = READER_ONLY.entrySet().stream()
                .filter(e -> e.getValue().matcher(line).matches())
                .map(Map.Entry::getKey)
                .findFirst()
                .orElseGet(() -> "the schema does not see " + fault.line() + " in " + document);
        assertTrue(READER_ONLY.containsKey(rule), rule);
        refusedByReaderOnly.merge(rule, 1, Integer::sum);
    }

    private boolean schemaAccepts(String text) {
        return schema.validate(text, InputFormat.JSON).isEmpty();
    }

    private static JsonValue parse(String text) throws JsonFault {
        return new JsonReader(JsonLimits.FILE).read(text.getBytes(StandardCharsets.UTF_8));
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
