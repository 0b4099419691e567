package org.notchwork.bundle;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.regex.Pattern;
import org.apache.commons.codec.binary.Hex;
import org.apache.commons.codec.digest.DigestUtils;

/** SHA-256 (NIST FIPS 180-4) and its written form, 64 lower-case hexadecimal digits. */
public final class Digests {

    /** What a written digest looks like. */
    public static final Pattern FORM = Pattern.compile("[0-9a-f]{64}");

    private Digests() {}

    /** Returns a new digest. */
    public static MessageDigest sha256() {
        return DigestUtils.getSha256Digest();
    }

    /** Returns the digest of bytes, written. */
    public static String hex(byte[] bytes) {
        return Hex.encodeHexString(sha256().digest(bytes));
    }

    /** Returns the digest of a text in UTF-8, written. */
    public static String hex(String text) {
        return hex(text.getBytes(StandardCharsets.UTF_8));
    }

    /** Returns bytes as hexadecimal digits. */
    public static String text(byte[] digest) {
        return Hex.encodeHexString(digest);
    }

    /** Returns the bytes of a digest in the form that {@link #text} writes. */
    public static byte[] bytes(String digits) {
        return HexFormat.of().parseHex(digits);
    }
}
