package org.notchwork.support;

import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/** The chance that tests use: always the same, a stream of its own for every name and number. */
public final class Streams {

    private static final SeedTree TREE = new SeedTree(new Seed("the fixed seed of all tests"));

    private Streams() {}

    /** Returns the stream of a name at its beginning. */
    public static RandomStream named(String name) {
        return numbered(name, 0);
    }

    /** Returns the stream of a name and number at its beginning. */
    public static RandomStream numbered(String name, long number) {
        return TREE.stream(new Address("test", 1, number, name));
    }

    /** Returns the tree that all streams of tests come from. */
    public static SeedTree tree() {
        return TREE;
    }
}
