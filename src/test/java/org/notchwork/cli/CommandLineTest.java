package org.notchwork.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.ChildJvm;
import org.notchwork.Studies;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.verify.BundleFixture;

/** The program as its users start it: screens, one-line faults, exit codes. */
class CommandLineTest {

    @TempDir
    static Path home;

    private static Path study;
    private static Path bundle;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeAStudyAndItsBundle() throws IOException, InterruptedException {
        study = Files.writeString(home.resolve("small.json"), Studies.SMALL);
        bundle = BundleFixture.make(home.resolve("bundle"));
    }

    @Test
    void aRunLeavesABundleInTheFolderNamedAfterTheStudyAndPrintsItsSeal() throws Exception {
        ChildJvm.Ended ended = run("run", study.toString());
        assertEquals(0, ended.exit(), ended.err());
        String seal = BundleFixture.verify(folder.resolve("small")).seal().orElseThrow();
        assertTrue(ended.out().contains("verify small --expect " + seal), ended.out());
        assertTrue(ended.out().contains("all/5/fourier-sampling@annihilator  sighted"), ended.out());
        assertTrue(ended.out().contains("cross-checks: "), ended.out());
        assertEquals("", ended.err());
    }

    @Test
    void anExistingBundleIsRefusedWithItsMend() throws Exception {
        ChildJvm.Ended ended = run("run", study.toString(), "--output", bundle.toString());
        assertEquals(11, ended.exit());
        assertEquals("", ended.out());
        assertEquals("notchwork: " + bundle + ": already there; name another folder or say --replace\n", ended.err());
    }

    @Test
    void aFaultyStudyIsRefusedWithALineForEachFaultBeforeAnythingRuns() throws Exception {
        Path faulty = Files.writeString(
                folder.resolve("faulty.json"),
                Studies.SMALL.replace("\"trials\": 8", "\"trails\": 8").replace("[3, 5]", "[3, 30]"));
        ChildJvm.Ended ended = run("run", faulty.toString());
        assertEquals(2, ended.exit());
        List<String> lines = ended.err().lines().toList();
        assertEquals(3, lines.size(), ended.err());
        for (String line : lines) {
            assertTrue(line.startsWith("notchwork: " + faulty + ": /experiments/0/"), line);
        }
        assertFalse(Files.exists(folder.resolve("faulty")));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "bake",
                "run",
                "run a b",
                "run no-such-file.json",
                "run .",
                "run STUDY --thread 2",
                "run STUDY --threads none",
                "run STUDY --threads 0",
                "run STUDY --threads",
                "verify",
                "verify BUNDLE --rerun some",
                "verify BUNDLE --rerun 0",
                "verify BUNDLE --expect 0123456789abcdef",
                "verify BUNDLE --expect zz",
                "verify BUNDLE --referee-seed short",
                "show BUNDLE --trial all/5/random-draws/99",
                "show BUNDLE --trial all/5/random-drawz/1",
                "show BUNDLE --trial 7",
                "estimate"
            })
    void wrongUsageIsOneLineAndExitTwo(String line) throws Exception {
        ChildJvm.Ended ended = run(words(line));
        assertEquals(2, ended.exit(), ended.err());
        assertEquals("", ended.out());
        assertFalse(ended.err().contains("\tat "), ended.err());
        if (!line.isEmpty()) {
            assertEquals(1, ended.err().lines().count(), ended.err());
        }
    }

    @Test
    void aMisspeltWordGetsASuggestion() throws Exception {
        assertTrue(run("verfy", "x").err().contains("did you mean \"verify\"?"));
        assertTrue(run("run", "x", "--outptu", "y").err().contains("did you mean \"--output\"?"));
        assertTrue(run(words("show BUNDLE --trial all/5/random-drawz/1"))
                .err()
                .contains("did you mean all/5/random-draws?"));
    }

    @Test
    void whatIsNoBundleIsExitTwelve() throws Exception {
        for (String target : List.of(study.toString(), "nothing-here", home.toString())) {
            ChildJvm.Ended ended = run("verify", target);
            assertEquals(12, ended.exit(), target + ended.err());
            assertTrue(ended.out().contains("MALFORMED: container: "), ended.out());
            assertEquals(12, run("show", target).exit());
        }
    }

    @Test
    void aTamperedBundleIsExitTenWithTheFileNamedInTheLastLines() throws Exception {
        Path changed = BundleFixture.copy(bundle, folder.resolve("changed"));
        BundleFixture.edit(changed, "summary.json", t -> t.replaceFirst("\"solved\":8", "\"solved\":7"));
        ChildJvm.Ended ended = run("verify", changed.toString());
        assertEquals(10, ended.exit());
        assertTrue(ended.out().contains("data/summary.json"), ended.out());
        assertTrue(ended.out().lines().reduce((a, b) -> b).orElseThrow().startsWith("NO: hashes"), ended.out());
    }

    @Test
    void theVerdictIsTheLastLineAndJsonOnRequest() throws Exception {
        ChildJvm.Ended ended =
                run("verify", bundle.toString(), "--rerun", "5", "--referee-seed", "a seed of the referee");
        assertEquals(0, ended.exit(), ended.err());
        assertTrue(ended.out().lines().reduce((a, b) -> b).orElseThrow().startsWith("YES: intact"), ended.out());
        assertTrue(ended.out().contains("referee seed \"a seed of the referee\""), ended.out());
        for (String line : List.of("verify BUNDLE", "show BUNDLE", "estimate STUDY", "run STUDY --output json-run")) {
            ChildJvm.Ended json = run(words(line + " --json"));
            assertEquals(0, json.exit(), json.err());
            new JsonReader(JsonLimits.FILE).read(json.out().getBytes(StandardCharsets.UTF_8));
        }
    }

    @Test
    void aTrialIsWalkedStepByStep() throws Exception {
        ChildJvm.Ended classical = run("show", bundle.toString(), "--trial", "all/5/random-draws/3");
        assertEquals(0, classical.exit(), classical.err());
        assertTrue(classical.out().contains("  1: f("), classical.out());
        assertTrue(classical.out().contains("two points with one value"), classical.out());
        assertFalse(classical.out().contains("DIFFERENT"), classical.out());
        ChildJvm.Ended quantum = run("show", bundle.toString(), "--trial", "all/5/fourier-sampling@fibre/3");
        assertTrue(quantum.out().contains("engine: fibre, blind"), quantum.out());
        assertTrue(quantum.out().contains("rank 4"), quantum.out());
        assertTrue(quantum.out().contains("y·s = 0 holds for 4 of 4"), quantum.out());
        ChildJvm.Ended cut = run("show", bundle.toString(), "--trial", "cut/6/fourier-sampling@fibre/0");
        assertEquals(0, cut.exit(), cut.err());
    }

    @Test
    void everyVerbHasAHelpWithAnExample() throws Exception {
        assertTrue(run("--help").out().contains("exit codes: 0 good"));
        for (String verb : List.of("run", "estimate", "verify", "show")) {
            ChildJvm.Ended ended = run(verb, "--help");
            assertEquals(0, ended.exit());
            assertTrue(ended.out().contains("example: java -jar notchwork.jar " + verb), ended.out());
        }
        assertTrue(run("--version").out().startsWith("notchwork "));
    }

    @Test
    void aFullOutputIsNeverASuccess() throws Exception {
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full), "there is no device that is always full");
        Path err = folder.resolve("err.txt");
        for (String line : List.of("verify BUNDLE", "show BUNDLE", "--help")) {
            Process process = ChildJvm.running().start(folder, full, err, words(line));
            assertTrue(process.waitFor(60, TimeUnit.SECONDS));
            assertEquals(11, process.exitValue(), line);
            assertTrue(Files.readString(err).contains("standard output is full or closed"), line);
        }
    }

    @Test
    void tooLittleMemoryIsSaidBeforeTheRun() throws Exception {
        Path large = Files.writeString(
                folder.resolve("large.json"),
                Studies.SMALL
                        .replace("\"widths\": [6]", "\"widths\": [26]")
                        .replace("\"trials\": 12", "\"trials\": 2"));
        ChildJvm.Ended ended = ChildJvm.running().withFlags(List.of("-Xmx64m")).run(folder, "run", large.toString());
        assertEquals(11, ended.exit(), ended.err());
        assertTrue(ended.err().contains("cut/26/fourier-sampling@fibre needs about"), ended.err());
        assertTrue(ended.err().contains("java -Xmx"), ended.err());
    }

    /** Ctrl-C and a termination signal end a run with 11 and leave nothing under the final name. */
    @ParameterizedTest
    @ValueSource(strings = {"INT", "TERM"})
    void anInterruptedRunLeavesNothing(String signal) throws Exception {
        Path kill = Path.of("/bin/kill");
        assumeTrue(Files.isExecutable(kill), "there is no kill command");
        Path slow = Files.writeString(
                folder.resolve("slow.json"),
                Studies.SMALL
                        .replace("\"widths\": [6]", "\"widths\": [6, 22]")
                        .replace("\"trials\": 12", "\"trials\": 5000"));
        Path out = folder.resolve("out.txt");
        Path err = folder.resolve("err.txt");
        Process process = ChildJvm.running().start(folder, out, err, "run", slow.toString());
        Path partial = folder.resolve(".slow.partial");
        for (int i = 0; i < 200 && !Files.exists(partial); i++) {
            TimeUnit.MILLISECONDS.sleep(50);
        }
        assertTrue(Files.exists(partial), "the run began");
        assertEquals(
                0,
                new ProcessBuilder(kill.toString(), "-" + signal, Long.toString(process.pid()))
                        .start()
                        .waitFor());
        assertTrue(process.waitFor(30, TimeUnit.SECONDS));
        assertEquals(11, process.exitValue());
        assertTrue(Files.readString(err).contains("stopped before it was finished"), Files.readString(err));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(
                    List.of("err.txt", "out.txt", "slow.json"),
                    files.map(f -> f.getFileName().toString()).sorted().toList());
        }
    }

    private String[] words(String line) {
        if (line.isEmpty()) {
            return new String[0];
        }
        return Stream.of(line.split(" ", -1))
                .map(w -> w.equals("STUDY") ? study.toString() : w.equals("BUNDLE") ? bundle.toString() : w)
                .toArray(String[]::new);
    }

    private ChildJvm.Ended run(String... arguments) throws IOException, InterruptedException {
        return ChildJvm.running().run(folder, arguments);
    }
}
