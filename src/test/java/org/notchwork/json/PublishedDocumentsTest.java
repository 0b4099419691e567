package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** The reader against documents that others collected; skipped where they are not beside this project. */
class PublishedDocumentsTest {

    private static final Path VECTORS = Path.of("..", "shared", "vectors");

    /** What JSON allows and this project does not, by the first words of the refusal. */
    private static final Map<String, List<String>> REFUSED_BY_POLICY = Map.of(
            "null is not used",
                    List.of(
                            "y_array_heterogeneous",
                            "y_array_null",
                            "y_array_with_several_null",
                            "y_structure_lonely_null"),
            "a number with a fraction or an exponent",
                    List.of(
                            "y_number",
                            "y_number_0e+1",
                            "y_number_0e1",
                            "y_number_double_close_to_zero",
                            "y_number_int_with_exp",
                            "y_number_real_capital_e",
                            "y_number_real_capital_e_neg_exp",
                            "y_number_real_capital_e_pos_exp",
                            "y_number_real_exponent",
                            "y_number_real_fraction_exponent",
                            "y_number_real_neg_exp",
                            "y_number_real_pos_exponent",
                            "y_number_simple_real",
                            "y_object_extreme_numbers",
                            "y_structure_lonely_negative_real"),
            "-0 is not a whole number here", List.of("y_number_minus_zero", "y_number_negative_zero"),
            "a second member", List.of("y_object_duplicated_key", "y_object_duplicated_key_and_value"));

    private final JsonReader reader = new JsonReader(JsonLimits.FILE);

    /** nst/JSONTestSuite, test_parsing: whatever must be refused is refused. */
    @Test
    void everyDocumentThatIsNotJsonIsRefused() throws IOException {
        int tried = 0;
        for (Map.Entry<String, byte[]> named : parsingSuite("n_").entrySet()) {
            assertTrue(refusal(named.getValue()).isPresent(), named.getKey());
            tried++;
        }
        assertEquals(186, tried);
    }

    /** nst/JSONTestSuite, test_parsing: whatever must be accepted is, but for a list of reasons, each with its cases. */
    @Test
    void everyDocumentThatIsJsonIsReadOrRefusedForAStatedReason() throws IOException {
        Map<String, String> expected = new TreeMap<>();
        REFUSED_BY_POLICY.forEach((reason, names) -> names.forEach(name -> expected.put(name, reason)));
        Map<String, String> found = new TreeMap<>();
        Map<String, byte[]> suite = parsingSuite("y_");
        suite.forEach((name, document) -> refusal(document).ifPresent(message -> {
            String reason = expected.getOrDefault(name, "none expected");
            found.put(name, message.startsWith(reason) ? reason : message);
        }));
        assertEquals(expected, found);
        assertEquals(95, suite.size());
    }

    /** nst/JSONTestSuite, test_parsing: where JSON leaves the choice, nothing is repaired, cut or rounded. */
    @Test
    void whatJsonLeavesOpenIsRefused() throws IOException {
        List<String> accepted = new ArrayList<>();
        parsingSuite("i_").forEach((name, document) -> {
            if (refusal(document).isEmpty()) {
                accepted.add(name);
            }
        });
        assertEquals(List.of(), accepted);
    }

    /** Documents collected because a library repaired or crashed on them, each with its verdict. */
    @Test
    void everyHostileDocumentGetsItsVerdict() throws IOException {
        Path cases = VECTORS.resolve("json-hostile").resolve("cases.tsv");
        assumeTrue(Files.isRegularFile(cases), "the hostile documents are not beside this project");
        Map<String, String> expected = new TreeMap<>();
        Map<String, String> found = new TreeMap<>();
        for (String line : Files.readAllLines(cases, StandardCharsets.UTF_8)) {
            if (!line.startsWith("#")) {
                String[] fields = line.split("\t", -1);
                byte[] document = Base64.getDecoder().decode(fields[1]);
                expected.put(fields[0], fields[2]);
                found.put(fields[0], refusal(document).isPresent() ? "refuse" : "accept");
            }
        }
        assertEquals(expected, found);
        assertEquals(44, expected.size());
    }

    private static Map<String, byte[]> parsingSuite(String prefix) throws IOException {
        Path cases = VECTORS.resolve("json-parsing").resolve("cases.tsv");
        assumeTrue(Files.isRegularFile(cases), "the published cases are not beside this project");
        Map<String, byte[]> documents = new TreeMap<>();
        for (String line : Files.readAllLines(cases, StandardCharsets.UTF_8)) {
            String[] fields = line.split("\t", -1);
            if (fields[0].startsWith(prefix)) {
                documents.put(fields[0], Base64.getDecoder().decode(fields[1]));
            }
        }
        return documents;
    }

    private Optional<String> refusal(byte[] document) {
        try {
            reader.read(document);
            return Optional.empty();
        } catch (JsonFault e) {
            PlainWords.assertPlain(e);
            return Optional.of(e.getMessage());
        }
    }
}
