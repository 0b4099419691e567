package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StagingTest {

    @TempDir
    private Path folder;

    @Test
    void nothingHasTheNameUntilItIsComplete() throws IOException {
        Path target = folder.resolve("b");
        try (Staging staging = Staging.begin(target, false)) {
            fill(staging, "new");
            assertFalse(Files.exists(target));
            staging.complete();
            assertEquals("new", Files.readString(target.resolve("bagit.txt")));
        }
        assertEquals(List.of("b"), names());
    }

    @Test
    void anEndWithoutCompletionLeavesNothing() throws IOException {
        try (Staging staging = Staging.begin(folder.resolve("b"), false)) {
            fill(staging, "new");
        }
        assertEquals(List.of(), names());
    }

    @Test
    void aTakenNameIsRefusedUnlessReplaced() throws IOException {
        Path target = bundle("b", "old");
        IOException refused = assertThrows(IOException.class, () -> Staging.begin(target, false));
        assertEquals(target + ": already there; name another folder or say --replace", refused.getMessage());
        try (Staging staging = Staging.begin(target, true)) {
            fill(staging, "new");
            assertEquals("old", Files.readString(target.resolve("bagit.txt")));
            staging.complete();
        }
        assertEquals("new", Files.readString(target.resolve("bagit.txt")));
        assertEquals(List.of("b"), names());
    }

    @Test
    void anAbandonedReplacementKeepsTheOld() throws IOException {
        Path target = bundle("b", "old");
        try (Staging staging = Staging.begin(target, true)) {
            fill(staging, "new");
        }
        assertEquals("old", Files.readString(target.resolve("bagit.txt")));
        assertEquals(List.of("b"), names());
    }

    @Test
    void whatIsNoBundleIsNeverReplaced() throws IOException {
        Path target = Files.createDirectory(folder.resolve("precious"));
        Files.writeString(target.resolve("thesis.txt"), "years of work");
        assertThrows(IOException.class, () -> Staging.begin(target, true));
        Path file = Files.writeString(folder.resolve("file"), "x");
        assertThrows(IOException.class, () -> Staging.begin(file, true));
        assertEquals("years of work", Files.readString(target.resolve("thesis.txt")));
        assertEquals(List.of("file", "precious"), names());
    }

    @Test
    void aNameThatIsTakenMeanwhileIsNotOverwritten() throws IOException {
        Path target = folder.resolve("b");
        try (Staging staging = Staging.begin(target, false)) {
            fill(staging, "new");
            bundle("b", "somebody else's");
            assertThrows(IOException.class, staging::complete);
        }
        assertEquals("somebody else's", Files.readString(target.resolve("bagit.txt")));
        assertEquals(List.of("b"), names());
    }

    @Test
    void aSecondRunToOneTargetIsRefusedAndTheFirstGoesOn() throws IOException {
        Path target = folder.resolve("b");
        try (Staging first = Staging.begin(target, false)) {
            fill(first, "first");
            assertThrows(IOException.class, () -> Staging.begin(target, false));
            first.complete();
        }
        assertEquals("first", Files.readString(target.resolve("bagit.txt")));
    }

    @Test
    void whatADeadRunLeftIsCleared() throws IOException {
        Files.createDirectories(folder.resolve(".b.partial/data"));
        Files.writeString(folder.resolve(".b.partial/data/half.txt"), "half");
        Files.writeString(folder.resolve(".b.lock"), "a dead run's");
        try (Staging staging = Staging.begin(folder.resolve("b"), false)) {
            assertFalse(Files.exists(staging.folder().resolve("data/half.txt")));
            fill(staging, "new");
            staging.complete();
        }
        assertEquals(List.of("b"), names());
    }

    @Test
    void aBundleThatADeadRunMovedAsideIsBroughtBack() throws IOException {
        bundle(".b.replaced", "old");
        Path target = folder.resolve("b");
        assertThrows(IOException.class, () -> Staging.begin(target, false));
        assertEquals("old", Files.readString(target.resolve("bagit.txt")));
        assertEquals(List.of("b"), names());
    }

    @Test
    void anOldBundleIsRemovedWhereTheNewOneHasItsName() throws IOException {
        bundle(".b.replaced", "old");
        bundle("b", "new");
        Staging.begin(folder.resolve("b"), true).close();
        assertEquals("new", Files.readString(folder.resolve("b/bagit.txt")));
        assertEquals(List.of("b"), names());
    }

    @Test
    void aLinkInTheLocksPlaceIsNotFollowed() throws IOException {
        Path victim = Files.writeString(folder.resolve("victim"), "untouched");
        try {
            Files.createSymbolicLink(folder.resolve(".b.lock"), victim);
        } catch (UnsupportedOperationException e) {
            Assumptions.abort("this system has no links");
        }
        assertThrows(IOException.class, () -> Staging.begin(folder.resolve("b"), false));
        assertEquals("untouched", Files.readString(victim));
    }

    @Test
    void theRootIsNoPlaceForABundle() {
        assertThrows(IOException.class, () -> Staging.begin(folder.getRoot(), true));
    }

    private void fill(Staging staging, String text) throws IOException {
        Files.createDirectory(staging.folder().resolve("data"));
        Files.writeString(staging.folder().resolve("bagit.txt"), text);
        assertTrue(staging.folder().getFileName().toString().startsWith("."));
    }

    private Path bundle(String name, String text) throws IOException {
        Path bundle = Files.createDirectories(folder.resolve(name));
        Files.writeString(bundle.resolve("bagit.txt"), text);
        return bundle;
    }

    private List<String> names() throws IOException {
        try (Stream<Path> paths = Files.list(folder)) {
            return paths.map(p -> p.getFileName().toString()).sorted().toList();
        }
    }
}
