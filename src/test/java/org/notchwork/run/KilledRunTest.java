package org.notchwork.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.ChildJvm;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonText;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

/** A process killed without warning leaves nothing under the final name, and the next one goes on to the same seal. */
class KilledRunTest {

    private static final String STUDY = """
            {"format": "notchwork-study/2", "title": "Killed", "question": "Does it go on?",
             "seed": "the seed of killed runs", "cross-check-width": 6,
             "experiments": [
              {"id": "period", "problem": {"kind": "xor-period"}, "widths": [6, 8], "trials": 600, "query-limit": 1000,
               "strategies": [{"name": "random-draws"}, {"name": "cycle-walk"},
                 {"name": "fourier-sampling", "engine": "statevector"}]}],
             "claims": []}
            """;

    @TempDir
    private Path folder;

    @Test
    void aKilledRunGoesOnToTheSameSeal() throws Exception {
        killed(2);
    }

    /** Thirty moments; several minutes. */
    @Test
    @Tag("soak")
    void thirtyKilledRunsGoOnToTheSameSeal() throws Exception {
        killed(30);
    }

    private void killed(int kills) throws Exception {
        Files.writeString(folder.resolve("study.json"), STUDY);
        long start = System.nanoTime();
        assertEquals(
                0,
                ChildJvm.running()
                        .run(folder, "run", "study.json", "--output", "whole")
                        .exit());
        long whole = TimeUnit.NANOSECONDS.toMillis(System.nanoTime() - start);
        RandomStream moments = Streams.numbered("moments to kill", kills);
        for (int i = 0; i < kills; i++) {
            Process process = new ProcessBuilder(command("run", "study.json", "--output", "cut", "--resume"))
                    .directory(folder.toFile())
                    .redirectErrorStream(true)
                    .redirectOutput(folder.resolve("out-" + i).toFile())
                    .start();
            boolean ended = process.waitFor(1 + moments.below(whole), TimeUnit.MILLISECONDS);
            process.destroyForcibly();
            process.waitFor();
            boolean isThere = Files.exists(folder.resolve("cut"));
            assertFalse(isThere && !Files.exists(folder.resolve("cut/bagit.txt")), "half a bundle");
            if (ended || isThere) {
                break;
            }
        }
        if (!Files.exists(folder.resolve("cut"))) {
            ChildJvm.Ended ended = ChildJvm.running().run(folder, "run", "study.json", "--output", "cut", "--resume");
            assertEquals(0, ended.exit(), ended.err());
        }
        assertEquals(seal("whole"), seal("cut"));
        assertFalse(Files.exists(folder.resolve(".cut.journal")));
        ChildJvm.Ended verified = ChildJvm.running().run(folder, "verify", "cut");
        assertEquals(0, verified.exit(), verified.out());
        assertTrue(verified.out().contains("YES"), verified.out());
    }

    private static List<String> command(String... arguments) {
        List<String> command = new ArrayList<>(List.of(
                ChildJvm.running().java().toString(),
                "-cp",
                System.getProperty("java.class.path"),
                "org.notchwork.cli.Main"));
        command.addAll(List.of(arguments));
        return command;
    }

    private String seal(String bundle) throws Exception {
        byte[] file = Files.readAllBytes(folder.resolve(bundle).resolve("data/seal.json"));
        JsonObject seal = (JsonObject) new JsonReader(JsonLimits.FILE).read(file);
        return ((JsonText) seal.member("seal").orElseThrow()).value();
    }
}
