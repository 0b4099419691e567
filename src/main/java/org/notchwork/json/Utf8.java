package org.notchwork.json;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/** Decodes UTF-8 and reports the first byte that is not, where the platform's own decoder would replace it. */
final class Utf8 {

    private Utf8() {}

    /**
     * Returns the text.
     *
     * @throws JsonFault at the first malformed byte, or if the text begins with a byte-order mark
     */
    static String decode(byte[] bytes) throws JsonFault {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length);
        CoderResult result = decoder.decode(in, out, true);
        if (result.isError()) {
            throw new JsonFault("byte " + in.position(), "not UTF-8", "save the file as UTF-8");
        }
        decoder.flush(out);
        out.flip();
        if (out.length() > 0 && out.charAt(0) == '\uFEFF') {
            throw new JsonFault("byte 0", "a byte-order mark", "save the file as UTF-8 without one");
        }
        return out.toString();
    }
}
