package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.verify.BundleFixture;

/** A bundle checked by coreutils and jq alone, as its README says. */
class StockToolsTest {

    private static final List<String> LINES = List.of(
            "sha256sum -c --strict --quiet tagmanifest-sha256.txt",
            "sha256sum -c --strict --quiet manifest-sha256.txt",
            "diff <(cut -c67- manifest-sha256.txt | LC_ALL=C sort) <(find data -type f | LC_ALL=C sort)");

    @TempDir
    static Path home;

    private static Path good;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeOneBundle() throws IOException, InterruptedException {
        assumeTrue(has("bash") && has("sha256sum"), "bash and coreutils are not on this machine");
        good = BundleFixture.make(home.resolve("good"));
    }

    @Test
    void theThreeLinesPassAGoodBundleInSilence() throws Exception {
        for (String line : LINES) {
            assertEquals("0:", run(good, line));
        }
    }

    @Test
    void theThreeLinesStandInTheReadMe() throws IOException {
        String readMe = Files.readString(good.resolve("data/README.txt"), StandardCharsets.UTF_8);
        LINES.forEach(line -> assertTrue(readMe.contains("\n  " + line + "\n"), line));
    }

    @Test
    void aTamperedBundleFailsOneOfTheThreeLines() throws Exception {
        Path changed = BundleFixture.copy(good, folder.resolve("changed"));
        BundleFixture.edit(changed, "summary.json", t -> t.replaceFirst("\"solved\":8", "\"solved\":7"));
        assertNotEquals("0:", run(changed, LINES.get(1)));

        Path unlisted = BundleFixture.copy(good, folder.resolve("unlisted"));
        Files.writeString(unlisted.resolve("data/more.txt"), "more\n");
        assertEquals("0:", run(unlisted, LINES.get(1)));
        assertNotEquals("0:", run(unlisted, LINES.get(2)));

        Path linked = BundleFixture.copy(good, folder.resolve("linked"));
        Path outside = folder.resolve("outside.json");
        Files.move(linked.resolve("data/claims.json"), outside);
        Files.createSymbolicLink(linked.resolve("data/claims.json"), outside);
        assertEquals("0:", run(linked, LINES.get(1)));
        assertNotEquals("0:", run(linked, LINES.get(2)));

        Path tag = BundleFixture.copy(good, folder.resolve("tag"));
        Files.writeString(tag.resolve("bag-info.txt"), "Contact-Name: somebody\n");
        assertNotEquals("0:", run(tag, LINES.get(0)));

        Path missing = BundleFixture.copy(good, folder.resolve("missing"));
        Files.delete(missing.resolve("data/report.pdf"));
        assertNotEquals("0:", run(missing, LINES.get(1)));
    }

    @Test
    void jqGivesBackEveryJsonFileByteForByte() throws Exception {
        assumeTrue(has("jq"), "jq is not on this machine");
        try (Stream<Path> files = Files.list(good.resolve("data"))) {
            for (Path file : files.filter(f -> f.toString().endsWith(".json")).toList()) {
                assertEquals(
                        "0:",
                        run(good, "jq -cjS . data/" + file.getFileName() + " | cmp - data/" + file.getFileName()));
            }
        }
        assertEquals("0:", run(good, "jq -cS . data/trials-all.jsonl | cmp - data/trials-all.jsonl"));
    }

    @Test
    void jqAndShaTwoFiveSixGiveTheSeal() throws Exception {
        assumeTrue(has("jq"), "jq is not on this machine");
        String seal = BundleFixture.verify(good).seal().orElseThrow();
        assertEquals("0:" + seal + "  -", run(good, "jq -cjS 'del(.seal)' data/seal.json | sha256sum"));
        assertEquals("0:" + seal, run(good, "jq -jr .seal data/seal.json"));
    }

    @Test
    void aBundleHasFewFilesWithPlainNames() throws IOException {
        try (Stream<Path> walk = Files.walk(good)) {
            List<Path> files = walk.filter(Files::isRegularFile).toList();
            assertTrue(files.size() < 20, files.toString());
            files.forEach(
                    f -> assertTrue(f.getFileName().toString().matches("[A-Za-z0-9][A-Za-z0-9._-]*"), f.toString()));
        }
    }

    @Test
    void twoRunsGiveTheSameReportToTheByte() throws Exception {
        Path again = BundleFixture.make(folder.resolve("again"));
        assertArrayEquals(
                Files.readAllBytes(good.resolve("data/report.pdf")),
                Files.readAllBytes(again.resolve("data/report.pdf")));
    }

    private static boolean has(String tool) {
        return Stream.of(System.getenv("PATH").split(":", -1))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, tool)));
    }

    private static String run(Path folder, String line) throws IOException, InterruptedException {
        Process process = new ProcessBuilder("bash", "-c", line)
                .directory(folder.toFile())
                .redirectErrorStream(true)
                .start();
        String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(process.waitFor(60, TimeUnit.SECONDS));
        return process.exitValue() + ":" + out.strip();
    }
}
