package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;

/** A study that is written is read back equal. */
class StudyJsonTest {

    @Test
    void everyStudyIsReadBackEqual() throws IOException, JsonFault {
        assertReadBackEqual(Studies.small());
        for (String name : List.of("first-light", "wide-survey")) {
            byte[] file = Files.readAllBytes(Path.of("configs", name + ".json"));
            assertReadBackEqual(StudyReader.read(file).study().orElseThrow());
        }
    }

    private static void assertReadBackEqual(Study study) throws JsonFault {
        byte[] written = CanonicalJson.bytes(StudyJson.write(study));
        assertEquals(List.of(), StudyReader.read(written).faults());
        assertEquals(study, StudyReader.read(written).study().orElseThrow());
        assertEquals(StudyJson.write(study), new JsonReader(JsonLimits.FILE).readCanonical(written));
    }

    @Test
    void defaultsAreWrittenOut() {
        Study study = Studies.of("""
                { "format": "notchwork-study/1", "title": "T", "question": "Q", "seed": "0123456789abcdef",
                  "experiments": [ { "id": "e", "problem": { "kind": "xor-period" }, "widths": [3],
                    "strategies": [ { "name": "sequential-scan" } ], "trials": 1, "query-limit": 9 } ] }
                """);
        assertEquals(
                "{\"claims\":[],\"cross-check-width\":10,\"experiments\":[{\"id\":\"e\","
                        + "\"problem\":{\"instances\":\"table\",\"kind\":\"xor-period\"},\"query-limit\":9,"
                        + "\"strategies\":[{\"name\":\"sequential-scan\"}],\"trials\":1,\"widths\":[3]}],"
                        + "\"format\":\"notchwork-study/1\",\"question\":\"Q\",\"seed\":\"0123456789abcdef\",\"title\":\"T\"}",
                CanonicalJson.text(StudyJson.write(study)));
    }

    /** The digits are the author's; only -0 loses its sign. */
    @ParameterizedTest
    @CsvSource({"9, 9", "9.50, 9.50", "-0.250, -0.250", "0.000000000001, 0.000000000001", "-0, 0", "-0.00, 0.00"})
    void aBoundKeepsItsDigits(String given, String written) {
        Study study = Studies.of(Studies.SMALL.replace("\"at-most\": \"9\"", "\"at-most\": \"" + given + "\""));
        assertEquals(
                new Bound.AtMost(new BigDecimal(given)), study.claims().get(0).bound());
        String json = CanonicalJson.text(StudyJson.write(study));
        assertTrue(json.contains("\"at-most\":\"" + written + "\""), json);
        assertEquals(study, Studies.of(json));
    }

    @Test
    void boundsOutOfOrderAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new Bound.Between(BigDecimal.ONE, BigDecimal.ZERO));
        assertEquals(BigDecimal.ONE, new Bound.Between(BigDecimal.ONE, BigDecimal.ONE).high());
    }
}
