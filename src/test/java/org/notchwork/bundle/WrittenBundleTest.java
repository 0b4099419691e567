package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.StudyReader;

class WrittenBundleTest {

    @TempDir
    private static Path shared;

    @TempDir
    private Path folder;

    private static final SampleRun RUN = new SampleRun();
    private static Path bundle;
    private static String seal;

    @BeforeAll
    static void write() throws IOException {
        bundle = shared.resolve("sample");
        seal = RUN.write(bundle, false);
    }

    @Test
    void theBundleIsACompleteBagWithRightDigests() throws Exception {
        Bag bag = Bag.open(bundle, Limits.USUAL);
        assertEquals(List.of(), bag.mismatches());
        List<String> wanted =
                new ArrayList<>(List.of("bag-info.txt", "bagit.txt", "manifest-sha256.txt", "tagmanifest-sha256.txt"));
        Layout.payload(RUN.study()).forEach(name -> wanted.add("data/" + name));
        assertEquals(new TreeSet<>(wanted), new TreeSet<>(bag.sizes().keySet()));
    }

    @Test
    void everyFileSaysItsFormat() throws Exception {
        for (String name : List.of("summary", "cross-checks", "claims", "seal", "environment", "study")) {
            String text = Files.readString(bundle.resolve("data/" + name + ".json"));
            assertTrue(text.contains("\"format\":\"notchwork-" + name + "/1\""), name);
        }
        for (String line : lines("small")) {
            assertTrue(line.contains("\"format\":\"notchwork-trial/1\""), line);
        }
    }

    @Test
    void everyJsonFileAndLineIsCanonical() throws Exception {
        JsonReader reader = new JsonReader(JsonLimits.FILE);
        for (String name : Layout.payload(RUN.study())) {
            if (name.endsWith(".json")) {
                reader.readCanonical(Files.readAllBytes(bundle.resolve("data/" + name)));
            }
        }
        for (String experiment : List.of("small", "cut-short")) {
            for (String line : lines(experiment)) {
                reader.readCanonical(line.getBytes(StandardCharsets.UTF_8));
            }
        }
    }

    @Test
    void linesAreOrderedByWidthTrialAndStrategy() throws IOException {
        List<String> wanted = new ArrayList<>();
        for (int width : List.of(3, 4)) {
            for (int trial = 0; trial < 6; trial++) {
                for (String label : List.of(
                        "sequential-scan", "random-draws", "fourier-sampling@fibre", "fourier-sampling@annihilator")) {
                    wanted.add("\"strategy\":\"" + label + "\",\"trial\":" + trial + ",\"width\":" + width + "}");
                }
            }
        }
        List<String> lines = lines("small");
        assertEquals(wanted.size(), lines.size());
        for (int i = 0; i < wanted.size(); i++) {
            assertTrue(lines.get(i).endsWith(wanted.get(i)), "line " + (i + 1) + ": " + lines.get(i));
        }
    }

    @Test
    void quantumLinesAndTheyAloneSayEngineAndSight() throws IOException {
        for (String line : lines("small")) {
            boolean fibre = line.contains("@fibre");
            boolean told = line.contains("@annihilator");
            assertEquals(fibre, line.contains("\"engine\":\"fibre\"") && line.contains("\"sight\":\"blind\""), line);
            assertEquals(
                    told, line.contains("\"engine\":\"annihilator\"") && line.contains("\"sight\":\"sighted\""), line);
            assertEquals(fibre || told, line.contains("\"engine\":") || line.contains("\"sight\":"), line);
        }
    }

    @Test
    void whatWasWrittenReadsBackTheSame() throws Exception {
        List<Fault> faults = new ArrayList<>();
        assertEquals(
                RUN.study(),
                StudyReader.read(Files.readAllBytes(bundle.resolve("data/study.json")))
                        .study()
                        .orElseThrow());
        assertEquals(RUN.results().checks(), CrossChecksFile.read(json("cross-checks.json"), faults));
        assertEquals(SampleRun.ENVIRONMENT, EnvironmentFile.read(json("environment.json"), faults));
        Seal read = Seal.read(json("seal.json"), Layout.sealed(RUN.study()), faults);
        assertEquals(seal, read.digest());
        assertEquals(List.of(), faults);
        assertArrayEquals(SampleRun.REPORT, Files.readAllBytes(bundle.resolve("data/report.pdf")));
        assertEquals(Schemas.document(), json("schemas.json"));
    }

    @Test
    void theSealHoldsTheDigestsAndTheTreeHead() throws Exception {
        List<Fault> faults = new ArrayList<>();
        Seal read = Seal.read(json("seal.json"), Layout.sealed(RUN.study()), faults);
        assertEquals(List.of(), faults);
        for (String name : Layout.sealed(RUN.study())) {
            byte[] bytes = Files.readAllBytes(bundle.resolve("data/" + name));
            assertEquals(TestBag.sha256(bytes), read.files().get(name), name);
        }
        MerkleTree tree = new MerkleTree();
        for (String experiment : List.of("small", "cut-short")) {
            lines(experiment).forEach(line -> tree.add(line.getBytes(StandardCharsets.UTF_8)));
        }
        assertEquals(58, read.trials());
        assertEquals(Digests.text(tree.root()), read.root());
    }

    @Test
    void timesAndTheReportAreNotUnderTheSeal() throws IOException {
        Environment later = new Environment(
                "notchwork other", "2031-01-01T00:00:00Z", "2031-01-02T00:00:00Z", 86_400, 8, "25", "elsewhere");
        try (BundleWriter writer = BundleWriter.begin(RUN.study(), folder.resolve("again"), false)) {
            RUN.addLines(writer);
            assertEquals(seal, writer.finish(RUN.results(), later, s -> new byte[] {1, 2, 3}));
        }
    }

    @Test
    void theReportIsMadeOnceWithTheSeal() throws IOException {
        List<String> seals = new ArrayList<>();
        try (BundleWriter writer = BundleWriter.begin(RUN.study(), folder.resolve("again"), false)) {
            RUN.addLines(writer);
            writer.finish(RUN.results(), SampleRun.ENVIRONMENT, s -> {
                seals.add(s);
                return SampleRun.REPORT;
            });
        }
        assertEquals(List.of(seal), seals);
    }

    @Test
    void metadataIsInTheOneFormThatIsRead() throws IOException {
        assertEquals(
                List.of(
                        "Bag-Software-Agent: notchwork test",
                        "Bagging-Date: 2026-03-01",
                        "External-Description: Invented sample: two dials, £5 \"wager\""),
                Files.readAllLines(bundle.resolve("bag-info.txt")).subList(0, 3));
    }

    @Test
    void aFailureInTheReportLeavesNothing() throws IOException {
        Path target = folder.resolve("failed");
        try (BundleWriter writer = BundleWriter.begin(RUN.study(), target, false)) {
            RUN.addLines(writer);
            assertThrows(
                    IllegalStateException.class,
                    () -> writer.finish(RUN.results(), SampleRun.ENVIRONMENT, s -> {
                        throw new IllegalStateException("no ink");
                    }));
        }
        assertNothingIn(folder);
    }

    @Test
    void aRunThatStopsMidwayLeavesNothing() throws IOException {
        try (BundleWriter writer = BundleWriter.begin(RUN.study(), folder.resolve("stopped"), false)) {
            byte[] line = RUN.lines().get(0);
            writer.add("small", line, MerkleTree.leaf(line));
        }
        assertNothingIn(folder);
    }

    @Test
    void aMissingExperimentIsAFaultOfTheCaller() throws IOException {
        try (BundleWriter writer = BundleWriter.begin(RUN.study(), folder.resolve("short"), false)) {
            byte[] line = RUN.lines().get(0);
            writer.add("small", line, MerkleTree.leaf(line));
            assertThrows(
                    IllegalStateException.class,
                    () -> writer.finish(RUN.results(), SampleRun.ENVIRONMENT, s -> SampleRun.REPORT));
        }
        assertNothingIn(folder);
    }

    private static void assertNothingIn(Path folder) throws IOException {
        try (Stream<Path> left = Files.list(folder)) {
            assertEquals(List.of(), left.toList());
        }
    }

    private static List<String> lines(String experiment) throws IOException {
        String text = Files.readString(bundle.resolve("data/" + Layout.trials(experiment)));
        assertTrue(text.endsWith("\n"));
        return List.of(text.substring(0, text.length() - 1).split("\n", -1));
    }

    private static JsonValue json(String name) throws Exception {
        return new JsonReader(JsonLimits.FILE).readCanonical(Files.readAllBytes(bundle.resolve("data/" + name)));
    }
}
