package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.Base64;
import java.util.HexFormat;
import java.util.List;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;

class MerkleProofTest {

    private static final Path VECTORS = Path.of("../shared/vectors/merkle");

    /** The eight inputs of the test data of the transparency-dev/merkle repository (Apache-2.0). */
    private static final List<String> INPUTS =
            List.of("", "00", "10", "2021", "3031", "40414243", "5051525354555657", "606162636465666768696a6b6c6d6e6f");

    /** The tree heads of the first 0 to 8 of them, from the same data. */
    private static final List<String> ROOTS = List.of(
            "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
            "6e340b9cffb37a989ca544e6bb780a2c78901d3fb33738768511a30617afa01d",
            "fac54203e7cc696cf0dfcb42c92a1d9dbaf70ad9e621f4bd8d98662f00e3c125",
            "aeb6bcfe274b70a14fb067a5e5578264db0fa9b51af5e0ba159158f329e06e77",
            "d37ee418976dd95753c1c73862b9398fa2a2cf9b4ff0fdfe8b30cd95209614b7",
            "4e3bbb1f7b478dcfe71fb631631519a3bca12c9aefca1612bfce4c13a86264d4",
            "76e67dadbcdf1e10e1b74ddc608abd2f98dfb16fbce75277b5232a127f2087ef",
            "ddb89be403809e325750d3d263cd78929c2942b7942a34b77e122c9594a74c8c",
            "5dc9da79a70659a9ad559cb701ded9a2ab9d823aad2f4960cfe370eff4604328");

    @Test
    void publishedTreesHaveTheirHeads() {
        MerkleTree tree = new MerkleTree();
        assertEquals(ROOTS.get(0), hex(tree.root()));
        for (int size = 1; size <= INPUTS.size(); size++) {
            tree.add(HexFormat.of().parseHex(INPUTS.get(size - 1)));
            assertEquals(size, tree.size());
            assertEquals(ROOTS.get(size), hex(tree.root()), "size " + size);
        }
    }

    @Test
    void theFileOfPublishedHeadsSaysTheSame() throws IOException {
        Path file = VECTORS.resolve("roots.json");
        Assumptions.assumeTrue(Files.isRegularFile(file), "published vectors are not on this machine");
        JsonNode roots = new ObjectMapper().readTree(Files.readString(file));
        for (int size = 0; size < ROOTS.size(); size++) {
            assertEquals(ROOTS.get(size), roots.get("rootHexBySize").get(size).asString());
        }
    }

    @Test
    void theStackOfSubtreesAgreesWithTheDefinition() {
        List<byte[]> entries = new ArrayList<>();
        MerkleTree tree = new MerkleTree();
        for (int size = 1; size <= 70; size++) {
            byte[] entry = ("entry " + size).getBytes(StandardCharsets.US_ASCII);
            entries.add(entry);
            tree.add(entry);
            assertArrayEquals(definition(entries), tree.root(), "size " + size);
        }
    }

    @Test
    void askingForTheHeadChangesNothing() {
        MerkleTree tree = new MerkleTree();
        for (String input : INPUTS.subList(0, 5)) {
            tree.add(HexFormat.of().parseHex(input));
            tree.root()[0] ^= 1;
        }
        assertEquals(ROOTS.get(5), hex(tree.root()));
    }

    @Test
    void everyPathProvesItsLeafAndNoOther() {
        List<byte[]> leaves = new ArrayList<>();
        MerkleTree tree = new MerkleTree();
        for (int size = 1; size <= 20; size++) {
            byte[] leaf = MerkleTree.leaf(("entry " + size).getBytes(StandardCharsets.US_ASCII));
            leaves.add(leaf);
            tree.addLeaf(leaf);
            for (int index = 0; index < size; index++) {
                List<byte[]> path = MerkleProof.path(leaves, index);
                for (int other = 0; other < size; other++) {
                    boolean proved = MerkleProof.proves(leaves.get(other), index, size, path, tree.root());
                    assertEquals(other == index, proved, "leaf " + other + " at " + index + " of " + size);
                }
                assertFalse(MerkleProof.proves(leaves.get(index), size, size, path, tree.root()));
                assertFalse(MerkleProof.proves(leaves.get(index), -1, size, path, tree.root()));
            }
        }
    }

    /** transparency-dev/merkle, 98 cases with the verdict that they should get. */
    @Test
    void publishedInclusionCasesGetTheirVerdicts() throws IOException {
        Path file = VECTORS.resolve("inclusion.jsonl");
        Assumptions.assumeTrue(Files.isRegularFile(file), "published vectors are not on this machine");
        int cases = 0;
        for (String line : Files.readAllLines(file)) {
            JsonNode one = new ObjectMapper().readTree(line);
            // Indexes beyond 2^63 − 1 come out negative, which is refused like any index outside the tree.
            long index = one.get("leafIdx").bigIntegerValue().longValue();
            long size = one.get("treeSize").bigIntegerValue().longValue();
            List<byte[]> path = new ArrayList<>();
            if (one.get("proof").isArray()) {
                one.get("proof").forEach(hash -> path.add(bytes(hash)));
            }
            boolean proved = MerkleProof.proves(bytes(one.get("leafHash")), index, size, path, bytes(one.get("root")));
            assertEquals(
                    one.get("wantErr").asBoolean(), !proved, one.get("case").asString());
            cases++;
        }
        assertEquals(98, cases);
    }

    @Test
    void oneTreeOfOneEntryIsItsLeaf() {
        MerkleTree tree = new MerkleTree();
        tree.add(new byte[0]);
        assertTrue(MerkleProof.proves(MerkleTree.leaf(new byte[0]), 0, 1, List.of(), tree.root()));
    }

    /** RFC 9162, section 2.1.1, as it is written: split at the largest power of two below the size. */
    private static byte[] definition(List<byte[]> entries) {
        if (entries.size() == 1) {
            return sha256(new byte[] {0}, entries.get(0), new byte[0]);
        }
        int split = 1;
        while (2 * split < entries.size()) {
            split *= 2;
        }
        return sha256(
                new byte[] {1},
                definition(entries.subList(0, split)),
                definition(entries.subList(split, entries.size())));
    }

    private static byte[] sha256(byte[] prefix, byte[] left, byte[] right) {
        MessageDigest digest = Digests.sha256();
        digest.update(prefix);
        digest.update(left);
        return digest.digest(right);
    }

    private static byte[] bytes(JsonNode base64) {
        return base64.isNull() ? new byte[0] : Base64.getDecoder().decode(base64.asString());
    }

    private static String hex(byte[] hash) {
        return HexFormat.of().formatHex(hash);
    }
}
