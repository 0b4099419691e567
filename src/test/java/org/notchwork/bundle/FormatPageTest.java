package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Strategies;
import org.notchwork.check.CheckKind;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/**
 * The page that describes the formats says what the program does. Its vectors were computed by a second
 * implementation in another language, whose Philox gave the three known answers of the generator's authors (Random123,
 * kat_vectors, philox4x64 with 10 rounds; from memory).
 */
class FormatPageTest {

    private static final String SEED = "an invented seed for a test";

    @Test
    void theKeysOfThePageAreDigestsOfWhatItSays() throws IOException {
        List<List<String>> rows = rows("| experiment | width | trial | role |");
        assertEquals(5, rows.size());
        for (List<String> row : rows) {
            JsonObject address = JsonObject.builder()
                    .put("experiment", row.get(0))
                    .put("role", row.get(3))
                    .put("trial", Long.parseLong(row.get(2)))
                    .put("width", Long.parseLong(row.get(1)))
                    .build();
            String hashed = "notchwork stream 1\n"
                    + CanonicalJson.text(JsonObject.builder()
                            .put("address", address)
                            .put("seed", SEED)
                            .build());
            assertEquals(row.get(4), TestBag.sha256(hashed.getBytes(StandardCharsets.UTF_8)));
        }
    }

    @Test
    void theStreamsOfThePageAreThoseOfTheProgram() throws IOException {
        for (List<String> row : rows("| experiment | width | trial | role |")) {
            RandomStream stream = stream(address(row.get(0), row.get(1), row.get(2), row.get(3)));
            for (String word : row.get(5).split(" ", -1)) {
                assertEquals(word, HexFormat.of().toHexDigits(stream.nextLong()), row.toString());
            }
        }
    }

    @Test
    void theDrawsOfThePageAreThoseOfTheProgram() throws IOException {
        Address first = Address.instance("small", 4, 0);
        RandomStream bits = stream(first);
        RandomStream below = stream(first);
        String drawn = "bits(4) gives "
                + joined(LongStream.generate(() -> bits.bits(4)).limit(8))
                + "; below(10) gives "
                + joined(LongStream.generate(() -> below.below(10)).limit(8))
                + "; distinct(5, 8) gives "
                + joined(Arrays.stream(stream(first).distinct(5, 8)).asLongStream());
        assertTrue(page().contains(drawn), drawn);
    }

    @Test
    void theInstancesOfThePageAreThoseOfTheProgram() throws IOException {
        List<List<String>> rows = rows("| instances | experiment |");
        assertEquals(5, rows.size());
        for (List<String> row : rows) {
            int width = Integer.parseInt(row.get(2));
            XorPeriod problem = new XorPeriod(Labelling.valueOf(row.get(0).toUpperCase(Locale.ROOT)));
            Instance instance =
                    problem.draw(width, stream(address(row.get(1), row.get(2), row.get(3), Address.INSTANCE)));
            assertEquals(new Answer.Period(Word.ofHex(width, row.get(4))), instance.hidden());
            long[] values = Arrays.stream(row.get(5).split(" ", -1))
                    .mapToLong(v -> Word.ofHex(width, v).bits())
                    .toArray();
            assertArrayEquals(
                    values, LongStream.range(0, 8).map(instance.function()::at).toArray());
        }
    }

    @Test
    void everythingThatCanStandInABundleIsDescribed() throws IOException {
        String page = page();
        List<String> names = new ArrayList<>(Strategies.names());
        names.addAll(Engines.names());
        for (CheckKind kind : CheckKind.values()) {
            names.add(kind.word());
        }
        names.forEach(name -> assertTrue(page.contains("`" + name + "`"), name));
        new SampleRun()
                .study()
                .experiments()
                .forEach(e -> assertTrue(page.contains("`" + e.problem().kind() + "`")));
        Layout.payload(new SampleRun().study()).stream()
                .filter(name -> !name.startsWith("trials-"))
                .forEach(name -> assertTrue(page.contains(name), name));
    }

    @Test
    void theSentencesOfThePageAreThoseOfTheFiles() throws IOException {
        String page = page();
        assertTrue(page.contains(SummaryFile.attention(List.of())));
        Bag.DECLARATION.lines().forEach(line -> assertTrue(page.contains("`" + line + "`"), line));
        String readMe = ReadMe.text(new SampleRun().results());
        assertTrue(readMe.contains("jq -cjS 'del(.seal)' data/seal.json | sha256sum"));
        assertTrue(page.contains("`jq -cjS 'del(.seal)' data/seal.json | sha256sum`"));
    }

    @Test
    void theFixedTextsOfCrossChecksAreThoseOfTheProgram() throws IOException {
        List<List<String>> rows = rows("| kind | `statement` |");
        assertEquals(CheckKind.values().length, rows.size());
        for (CheckKind kind : CheckKind.values()) {
            List<String> row = rows.stream()
                    .filter(r -> r.get(0).equals("`" + kind.word() + "`"))
                    .findFirst()
                    .orElseThrow();
            assertEquals(kind.statement(), row.get(1));
            assertEquals(kind.source(), row.get(2));
            new SampleRun()
                    .results().checks().stream()
                            .filter(c -> c.kind() == kind && !row.get(3).equals("(above)"))
                            .forEach(c -> assertEquals(row.get(3), c.expected()));
        }
    }

    private static RandomStream stream(Address address) {
        return new SeedTree(new Seed(SEED)).stream(address);
    }

    private static Address address(String experiment, String width, String trial, String role) {
        return new Address(experiment, Integer.parseInt(width), Long.parseLong(trial), role);
    }

    private static String joined(LongStream numbers) {
        return String.join(" ", numbers.mapToObj(Long::toString).toList());
    }

    private static List<List<String>> rows(String header) throws IOException {
        List<String> lines = page().lines().toList();
        int start = 0;
        while (!lines.get(start).startsWith(header)) {
            start++;
        }
        return lines.subList(start + 2, lines.size()).stream()
                .takeWhile(l -> l.startsWith("|"))
                .map(l -> List.of(l.substring(2, l.length() - 2).split(" \\| ", -1)))
                .toList();
    }

    private static String page() throws IOException {
        return Files.readString(Path.of("schemas/FORMAT.md"));
    }
}
