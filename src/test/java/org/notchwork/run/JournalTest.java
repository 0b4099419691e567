package org.notchwork.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Environment;
import org.notchwork.study.Study;
import org.notchwork.study.StudyReader;

/** A run that was stopped goes on from its journal and ends in the same bytes as one that was never disturbed. */
class JournalTest {

    private static final Environment ENVIRONMENT = new Environment(
            "notchwork of the tests", "2026-01-01T00:00:00Z", "2026-01-01T00:00:01Z", 1, 2, "a Java", "a system");

    /** Controls, several functions, accidents and bounds: everything that a journal has to carry. */
    private static final String STUDY = """
            {"format": "notchwork-study/2", "title": "A journal", "question": "Does it go on?",
             "seed": "the seed of the journal", "cross-check-width": 6,
             "experiments": [
              {"id": "near", "problem": {"kind": "even-mansour"}, "widths": [4, 5], "trials": 12, "query-limit": 400,
               "strategies": [{"name": "data-time-tradeoff"},
                 {"name": "fourier-sampling-fixed", "engine": "weights", "rounds": 14}]},
              {"id": "period", "problem": {"kind": "xor-period"}, "widths": [3, 7], "trials": 9, "query-limit": 7,
               "strategies": [{"name": "random-draws"}, {"name": "fourier-sampling", "engine": "fibre"}]}],
             "claims": []}
            """;

    /** 2 · 12 + 2 · 9. */
    private static final int INSTANCES = 42;

    @TempDir
    private Path folder;

    private final Study study =
            StudyReader.read(STUDY.getBytes(StandardCharsets.UTF_8)).study().orElseThrow();
    private String undisturbed = "";

    @BeforeEach
    void runOnce() throws Exception {
        undisturbed = run(study, folder.resolve("whole"), Unfinished.REFUSE, INSTANCES + 1);
    }

    /** Runs a study, stopped by an interrupt once so many instances are done. */
    private static String run(Study study, Path target, Unfinished unfinished, int stopAfter) throws Exception {
        int[] done = {0};
        return new StudyRun(study, 2)
                .seal(
                        target,
                        false,
                        unfinished,
                        (experiment, width) -> {
                            done[0]++;
                            if (done[0] == stopAfter) {
                                Thread.currentThread().interrupt();
                            }
                        },
                        () -> ENVIRONMENT)
                .seal();
    }

    private Path journal() {
        return folder.resolve(".cut.journal");
    }

    private void stopAfter(int instances, Unfinished unfinished) {
        assertThrows(InterruptedException.class, () -> run(study, folder.resolve("cut"), unfinished, instances));
        assertFalse(Files.exists(folder.resolve("cut")));
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 5, 12, 13, 24, 30, 41})
    void aStoppedRunGoesOnToTheSameSeal(int instances) throws Exception {
        stopAfter(instances, Unfinished.REFUSE);
        assertTrue(Files.isDirectory(journal()));
        assertEquals(undisturbed, run(study, folder.resolve("cut"), Unfinished.RESUME, INSTANCES + 1));
        assertFalse(Files.exists(journal()), "the journal is removed");
        assertEquals(files("whole"), files("cut"));
    }

    @Test
    void aRunStoppedAgainAndAgainGoesOn() throws Exception {
        stopAfter(7, Unfinished.REFUSE);
        // The instances handed over from the journal count as done.
        for (int instances = 8; instances < INSTANCES; instances += 6) {
            stopAfter(instances, Unfinished.RESUME);
        }
        assertEquals(undisturbed, run(study, folder.resolve("cut"), Unfinished.RESUME, INSTANCES + 1));
        assertEquals(files("whole"), files("cut"));
    }

    @Test
    void aDamagedPieceIsNoticedAndDoneAgain() throws Exception {
        for (int at : List.of(0, 40, 64, 65, 300, -1)) {
            stopAfter(9, Unfinished.DISCARD);
            stopAfter(20, Unfinished.RESUME);
            Path piece = journal().resolve("piece-0");
            byte[] bytes = Files.readAllBytes(piece);
            bytes[at < 0 ? bytes.length - 1 : at] ^= 1;
            Files.write(piece, bytes);
            Path target = folder.resolve("cut");
            assertEquals(undisturbed, run(study, target, Unfinished.RESUME, INSTANCES + 1), "byte " + at);
            assertEquals(files("whole"), files("cut"));
            delete(target);
        }
    }

    @Test
    void aPieceThatIsCutEmptyOrMissingIsDoneAgain() throws Exception {
        for (int length : List.of(-1, 0, 30, 65, 500)) {
            stopAfter(9, Unfinished.DISCARD);
            stopAfter(20, Unfinished.RESUME);
            Path piece = journal().resolve("piece-1");
            byte[] bytes = Files.readAllBytes(piece);
            if (length < 0) {
                Files.delete(piece);
            } else {
                Files.write(piece, Arrays.copyOf(bytes, length));
            }
            Path target = folder.resolve("cut");
            assertEquals(undisturbed, run(study, target, Unfinished.RESUME, INSTANCES + 1), length + " bytes");
            delete(target);
        }
    }

    /** A piece of another place, whole in itself, does not slip in. */
    @Test
    void aPieceInAnothersPlaceIsDoneAgain() throws Exception {
        stopAfter(9, Unfinished.REFUSE);
        stopAfter(20, Unfinished.RESUME);
        Files.copy(journal().resolve("piece-1"), journal().resolve("piece-0"), StandardCopyOption.REPLACE_EXISTING);
        assertEquals(undisturbed, run(study, folder.resolve("cut"), Unfinished.RESUME, INSTANCES + 1));
    }

    @Test
    void anUnfinishedRunIsNeitherForgottenNorTakenForAnother() throws Exception {
        stopAfter(9, Unfinished.REFUSE);
        IOException kept = assertThrows(
                IOException.class, () -> run(study, folder.resolve("cut"), Unfinished.REFUSE, INSTANCES + 1));
        assertTrue(kept.getMessage().contains("--resume"), kept.getMessage());
        Study other = StudyReader.read(
                        STUDY.replace("\"trials\": 9", "\"trials\": 10").getBytes(StandardCharsets.UTF_8))
                .study()
                .orElseThrow();
        IOException foreign = assertThrows(
                IOException.class, () -> run(other, folder.resolve("cut"), Unfinished.RESUME, INSTANCES + 9));
        assertTrue(foreign.getMessage().contains("another study"), foreign.getMessage());
        assertEquals(undisturbed, run(study, folder.resolve("cut"), Unfinished.DISCARD, INSTANCES + 1));
    }

    @Test
    void thereIsNothingToGoOnFromIsNoFault() throws Exception {
        assertEquals(undisturbed, run(study, folder.resolve("cut"), Unfinished.RESUME, INSTANCES + 1));
    }

    /** Returns every file of a bundle with its digest. */
    private List<String> files(String bundle) throws IOException {
        List<String> digests = new ArrayList<>();
        try (Stream<Path> all = Files.walk(folder.resolve(bundle))) {
            for (Path file : all.filter(Files::isRegularFile).sorted().toList()) {
                digests.add(folder.resolve(bundle).relativize(file) + " " + Digests.hex(Files.readAllBytes(file)));
            }
        }
        return digests;
    }

    private static void delete(Path bundle) throws IOException {
        try (Stream<Path> all = Files.walk(bundle)) {
            for (Path file : all.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(file);
            }
        }
    }
}
