package org.notchwork.seed;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import org.apache.commons.codec.digest.DigestUtils;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonObject;

/**
 * Derives the stream of an address from the seed.
 *
 * <p>The 32 bytes SHA-256(prefix ‖ canonical JSON of the address and the seed) key a Philox4x64-10 generator: bytes
 * 0 to 15 are the two key words, bytes 16 to 31 the two high words of the counter, all big-endian; the two low words
 * count the blocks of four words, the first of which is block 1. Different addresses thus get different keys or disjoint counters, unless SHA-256 collides.
 */
public final class SeedTree {

    /** Stands in front of every hashed address, so that no other use of SHA-256 gives the same key. */
    static final String PREFIX = "notchwork stream 1\n";

    private final Seed seed;

    /** Creates the tree of a seed. */
    public SeedTree(Seed seed) {
        this.seed = seed;
    }

    /** Returns a new stream at its beginning. */
    public RandomStream stream(Address address) {
        ByteBuffer key = ByteBuffer.wrap(key(address));
        long key0 = key.getLong();
        long key1 = key.getLong();
        long counter2 = key.getLong();
        long counter3 = key.getLong();
        return new RandomStream(new long[] {key0, key1, 0, 0, counter2, counter3});
    }

    /** Returns the 32 bytes that key the stream of an address. */
    byte[] key(Address address) {
        JsonObject hashed = JsonObject.builder()
                .put("address", address.json())
                .put("seed", seed.text())
                .build();
        MessageDigest digest = DigestUtils.getSha256Digest();
        digest.update(PREFIX.getBytes(StandardCharsets.US_ASCII));
        return digest.digest(CanonicalJson.bytes(hashed));
    }
}
