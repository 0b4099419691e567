package org.notchwork.bundle;

import java.security.MessageDigest;

/**
 * The tree hash of RFC 9162, section 2.1.1, over a sequence of entries that is seen once.
 *
 * <p>A leaf is SHA-256(0x00 ‖ entry), a node SHA-256(0x01 ‖ left ‖ right). A full subtree of 2^i leaves is held at
 * level i exactly if bit i of the size is set, so one hash a level is enough. Not for use by several threads.
 */
public final class MerkleTree {

    private final byte[][] full = new byte[Long.SIZE][];
    private final MessageDigest digest = Digests.sha256();
    private long size;

    /** Adds an entry. */
    public void add(byte[] entry) {
        digest.update((byte) 0);
        addLeaf(digest.digest(entry));
    }

    /** Adds an entry whose leaf hash is known: 32 bytes. */
    public void addLeaf(byte[] leafHash) {
        byte[] subtree = leafHash;
        int level = 0;
        while ((size >>> level & 1) != 0) {
            subtree = node(full[level], subtree);
            level++;
        }
        full[level] = subtree;
        size++;
    }

    /** Returns how many entries were added. */
    public long size() {
        return size;
    }

    /** Returns the tree head of the entries so far: 32 bytes; of no entries, the hash of nothing. */
    public byte[] root() {
        if (size == 0) {
            return digest.digest();
        }
        int level = Long.numberOfTrailingZeros(size);
        byte[] root = full[level];
        for (level++; level < Long.SIZE; level++) {
            if ((size >>> level & 1) != 0) {
                root = node(full[level], root);
            }
        }
        return root.clone();
    }

    /** Returns the hash of a leaf. */
    public static byte[] leaf(byte[] entry) {
        MessageDigest leaf = Digests.sha256();
        leaf.update((byte) 0);
        return leaf.digest(entry);
    }

    private byte[] node(byte[] left, byte[] right) {
        digest.update((byte) 1);
        digest.update(left);
        return digest.digest(right);
    }
}
