package org.notchwork.seed;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.codec.digest.DigestUtils;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The example messages that NIST publishes for SHA-256 of FIPS 180-4. */
class Sha256KnownAnswersTest {

    @ParameterizedTest
    @CsvSource({
        "'', e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
        "abc, ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad",
        "abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq,"
                + " 248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1"
    })
    void shortMessagesHaveTheirPublishedDigests(String message, String digest) {
        assertEquals(digest, DigestUtils.sha256Hex(message));
    }

    @Test
    void aMillionTimesTheLetterAHasItsPublishedDigest() {
        assertEquals(
                "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0",
                DigestUtils.sha256Hex("a".repeat(1_000_000)));
    }
}
