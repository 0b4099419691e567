package org.notchwork.bundle;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/**
 * Gathers the inclusion path of one leaf (RFC 9162, section 2.1.3) while all leaves pass, in memory that grows with the
 * logarithm of their number.
 */
public final class MerklePath {

    /** A perfect subtree of leaves that have passed, or at the end any subtree. */
    private static final class Subtree {

        private final long size;
        private final byte[] hash;
        private final boolean holdsLeaf;

        Subtree(long size, byte[] hash, boolean holdsLeaf) {
            this.size = size;
            this.hash = hash;
            this.holdsLeaf = holdsLeaf;
        }
    }

    private final long index;
    private final Deque<Subtree> open = new ArrayDeque<>();
    private final List<byte[]> path = new ArrayList<>();
    private long size;

    /** Begins; the path wanted is that of leaf {@code index}, from 0. */
    public MerklePath(long index) {
        this.index = index;
    }

    /** Adds the next leaf hash. */
    public void add(byte[] leaf) {
        open.push(new Subtree(1, leaf.clone(), size == index));
        size++;
        while (open.size() > 1 && sameSize()) {
            join();
        }
    }

    private boolean sameSize() {
        Subtree right = open.pop();
        boolean same = open.peek().size == right.size;
        open.push(right);
        return same;
    }

    private void join() {
        Subtree right = open.pop();
        Subtree left = open.pop();
        if (left.holdsLeaf) {
            path.add(right.hash);
        } else if (right.holdsLeaf) {
            path.add(left.hash);
        }
        open.push(new Subtree(
                left.size + right.size, MerkleProof.node(left.hash, right.hash), left.holdsLeaf || right.holdsLeaf));
    }

    /** Returns how many leaves were added. */
    public long size() {
        return size;
    }

    /**
     * Returns the path, once all leaves were added; nothing may be added after that.
     *
     * @throws IllegalStateException if the leaf has not passed
     */
    public List<byte[]> path() {
        if (index >= size) {
            throw new IllegalStateException("leaf " + index + " of " + size);
        }
        while (open.size() > 1) {
            join();
        }
        return List.copyOf(path);
    }
}
