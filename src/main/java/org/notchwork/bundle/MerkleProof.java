package org.notchwork.bundle;

import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The proof that an entry belongs to a tree: its inclusion path (RFC 9162, section 2.1.3).
 *
 * <p>With it one trial can be shown to stand under the seal without the other lines.
 */
public final class MerkleProof {

    private static final int HASH = 32;

    private MerkleProof() {}

    /**
     * Returns the inclusion path of a leaf, from the leaf's sibling up to the root's children.
     *
     * @param leaves the leaf hashes of the whole tree, 32 bytes each
     * @param index which leaf, from 0
     */
    public static List<byte[]> path(List<byte[]> leaves, int index) {
        if (index < 0 || index >= leaves.size()) {
            throw new IllegalArgumentException("leaf " + index + " of " + leaves.size());
        }
        if (leaves.size() == 1) {
            return new ArrayList<>();
        }
        int split = Integer.highestOneBit(leaves.size() - 1);
        List<byte[]> left = leaves.subList(0, split);
        List<byte[]> right = leaves.subList(split, leaves.size());
        List<byte[]> path = index < split ? path(left, index) : path(right, index - split);
        path.add(root(index < split ? right : left));
        return path;
    }

    /**
     * Returns whether a path proves that a leaf stands at a place of a tree (RFC 9162, section 2.1.3.2).
     *
     * @param leaf the leaf hash
     * @param index its place, from 0
     * @param size the number of leaves of the tree
     * @param path the inclusion path
     * @param root the tree head
     */
    public static boolean proves(byte[] leaf, long index, long size, List<byte[]> path, byte[] root) {
        if (index < 0 || index >= size || leaf.length != HASH || root.length != HASH) {
            return false;
        }
        long node = index;
        long last = size - 1;
        byte[] hash = leaf;
        for (byte[] sibling : path) {
            if (last == 0 || sibling.length != HASH) {
                return false;
            }
            if ((node & 1) == 1 || node == last) {
                hash = node(sibling, hash);
                while ((node & 1) == 0 && node != 0) {
                    node >>>= 1;
                    last >>>= 1;
                }
            } else {
                hash = node(hash, sibling);
            }
            node >>>= 1;
            last >>>= 1;
        }
        return last == 0 && Arrays.equals(hash, root);
    }

    private static byte[] root(List<byte[]> leaves) {
        MerkleTree tree = new MerkleTree();
        leaves.forEach(tree::addLeaf);
        return tree.root();
    }

    /** Returns the hash of a node over two others. */
    static byte[] node(byte[] left, byte[] right) {
        MessageDigest digest = Digests.sha256();
        digest.update((byte) 1);
        digest.update(left);
        return digest.digest(right);
    }
}
