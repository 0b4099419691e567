package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.security.MessageDigest;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.codec.DecoderException;
import org.apache.commons.codec.binary.Hex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class MerkleTreeTest {

    /** The eight test leaves and the tree heads of the public implementation transparency-dev/merkle. */
    private static final List<String> LEAVES =
            List.of("", "00", "10", "2021", "3031", "40414243", "5051525354555657", "606162636465666768696a6b6c6d6e6f");

    static Stream<Arguments> heads() {
        return Stream.of(
                Arguments.of(0, "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855"),
                Arguments.of(1, "6e340b9cffb37a989ca544e6bb780a2c78901d3fb33738768511a30617afa01d"),
                Arguments.of(2, "fac54203e7cc696cf0dfcb42c92a1d9dbaf70ad9e621f4bd8d98662f00e3c125"),
                Arguments.of(3, "aeb6bcfe274b70a14fb067a5e5578264db0fa9b51af5e0ba159158f329e06e77"),
                Arguments.of(4, "d37ee418976dd95753c1c73862b9398fa2a2cf9b4ff0fdfe8b30cd95209614b7"),
                Arguments.of(5, "4e3bbb1f7b478dcfe71fb631631519a3bca12c9aefca1612bfce4c13a86264d4"),
                Arguments.of(6, "76e67dadbcdf1e10e1b74ddc608abd2f98dfb16fbce75277b5232a127f2087ef"),
                Arguments.of(7, "ddb89be403809e325750d3d263cd78929c2942b7942a34b77e122c9594a74c8c"),
                Arguments.of(8, "5dc9da79a70659a9ad559cb701ded9a2ab9d823aad2f4960cfe370eff4604328"));
    }

    @ParameterizedTest
    @MethodSource("heads")
    void headsAreThePublishedOnes(int size, String head) throws DecoderException {
        MerkleTree tree = new MerkleTree();
        for (String leaf : LEAVES.subList(0, size)) {
            tree.add(Hex.decodeHex(leaf));
        }
        assertEquals(head, Digests.text(tree.root()));
        assertEquals(size, tree.size());
    }

    /** The recursive definition of RFC 9162, section 2.1.1, to the letter. */
    @Test
    void theStreamingTreeIsTheRecursiveOne() {
        byte[][] entries = new byte[70][];
        MerkleTree tree = new MerkleTree();
        for (int i = 0; i < entries.length; i++) {
            entries[i] = new byte[] {(byte) i, (byte) (3 * i)};
            tree.add(entries[i]);
            assertArrayEquals(naive(Arrays.copyOf(entries, i + 1)), tree.root(), "size " + (i + 1));
        }
    }

    private static byte[] naive(byte[][] entries) {
        if (entries.length == 1) {
            return hash(0, entries[0], new byte[0]);
        }
        int split = Integer.highestOneBit(entries.length - 1);
        return hash(
                1,
                naive(Arrays.copyOfRange(entries, 0, split)),
                naive(Arrays.copyOfRange(entries, split, entries.length)));
    }

    private static byte[] hash(int prefix, byte[] a, byte[] b) {
        MessageDigest digest = Digests.sha256();
        digest.update((byte) prefix);
        digest.update(a);
        return digest.digest(b);
    }
}
