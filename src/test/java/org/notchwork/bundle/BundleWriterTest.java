package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.Studies;
import org.notchwork.run.StudyRun;
import org.notchwork.verify.BundleFixture;

/** A bundle is whole or not there, and what stood there before is kept unless its replacement is whole. */
class BundleWriterTest {

    @TempDir
    Path home;

    @Test
    void anExistingTargetIsRefusedUnlessItMayBeReplaced() throws Exception {
        Path target = BundleFixture.make(home.resolve("bundle"));
        byte[] before = Files.readAllBytes(target.resolve("data/seal.json"));
        IOException refused = assertThrows(IOException.class, () -> BundleWriter.begin(Studies.small(), target, false));
        assertTrue(refused.getMessage().contains("--replace"), refused.getMessage());
        assertArrayEquals(before, Files.readAllBytes(target.resolve("data/seal.json")));
        BundleWriter.begin(Studies.small(), target, true).close();
        assertArrayEquals(before, Files.readAllBytes(target.resolve("data/seal.json")));
        assertEquals(List.of("bundle"), names(home));
    }

    @Test
    void whatIsNoBundleIsNeverReplaced() throws IOException {
        Path folder = Files.createDirectory(home.resolve("work"));
        Files.writeString(folder.resolve("thesis.txt"), "years of work");
        assertThrows(IOException.class, () -> BundleWriter.begin(Studies.small(), folder, true));
        assertEquals("years of work", Files.readString(folder.resolve("thesis.txt")));
        Path file = Files.writeString(home.resolve("file"), "x");
        assertThrows(IOException.class, () -> BundleWriter.begin(Studies.small(), file, true));
        assertThrows(IOException.class, () -> BundleWriter.begin(Studies.small(), Path.of("/"), true));
    }

    @Test
    void aRunThatFailsLeavesNothingBehind() throws IOException {
        assertThrows(
                IllegalStateException.class,
                () -> new StudyRun(Studies.small(), 2)
                        .seal(
                                home.resolve("bundle"),
                                false,
                                (experiment, width) -> {
                                    throw new IllegalStateException("pretended");
                                },
                                () -> {
                                    throw new IllegalStateException("not reached");
                                }));
        assertEquals(List.of(), names(home));
    }

    @Test
    void aSecondRunIntoOneTargetIsRefused() throws IOException {
        Path target = home.resolve("bundle");
        try (BundleWriter first = BundleWriter.begin(Studies.small(), target, false)) {
            IOException refused =
                    assertThrows(IOException.class, () -> BundleWriter.begin(Studies.small(), target, false));
            assertTrue(refused.getMessage().contains("already"), refused.getMessage());
            assertFalse(Files.exists(target));
            assertTrue(Files.isDirectory(home.resolve(".bundle.partial")));
            assertNotNull(first);
        }
    }

    @Test
    void whatAnEarlierRunLeftBehindIsRemoved() throws Exception {
        Path left = home.resolve(".bundle.partial").resolve("data");
        Files.createDirectories(left);
        Files.writeString(left.resolve("trials-all.jsonl"), "half a line");
        BundleFixture.make(home.resolve("bundle"));
        assertEquals(List.of("bundle"), names(home));
        assertEquals(0, BundleFixture.verify(home.resolve("bundle")).exitCode());
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).sorted().toList();
        }
    }
}
