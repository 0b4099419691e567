package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bundle.BundleFault.Reason;

class HostileBagTest {

    private static final String DIGEST = "a".repeat(64);

    @TempDir
    private Path folder;

    @Test
    void aRightBagOpensAndHasNoMismatch() throws Exception {
        Bag bag = Bag.open(new TestBag().write(folder), Limits.USUAL);
        assertEquals(
                Set.of(
                        "bag-info.txt",
                        "bagit.txt",
                        "data/one.txt",
                        "data/two.txt",
                        "manifest-sha256.txt",
                        "tagmanifest-sha256.txt"),
                bag.sizes().keySet());
        assertEquals(4L, bag.sizes().get("data/one.txt"));
        assertEquals(List.of(), bag.mismatches());
        assertEquals("two\n", new String(bag.read("data/two.txt", 4), StandardCharsets.UTF_8));
    }

    @Test
    void aManifestInAnotherOrderIsTheSameManifest() throws Exception {
        TestBag bag = new TestBag();
        List<String> lines = bag.text("manifest-sha256.txt").lines().toList();
        bag.put("manifest-sha256.txt", lines.get(1) + "\n" + lines.get(0) + "\n");
        assertEquals(
                List.of(),
                Bag.open(bag.tagManifest().write(folder), Limits.USUAL).mismatches());
    }

    /** One fault a row: what is done to a right bag, the reason, the place. */
    static Stream<Arguments> spoiled() {
        return Stream.of(
                Arguments.of("no bagit.txt", bag().remove("bagit.txt"), Reason.NOT_A_BUNDLE, "bagit.txt"),
                Arguments.of("a file to fetch", bag().put("fetch.txt", "x"), Reason.FETCH, "fetch.txt"),
                Arguments.of(
                        "byte-order mark in the declaration",
                        bag().put("bagit.txt", "\uFEFF" + Bag.DECLARATION),
                        Reason.BYTE_ORDER_MARK,
                        "bagit.txt"),
                Arguments.of(
                        "byte-order mark in the manifest",
                        bag().put("manifest-sha256.txt", "\uFEFF" + bag().text("manifest-sha256.txt")),
                        Reason.BYTE_ORDER_MARK,
                        "manifest-sha256.txt"),
                Arguments.of(
                        "carriage returns in the declaration",
                        bag().put("bagit.txt", Bag.DECLARATION.replace("\n", "\r\n")),
                        Reason.LINE_END,
                        "bagit.txt"),
                Arguments.of(
                        "carriage returns in the manifest",
                        bag().put(
                                        "manifest-sha256.txt",
                                        bag().text("manifest-sha256.txt").replace("\n", "\r\n")),
                        Reason.LINE_END,
                        "manifest-sha256.txt"),
                Arguments.of(
                        "no final line feed",
                        bag().put(
                                        "manifest-sha256.txt",
                                        bag().text("manifest-sha256.txt").stripTrailing()),
                        Reason.LINE_END,
                        "manifest-sha256.txt"),
                Arguments.of(
                        "not UTF-8",
                        bag().put("bag-info.txt", new byte[] {'A', ':', ' ', (byte) 0xC0, (byte) 0xAF, '\n'}),
                        Reason.ENCODING,
                        "bag-info.txt"),
                Arguments.of(
                        "another version",
                        bag().put("bagit.txt", Bag.DECLARATION.replace("1.0", "0.97")),
                        Reason.DECLARATION,
                        "bagit.txt"),
                Arguments.of(
                        "a space after the version",
                        bag().put("bagit.txt", Bag.DECLARATION.replace("1.0", "1.0 ")),
                        Reason.DECLARATION,
                        "bagit.txt"),
                Arguments.of(
                        "no manifest", bag().remove("manifest-sha256.txt"), Reason.ALGORITHM, "manifest-sha256.txt"),
                Arguments.of(
                        "a second algorithm", bag().put("manifest-md5.txt", "x"), Reason.ALGORITHM, "manifest-md5.txt"),
                Arguments.of(
                        "no tag manifest",
                        bag().remove("tagmanifest-sha256.txt"),
                        Reason.LAYOUT,
                        "tagmanifest-sha256.txt"),
                Arguments.of(
                        "an unlisted payload file", bag().put("data/new.txt", "x"), Reason.NOT_LISTED, "data/new.txt"),
                Arguments.of("an unlisted tag file", bag().put("notes.txt", "x"), Reason.NOT_LISTED, "notes.txt"),
                Arguments.of(
                        "a tag manifest that leaves out bag-info.txt",
                        bag().put(
                                        "tagmanifest-sha256.txt",
                                        bag().text("tagmanifest-sha256.txt")
                                                .replaceFirst("[0-9a-f]{64}  bag-info.txt\n", "")),
                        Reason.NOT_LISTED,
                        "bag-info.txt"),
                Arguments.of("a missing file", bag().remove("data/two.txt"), Reason.NOT_THERE, "manifest-sha256.txt"),
                Arguments.of("an empty file", bag().put("data/two.txt", ""), Reason.EMPTY_FILE, "data/two.txt"),
                Arguments.of(
                        "an empty manifest",
                        bag().put("manifest-sha256.txt", ""),
                        Reason.EMPTY_FILE,
                        "manifest-sha256.txt"),
                Arguments.of("a hidden file", bag().put("data/.one", "x"), Reason.HIDDEN_FILE, "data/.one"),
                Arguments.of("a name with a per cent sign", bag().put("data/a%41", "x"), Reason.NAME, "data/a%41"),
                Arguments.of("a name with a space", bag().put("data/a b", "x"), Reason.NAME, "data/a b"),
                Arguments.of("a name with a minus first", bag().put("data/-a", "x"), Reason.NAME, "data/-a"),
                Arguments.of("a name with a point last", bag().put("data/a.", "x"), Reason.NAME, "data/a."),
                Arguments.of("a device name", bag().put("data/nul.txt", "x"), Reason.NAME, "data/nul.txt"),
                Arguments.of(
                        "a name too long",
                        bag().put("data/" + "a".repeat(101), "x"),
                        Reason.NAME,
                        "data/" + "a".repeat(101)),
                Arguments.of(
                        "names that differ in case only",
                        bag().put("data/ONE.txt", "x"),
                        Reason.NAME_CLASH,
                        "data/one.txt"),
                Arguments.of("a folder in the payload", bag().put("data/sub/a", "x"), Reason.SPECIAL_FILE, "data/sub"),
                Arguments.of("a folder beside the payload", bag().put("extra/a", "x"), Reason.SPECIAL_FILE, "extra"));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("spoiled")
    void aSpoiledBagIsRefusedForItsReason(String what, TestBag bag, Reason reason, String place) throws IOException {
        refused(reason, place, bag.write(folder));
    }

    /** One line a row that is put in front of a manifest, and the reason. */
    static Stream<Arguments> lines() {
        return Stream.of(
                Arguments.of(DIGEST + " data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + " *data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "\tdata/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "   data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST.toUpperCase(Locale.ROOT) + "  data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST.substring(1) + "  data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of("\\" + DIGEST + "  data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of("", Reason.MANIFEST_LINE),
                Arguments.of("# a remark", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  data/../../one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  ../one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  ./data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  /data/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  data//one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  data/", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  bagit.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  ~/one.txt", Reason.MANIFEST_LINE),
                Arguments.of(DIGEST + "  data/..", Reason.NAME),
                Arguments.of(DIGEST + "  data/a%0Ab", Reason.NAME),
                Arguments.of(DIGEST + "  data/a\\b", Reason.NAME),
                Arguments.of(DIGEST + "  data/C:x", Reason.NAME),
                Arguments.of(DIGEST + "  data/\u0430.txt", Reason.NAME),
                Arguments.of(DIGEST + "  data/one.txt", Reason.LISTED_TWICE),
                Arguments.of(DIGEST + "  data/three.txt", Reason.NOT_THERE));
    }

    @ParameterizedTest(name = "[{index}] {0}")
    @MethodSource("lines")
    void aManifestLineOfAnotherFormIsRefused(String line, Reason reason) throws IOException {
        TestBag bag = bag();
        bag.put("manifest-sha256.txt", line + "\n" + bag.text("manifest-sha256.txt"));
        BundleFault fault = refused(reason, bag.tagManifest().write(folder));
        if (reason != Reason.NOT_THERE) {
            int number = reason == Reason.LISTED_TWICE ? 2 : 1;
            assertEquals("manifest-sha256.txt, line " + number, fault.place());
        }
    }

    @Test
    void aMissingFileIsNamed() throws IOException {
        BundleFault fault =
                refused(Reason.NOT_THERE, bag().remove("data/two.txt").write(folder));
        assertEquals("lists data/two.txt, which is not there", fault.getMessage());
    }

    @Test
    void theTagManifestListsNeitherPayloadNorItself() throws IOException {
        TestBag bag = bag();
        String right = bag.text("tagmanifest-sha256.txt");
        bag.put("tagmanifest-sha256.txt", right + DIGEST + "  data/one.txt\n");
        refused(Reason.MANIFEST_LINE, bag.write(folder));
        bag.put("tagmanifest-sha256.txt", right + DIGEST + "  tagmanifest-sha256.txt\n");
        refused(Reason.MANIFEST_LINE, bag.write(folder));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "Payload-Oxum: 9.2\n",
                "Payload-Oxum: 8.3\n",
                "Payload-Oxum: 8\n",
                "Bagging-Date: 2026-03-01\n",
                "Payload-Oxum: 8.2\nPayload-Oxum: 8.2\n",
                "Payload-Oxum: 8.2\npayload-oxum: 9.2\n",
                "Payload-Oxum: 08.2\n"
            })
    void aWrongOrRepeatedOrMissingOxumIsRefused(String info) throws IOException {
        refused(
                Reason.OXUM,
                "bag-info.txt",
                bag().put("bag-info.txt", info).manifests().write(folder));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "Payload-Oxum : 8.2\n",
                "Payload-Oxum:8.2\n",
                "Payload-Oxum: 8\n .2\n",
                "no label\n",
                "A: \n",
                "\n"
            })
    void metadataOfAnotherFormIsRefused(String info) throws IOException {
        refused(Reason.BAG_INFO, bag().put("bag-info.txt", info).manifests().write(folder));
    }

    @Test
    void aLinkIsRefusedAndNotFollowed() throws IOException {
        Path outside = Files.writeString(folder.resolve("outside.txt"), "two\n");
        Path root = bag().write(folder.resolve("bag"));
        Files.delete(root.resolve("data/two.txt"));
        link(root.resolve("data/two.txt"), outside);
        refused(Reason.SPECIAL_FILE, "data/two.txt", root);
    }

    @Test
    void aLinkedPayloadFolderIsRefused() throws IOException {
        Path root = bag().write(folder.resolve("bag"));
        Path elsewhere = folder.resolve("elsewhere");
        Files.move(root.resolve("data"), elsewhere);
        link(root.resolve("data"), elsewhere);
        refused(Reason.SPECIAL_FILE, "data", root);
    }

    @Test
    void whatIsNoBundleIsNamed() throws IOException {
        BundleFault nothing = refused(Reason.MISSING, folder.resolve("nowhere"));
        assertEquals("there is nothing here", nothing.getMessage());
        Path pdf = Files.writeString(folder.resolve("paper.pdf"), "%PDF-1.7");
        assertEquals(
                "this is not a bundle (it starts like a PDF)",
                refused(Reason.NOT_A_BUNDLE, pdf).getMessage());
        Path empty = Files.createFile(folder.resolve("empty"));
        assertEquals(
                "this is not a bundle (it is an empty file)",
                refused(Reason.NOT_A_BUNDLE, empty).getMessage());
        refused(Reason.NOT_A_BUNDLE, Files.createDirectory(folder.resolve("hollow")));
    }

    @Test
    void limitsHoldBeforeAnythingIsRead() throws IOException {
        Path root = bag().write(folder);
        refused(Reason.LIMIT, root, new Limits(5, 1 << 20, 1 << 20, 1 << 20));
        refused(Reason.LIMIT, root, new Limits(100, 100, 1 << 20, 1 << 20));
        refused(Reason.LIMIT, root, new Limits(100, 1 << 20, 100, 1 << 20));
        TestBag crowded = bag();
        for (int i = 0; i < 300; i++) {
            crowded.put("data/f" + i, "x");
        }
        refused(Reason.LIMIT, crowded.write(folder));
    }

    @Test
    void aChangedFileIsAMismatchAndNoFault() throws Exception {
        Path root = bag().put("data/two.txt", "tow\n").write(folder);
        List<Bag.Mismatch> mismatches = Bag.open(root, Limits.USUAL).mismatches();
        assertEquals(
                List.of(new Bag.Mismatch(
                        "data/two.txt",
                        TestBag.sha256("two\n".getBytes(StandardCharsets.UTF_8)),
                        TestBag.sha256("tow\n".getBytes(StandardCharsets.UTF_8)))),
                mismatches);
    }

    @Test
    void aStaleTagManifestIsAMismatch() throws Exception {
        TestBag bag = bag().put("bag-info.txt", "Bagging-Date: 2026-03-02\nPayload-Oxum: 8.2\n");
        List<Bag.Mismatch> mismatches =
                Bag.open(bag.write(folder), Limits.USUAL).mismatches();
        assertEquals(
                List.of("bag-info.txt"),
                mismatches.stream().map(Bag.Mismatch::path).toList());
    }

    @Test
    void aFileThatChangesAfterItWasHashedIsNotRead() throws Exception {
        Bag bag = Bag.open(bag().write(folder), Limits.USUAL);
        assertEquals(List.of(), bag.mismatches());
        Files.writeString(folder.resolve("data/one.txt"), "eno\n");
        BundleFault fault = assertThrows(BundleFault.class, () -> bag.read("data/one.txt", 100));
        assertEquals(Reason.CHANGED, fault.reason());
    }

    @Test
    void aSmallFileIsReadUpToItsLimit() throws Exception {
        Bag bag = Bag.open(bag().write(folder), Limits.USUAL);
        assertEquals(4, bag.read("data/one.txt", 4).length);
        BundleFault fault = assertThrows(BundleFault.class, () -> bag.read("data/one.txt", 3));
        assertEquals(Reason.LIMIT, fault.reason());
    }

    @Test
    void messagesShowOddNamesByTheirCodePoints() throws IOException {
        Path root = bag().write(folder);
        try {
            Files.writeString(root.resolve("data/\u0430\u001b.txt"), "x");
        } catch (IOException | InvalidPathException e) {
            Assumptions.abort("this file system has no such names: " + e.getMessage());
        }
        BundleFault fault = refused(Reason.NAME, root);
        assertEquals("data/\\u{0430}\\u{001b}.txt", fault.place());
    }

    private static TestBag bag() {
        return new TestBag();
    }

    private static void link(Path from, Path to) throws IOException {
        try {
            Files.createSymbolicLink(from, to);
        } catch (UnsupportedOperationException e) {
            Assumptions.abort("this system has no links");
        }
    }

    private static void refused(Reason reason, String place, Path root) {
        assertEquals(place, refused(reason, root).place());
    }

    private static BundleFault refused(Reason reason, Path root) {
        return refused(reason, root, Limits.USUAL);
    }

    private static BundleFault refused(Reason reason, Path root, Limits limits) {
        BundleFault fault = assertThrows(BundleFault.class, () -> Bag.open(root, limits));
        assertEquals(reason, fault.reason(), fault.place() + ": " + fault.getMessage());
        assertTrue(!fault.getMessage().contains("\n"), fault.getMessage());
        return fault;
    }
}
