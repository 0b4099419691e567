package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.List;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The lines of the read-me, run by the tools that a stranger has, on a right bundle and on spoiled ones. */
class ReadMeLinesTest {

    private static final SampleRun RUN = new SampleRun();

    @TempDir
    private Path folder;

    private Path bundle;
    private String seal;

    @BeforeEach
    void write() throws IOException {
        bundle = folder.resolve("sample");
        seal = RUN.write(bundle, false);
    }

    @Test
    void theThreeLinesAreSilentOnARightBundle() throws Exception {
        for (String line : checks()) {
            assertEquals(new Outcome(0, ""), run(line), line);
        }
    }

    @Test
    void theLineOfTheSealPrintsIt() throws Exception {
        needs("jq");
        assertEquals(new Outcome(0, seal + "  -\n"), run(line(3)));
    }

    @Test
    void aChangedByteInThePayloadIsSeenByTheSecondLine() throws Exception {
        Path file = bundle.resolve("data/summary.json");
        byte[] bytes = Files.readAllBytes(file);
        bytes[bytes.length / 2] ^= 1;
        Files.write(file, bytes);
        assertEquals(0, run(line(0)).exit());
        assertNotEquals(0, run(line(1)).exit());
    }

    @Test
    void aManifestMadeToFitIsSeenByTheFirstLine() throws Exception {
        Path file = bundle.resolve("data/environment.json");
        String old = TestBag.sha256(Files.readAllBytes(file));
        Files.writeString(file, " ", StandardOpenOption.APPEND);
        Path manifest = bundle.resolve("manifest-sha256.txt");
        Files.writeString(manifest, Files.readString(manifest).replace(old, TestBag.sha256(Files.readAllBytes(file))));
        assertEquals(0, run(line(1)).exit());
        assertNotEquals(0, run(line(0)).exit());
    }

    @Test
    void anUnlistedFileIsSeenByTheThirdLineAlone() throws Exception {
        Files.writeString(bundle.resolve("data/extra.txt"), "x");
        assertEquals(0, run(line(0)).exit());
        assertEquals(0, run(line(1)).exit());
        assertEquals(new Outcome(1, "0a1\n> data/README.txt\n"), mask(run(line(2)), "extra.txt", "README.txt"));
    }

    @Test
    void aLinkInAFilesPlaceIsSeenByTheThirdLineAlone() throws Exception {
        Path file = bundle.resolve("data/claims.json");
        Path outside = folder.resolve("claims.json");
        Files.move(file, outside);
        Files.createSymbolicLink(file, outside);
        assertEquals(0, run(line(1)).exit());
        assertNotEquals(0, run(line(2)).exit());
    }

    @Test
    void jqGivesEveryJsonFileBackToTheByte() throws Exception {
        needs("jq");
        for (String name : Layout.payload(RUN.study())) {
            if (name.endsWith(".json")) {
                byte[] back = bytes("jq -cjS . data/" + name);
                assertArrayEquals(Files.readAllBytes(bundle.resolve("data/" + name)), back, name);
            }
        }
        for (String name : List.of("trials-small.jsonl", "trials-cut-short.jsonl")) {
            byte[] back = bytes("jq -cS . data/" + name);
            assertArrayEquals(Files.readAllBytes(bundle.resolve("data/" + name)), back, name);
        }
    }

    private Outcome mask(Outcome outcome, String from, String to) {
        return new Outcome(
                outcome.exit(),
                outcome.text().replaceFirst("^[0-9]+a[0-9]+", "0a1").replace(from, to));
    }

    private List<String> checks() throws IOException {
        return lines().subList(0, 3);
    }

    private String line(int number) throws IOException {
        return lines().get(number);
    }

    /** The lines as the read-me in the bundle prints them. */
    private List<String> lines() throws IOException {
        List<String> lines = Files.readAllLines(bundle.resolve("data/README.txt")).stream()
                .filter(l -> l.startsWith("  ") && (l.contains("sha256") || l.contains("diff ")))
                .map(String::strip)
                .toList();
        assertEquals(4, lines.size());
        return lines;
    }

    private record Outcome(int exit, String text) {}

    private Outcome run(String line) throws Exception {
        needs("bash");
        needs("sha256sum");
        Process process = start(line);
        String text = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        return new Outcome(process.waitFor(), text);
    }

    private byte[] bytes(String line) throws Exception {
        Process process = start(line);
        byte[] bytes = process.getInputStream().readAllBytes();
        assertEquals(0, process.waitFor(), line);
        return bytes;
    }

    private Process start(String line) throws IOException {
        return new ProcessBuilder("bash", "-c", line)
                .directory(bundle.toFile())
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
    }

    private static void needs(String tool) {
        boolean there = List.of(System.getenv("PATH").split(File.pathSeparator)).stream()
                .anyMatch(d -> Files.isExecutable(Path.of(d, tool)));
        Assumptions.assumeTrue(there, tool + " is not on this machine");
    }
}
