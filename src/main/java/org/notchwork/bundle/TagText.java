package org.notchwork.bundle;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * The lines of a tag file of a bag: UTF-8 without a byte-order mark, every line ended by one line feed.
 *
 * <p>RFC 8493, section 2, allows other line ends; two readers that split lines differently would see two different
 * manifests, so one form is taken and no other.
 */
final class TagText {

    private static final char MARK = '\uFEFF';

    private TagText() {}

    /** Returns the lines without their line feeds. */
    static List<String> lines(String file, byte[] bytes) throws BundleFault {
        String text = decoded(file, bytes);
        if (!text.isEmpty() && text.charAt(0) == MARK) {
            throw new BundleFault(
                    BundleFault.Reason.BYTE_ORDER_MARK, file, "begins with a byte-order mark; save it without one");
        }
        if (text.indexOf('\r') >= 0) {
            throw new BundleFault(
                    BundleFault.Reason.LINE_END, file, "a carriage return; lines end with a line feed alone");
        }
        if (!text.endsWith("\n")) {
            throw new BundleFault(
                    BundleFault.Reason.LINE_END, file, "the last line has no line feed; every line ends with one");
        }
        return List.of(text.substring(0, text.length() - 1).split("\n", -1));
    }

    private static String decoded(String file, byte[] bytes) throws BundleFault {
        try {
            // A new decoder reports what is malformed, where String's constructor would replace it.
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            throw new BundleFault(BundleFault.Reason.ENCODING, file, "not UTF-8; tag files of a bundle are");
        }
    }
}
