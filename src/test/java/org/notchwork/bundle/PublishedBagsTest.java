package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.bundle.BundleFault.Reason;

/**
 * The conformance cases of the Library of Congress (bagit-conformance-suite, CC0): every invalid one is refused, and
 * every one is refused for a reason that is true of it. None can be accepted: version 1.0 cases come with manifests of
 * SHA-512, version 0.97 cases are of another version, and a bundle is version 1.0 with SHA-256 alone.
 */
class PublishedBagsTest {

    private static final Path SUITE = Path.of("../shared/vectors/bagit");

    @ParameterizedTest
    @CsvSource({
        // Right in all but the algorithm: gets past the names, the declaration and the layout of RFC 8493.
        "v1.0/valid/basicBag, ALGORITHM, manifest-sha512.txt",
        "v1.0/invalid/bagit-with-invalid-whitespace, DECLARATION, bagit.txt",
        "v1.0/invalid/notAllManifestsListAllFiles, ALGORITHM, manifest-sha512.txt",
        "v1.0/invalid/same-filename-listed-twice-with-different-hashes, DECLARATION, bagit.txt",
        // Its manifest is tried by itself below.
        "v1.0/invalid/same-filename-listed-twice-with-the-same-hash, NOT_LISTED, debug",
        "v0.97/invalid/baginfo-missing-encoding, DECLARATION, bagit.txt",
        "v0.97/invalid/bom-in-bagit.txt, BYTE_ORDER_MARK, bagit.txt",
        "v0.97/invalid/invalid-version-number, DECLARATION, bagit.txt",
        "v0.97/invalid/missing-bagit.txt, NOT_A_BUNDLE, bagit.txt",
        "v0.97/invalid/extra-file-in-bag, DECLARATION, bagit.txt",
        "v0.97/invalid/out-of-scope-file-paths-using-dot-notation-for-fetch, FETCH, fetch.txt",
        "v0.97/linux-only/out-of-scope-file-paths-using-absolute-path-for-fetch, FETCH, fetch.txt",
        "v0.97/warning/same-filename-listed-twice-with-different-normalization, NAME, data/N?ez"
    })
    void aPublishedCaseIsRefusedForATrueReason(String bag, Reason reason, String place) {
        Path root = suite().resolve(bag);
        Assumptions.assumeTrue(Files.isDirectory(root), "this case is not on this machine");
        BundleFault fault = assertThrows(BundleFault.class, () -> Bag.open(root, Limits.USUAL));
        assertEquals(reason, fault.reason(), fault.place() + ": " + fault.getMessage());
        // Which code points a name has depends on how this system decodes its bytes.
        assertEquals(place, fault.place().replaceAll("(\\\\u\\{[0-9a-f]{4}\\})+", "?"));
    }

    static Stream<Arguments> everyBag() throws IOException {
        if (!Files.isDirectory(SUITE)) {
            return Stream.of(Arguments.of(SUITE));
        }
        try (Stream<Path> paths = Files.walk(SUITE, 3)) {
            return paths
                    .filter(p -> SUITE.relativize(p).getNameCount() == 3)
                    .sorted()
                    .map(Arguments::of)
                    .toList()
                    .stream();
        }
    }

    @ParameterizedTest
    @MethodSource("everyBag")
    void noPublishedCaseIsTakenForABundle(Path bag) {
        suite();
        assertThrows(BundleFault.class, () -> Bag.open(bag, Limits.USUAL));
    }

    /** Manifests by themselves, since other faults of their bags are met first. */
    @ParameterizedTest
    @CsvSource({
        "v1.0/invalid/same-filename-listed-twice-with-different-hashes, LISTED_TWICE",
        "v1.0/invalid/same-filename-listed-twice-with-the-same-hash, LISTED_TWICE"
    })
    void aPublishedManifestThatListsAFileTwiceIsRefused(String bag, Reason reason) throws IOException {
        byte[] manifest = Files.readAllBytes(suite().resolve(bag).resolve(Layout.MANIFEST));
        BundleFault fault = assertThrows(BundleFault.class, () -> Manifest.read(Layout.MANIFEST, manifest, true));
        assertEquals(reason, fault.reason());
        assertEquals(Layout.MANIFEST + ", line 2", fault.place());
    }

    /** The paths that leave the bag, behind a digest of the length that is read here. */
    @ParameterizedTest
    @CsvSource({
        "v0.97/invalid/out-of-scope-file-paths-using-dot-notation",
        "v0.97/linux-only/out-of-scope-file-paths-using-absolute-path",
        "v0.97/linux-only/out-of-scope-file-paths-using-shortcut",
        "v0.97/linux-only/out-of-scope-file-paths-using-shortcut-username",
        "v0.97/windows-only/out-of-scope-file-paths-using-absolute-path",
        "v0.97/windows-only/out-of-scope-file-paths-using-shortcut",
        "v0.97/windows-only/out-of-scope-file-paths-using-unc",
        "v0.97/warning/relative-path"
    })
    void aPublishedPathOutsideTheBagIsRefused(String bag) throws IOException {
        Path root = suite().resolve(bag);
        int refused = 0;
        try (Stream<Path> files = Files.list(root)) {
            for (Path manifest : files.filter(BagLines::isManifest).sorted().toList()) {
                for (String path : BagLines.paths(manifest)) {
                    byte[] line = ("a".repeat(64) + "  " + path + "\n").getBytes(StandardCharsets.UTF_8);
                    if (!path.matches("data/[A-Za-z0-9._-]+")) {
                        assertThrows(BundleFault.class, () -> Manifest.read(Layout.MANIFEST, line, true), path);
                        refused++;
                    }
                }
            }
        }
        assertTrue(refused > 0, "the case holds no such path");
    }

    @Test
    void theDigestsOfThePublishedValidBagAreReadable() throws Exception {
        Path manifest = suite().resolve("v1.0/invalid/bagit-with-invalid-whitespace/" + Layout.MANIFEST);
        Map<String, String> read = Manifest.read(Layout.MANIFEST, Files.readAllBytes(manifest), true);
        Path file = manifest.resolveSibling("data").resolve("README");
        assertEquals(Map.of("data/README", TestBag.sha256(Files.readAllBytes(file))), read);
    }

    private static Path suite() {
        Assumptions.assumeTrue(Files.isDirectory(SUITE), "published cases are not on this machine");
        return SUITE;
    }

    /** The lines of other algorithms' manifests, read loosely. */
    private static final class BagLines {

        static boolean isManifest(Path file) {
            return file.getFileName().toString().startsWith("manifest-");
        }

        static List<String> paths(Path manifest) throws IOException {
            return Files.readAllLines(manifest).stream()
                    .filter(l -> !l.isBlank())
                    .map(l -> l.replaceFirst("^\\S+\\s+", ""))
                    .toList();
        }
    }
}
