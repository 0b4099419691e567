package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.codec.binary.Hex;
import org.apache.commons.codec.digest.DigestUtils;
import org.apache.commons.rng.core.source64.Philox4x64;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The generator and the hash below the seed tree against their authors' own outputs. */
class PhiloxTest {

    /**
     * Known answers of Philox4x64-10 by its authors (J. K. Salmon and others, Random123, file kat_vectors). The
     * library increments the counter before each block, so it is started one below.
     */
    @ParameterizedTest
    @CsvSource({
        "0000000000000000 0000000000000000, 0000000000000000 0000000000000000 0000000000000000 0000000000000000,"
                + " 16554d9eca36314c db20fe9d672d0fdc d7e772cee186176b 7e68b68aec7ba23b",
        "ffffffffffffffff ffffffffffffffff, ffffffffffffffff ffffffffffffffff ffffffffffffffff ffffffffffffffff,"
                + " 87b092c3013fe90b 438c3c67be8d0224 9cc7d7c69cd777b6 a09caebf594f0ba0",
        "452821e638d01377 be5466cf34e90c6c, 243f6a8885a308d3 13198a2e03707344 a4093822299f31d0 082efa98ec4e6c89,"
                + " a528f45403e61d95 38c72dbd566e9788 a5a1610e72fd18b5 57bd43b5e52b7fe6"
    })
    void philoxGivesTheKnownAnswers(String key, String counter, String words) {
        long[] k = longs(key);
        long[] c = longs(counter);
        boolean borrow = true;
        for (int i = 0; i < c.length && borrow; i++) {
            borrow = c[i] == 0;
            c[i]--;
        }
        Philox4x64 source = new Philox4x64(new long[] {k[0], k[1], c[0], c[1], c[2], c[3]});
        for (long word : longs(words)) {
            assertEquals(Long.toHexString(word), Long.toHexString(source.next()));
        }
    }

    /** NIST FIPS 180-4, the published example messages of SHA-256. */
    @ParameterizedTest
    @CsvSource({
        "'', 1, e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
        "abc, 1, ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad",
        "abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq, 1,"
                + " 248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1",
        "a, 1000000, cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0"
    })
    void sha256GivesThePublishedDigests(String message, int times, String digest) {
        assertEquals(digest, Hex.encodeHexString(DigestUtils.sha256(message.repeat(times))));
    }

    private static long[] longs(String hex) {
        String[] words = hex.strip().split(" ", -1);
        long[] longs = new long[words.length];
        for (int i = 0; i < words.length; i++) {
            longs[i] = Long.parseUnsignedLong(words[i], 16);
        }
        return longs;
    }
}
