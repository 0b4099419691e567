package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bundle.BundleFault.Reason;

/** The container: each fault of a bag has its own reason, and nothing unsafe is ever opened. */
class BagTest {

    private static final Path PUBLISHED = Path.of("..", "shared", "vectors", "bagit");

    @TempDir
    Path home;

    private Path bag;

    @BeforeEach
    void makeABag() throws IOException {
        bag = home.resolve("bag");
        Files.createDirectories(bag.resolve("data"));
        write("data/one.txt", "one\n");
        write("data/two.txt", "two\n");
        write("bagit.txt", Bag.DECLARATION);
        finish();
    }

    @Test
    void aRightBagIsOpenedAndHasTheListedDigests() throws Exception {
        Bag opened = Bag.open(bag, Limits.USUAL);
        assertEquals(6, opened.sizes().size());
        assertEquals(List.of(), opened.mismatches());
    }

    @Test
    void aChangedByteIsAMismatchAndNotAFault() throws Exception {
        write("data/one.txt", "onf\n");
        List<Bag.Mismatch> mismatches = Bag.open(bag, Limits.USUAL).mismatches();
        assertEquals(1, mismatches.size());
        assertEquals("data/one.txt", mismatches.get(0).path());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "bagit.txt | BagIt-Version : 1.0~Tag-File-Character-Encoding: UTF-8~ | DECLARATION",
                "bagit.txt | BagIt-Version: 0.97~Tag-File-Character-Encoding: UTF-8~ | DECLARATION",
                "bagit.txt | BagIt-Version: 1.0~Tag-File-Character-Encoding: UTF-8   | DECLARATION",
                "fetch.txt | http://example.invalid/x 3 data/x~ | FETCH",
                "manifest-md5.txt | d41d8cd98f00b204e9800998ecf8427e  data/one.txt~ | ALGORITHM",
                "extra.txt | x | NOT_LISTED",
                "data/three.txt | x | NOT_LISTED",
                "bag-info.txt | Payload-Oxum: 9.2~ | OXUM",
                "bag-info.txt | Payload-Oxum: 8.2~Payload-Oxum: 8.2~ | OXUM",
                "bag-info.txt | Contact-Name: nobody~ | OXUM",
                "data/CON.txt | x | NAME",
                "data/p%41.txt | x | NAME",
                "data/a b.txt | x | NAME",
                "data/.hidden | x | NAME",
                "data/ONE.txt | x | NAME_CLASH",
            })
    void eachFaultHasItsReason(String file, String content, Reason reason) throws IOException {
        write(file, content.replace('~', '\n'));
        assertEquals(reason, fault().reason());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "ABCDEF",
                "%s data/one.txt",
                "%s  ../one.txt",
                "%s  /data/one.txt",
                "%s  data/../data/one.txt",
                "%s  data//one.txt",
                "%s  data\\one.txt",
                "%s  ~/one.txt",
                "%s  one.txt",
                "%s  data/%%6fne.txt",
                "\uFEFF%s  data/one.txt",
                "%s  data/one.txt\r",
                "%s *data/one.txt"
            })
    void aManifestLineOfAnotherFormIsRefused(String line) throws IOException {
        String digest = Digests.hex("one\n");
        write(
                "manifest-sha256.txt",
                line.replace("%s", digest).replace("%%", "%") + "\n" + Digests.hex("two\n") + "  data/two.txt\n");
        Reason reason = fault().reason();
        assertTrue(reason == Reason.MANIFEST_LINE || reason == Reason.NAME, reason.toString());
    }

    @Test
    void upperCaseDigestsAndAMissingLineFeedAreRefused() throws IOException {
        String manifest = Files.readString(bag.resolve("manifest-sha256.txt"));
        write("manifest-sha256.txt", manifest.toUpperCase(Locale.ROOT));
        assertEquals(Reason.MANIFEST_LINE, fault().reason());
        write("manifest-sha256.txt", manifest.stripTrailing());
        assertEquals(Reason.MANIFEST_LINE, fault().reason());
    }

    @Test
    void aFileListedTwiceIsRefusedEvenWithTheSameDigest() throws IOException {
        String manifest = Files.readString(bag.resolve("manifest-sha256.txt"));
        write("manifest-sha256.txt", manifest + manifest);
        assertEquals(Reason.LISTED_TWICE, fault().reason());
    }

    @Test
    void aMissingFileIsNamedWithItsManifest() throws IOException {
        Files.delete(bag.resolve("data/two.txt"));
        BundleFault fault = fault();
        assertEquals(Reason.NOT_THERE, fault.reason());
        assertTrue(fault.getMessage().contains("data/two.txt"));
    }

    @Test
    void anEmptyFileIsRefused() throws IOException {
        write("data/one.txt", "");
        assertEquals(Reason.EMPTY_FILE, fault().reason());
    }

    @ParameterizedTest
    @ValueSource(strings = {"data/one.txt", "bag-info.txt"})
    void aLinkIsRefusedAndNotFollowed(String file) throws IOException {
        Path outside = home.resolve("outside.txt");
        Files.writeString(outside, "one\n");
        Files.delete(bag.resolve(file));
        Files.createSymbolicLink(bag.resolve(file), outside);
        assertEquals(Reason.SPECIAL_FILE, fault().reason());
    }

    @Test
    void aFolderInsideThePayloadIsRefused() throws IOException {
        Files.createDirectory(bag.resolve("data/folder"));
        assertEquals(Reason.SPECIAL_FILE, fault().reason());
    }

    @Test
    void sizesAndNumbersAreBounded() {
        assertEquals(Reason.LIMIT, fault(new Limits(5, 1 << 20, 1 << 20, 100)).reason());
        assertEquals(Reason.LIMIT, fault(new Limits(100, 3, 1 << 20, 100)).reason());
        assertEquals(Reason.LIMIT, fault(new Limits(100, 1 << 20, 50, 100)).reason());
    }

    @Test
    void whatIsNoBundleIsCalledSo() throws IOException {
        Path pdf = home.resolve("paper.pdf");
        Files.writeString(pdf, "%PDF-1.7\n");
        BundleFault fault = assertThrows(BundleFault.class, () -> Bag.open(pdf, Limits.USUAL));
        assertEquals(Reason.NOT_A_BUNDLE, fault.reason());
        assertTrue(fault.getMessage().contains("starts like a PDF"));
        Path empty = Files.createDirectory(home.resolve("empty"));
        assertEquals(
                Reason.NOT_A_BUNDLE,
                assertThrows(BundleFault.class, () -> Bag.open(empty, Limits.USUAL))
                        .reason());
        assertEquals(
                Reason.MISSING,
                assertThrows(BundleFault.class, () -> Bag.open(home.resolve("nothing"), Limits.USUAL))
                        .reason());
    }

    /** LibraryOfCongress bagit-conformance-suite: every bag that is not valid is refused. */
    static Stream<Path> publishedInvalidBags() throws IOException {
        return published("v1.0/invalid", "v0.97/invalid", "v0.97/linux-only", "v0.97/windows-only");
    }

    @ParameterizedTest
    @MethodSource("publishedInvalidBags")
    void everyPublishedInvalidBagIsRefused(Path published) {
        assumeTrue(Files.isDirectory(published), "the published bags are not beside this project");
        assertThrows(BundleFault.class, () -> Bag.open(published, Limits.USUAL));
    }

    /**
     * The published valid bags are refused as well, each for a stated rule that is stricter here: other algorithms,
     * older versions, other names or folders. None is refused for a reason that would make it invalid by the standard.
     */
    static Stream<Path> publishedValidBags() throws IOException {
        return published("v1.0/valid", "v0.97/valid");
    }

    @ParameterizedTest
    @MethodSource("publishedValidBags")
    void aPublishedValidBagIsRefusedForAStricterRuleOnly(Path published) {
        assumeTrue(Files.isDirectory(published), "the published bags are not beside this project");
        BundleFault fault = assertThrows(BundleFault.class, () -> Bag.open(published, Limits.USUAL));
        assertTrue(
                List.of(
                                Reason.ALGORITHM,
                                Reason.DECLARATION,
                                Reason.NAME,
                                Reason.SPECIAL_FILE,
                                Reason.FETCH,
                                Reason.NOT_LISTED,
                                Reason.LAYOUT,
                                Reason.EMPTY_FILE)
                        .contains(fault.reason()),
                fault.place() + ": " + fault.reason());
    }

    /** The payload of the published valid bag, with tag files in this project's strict form, is opened. */
    @Test
    void thePublishedPayloadIsReadInTheStrictForm() throws Exception {
        Path published = PUBLISHED.resolve("v1.0/valid/basicBag/data");
        assumeTrue(Files.isDirectory(published), "the published bags are not beside this project");
        Files.delete(bag.resolve("data/one.txt"));
        Files.delete(bag.resolve("data/two.txt"));
        try (Stream<Path> files = Files.list(published)) {
            for (Path file : files.sorted().toList()) {
                Files.copy(
                        file,
                        bag.resolve("data")
                                .resolve(file.getFileName().toString().replace(' ', '_')));
            }
        }
        finish();
        assertFalse(Bag.open(bag, Limits.USUAL).sizes().isEmpty());
        assertEquals(List.of(), Bag.open(bag, Limits.USUAL).mismatches());
    }

    private static Stream<Path> published(String... groups) throws IOException {
        if (!Files.isDirectory(PUBLISHED)) {
            return Stream.of(PUBLISHED.resolve("absent"));
        }
        Stream<Path> all = Stream.empty();
        for (String group : groups) {
            try (Stream<Path> bags = Files.list(PUBLISHED.resolve(group))) {
                all = Stream.concat(all, bags.sorted().toList().stream());
            }
        }
        return all;
    }

    private void write(String path, String content) throws IOException {
        Files.writeString(bag.resolve(path), content, StandardCharsets.UTF_8);
    }

    private void finish() throws IOException {
        StringBuilder payload = new StringBuilder();
        long bytes = 0;
        List<Path> files;
        try (Stream<Path> list = Files.list(bag.resolve("data"))) {
            files = list.sorted().toList();
        }
        for (Path file : files) {
            bytes += Files.size(file);
            payload.append(Digests.hex(Files.readAllBytes(file)))
                    .append("  data/")
                    .append(file.getFileName())
                    .append('\n');
        }
        write("manifest-sha256.txt", payload.toString());
        write("bag-info.txt", "Payload-Oxum: " + bytes + "." + files.size() + "\n");
        StringBuilder tags = new StringBuilder();
        for (String name : List.of("bag-info.txt", "bagit.txt", "manifest-sha256.txt")) {
            tags.append(Digests.hex(Files.readAllBytes(bag.resolve(name))))
                    .append("  ")
                    .append(name)
                    .append('\n');
        }
        write("tagmanifest-sha256.txt", tags.toString());
    }

    private BundleFault fault() {
        return fault(Limits.USUAL);
    }

    private BundleFault fault(Limits limits) {
        return assertThrows(BundleFault.class, () -> Bag.open(bag, limits));
    }
}
