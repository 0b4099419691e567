package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.bundle.BundleFault.Reason;

class LineReaderTest {

    @Test
    void linesComeWithoutTheirLineFeedsAndCounted() throws Exception {
        try (LineReader lines = reader("a\n\nbc\n", 10)) {
            assertEquals("a", text(lines.next()));
            assertEquals(1, lines.number());
            assertEquals("", text(lines.next()));
            assertEquals("bc", text(lines.next()));
            assertEquals(3, lines.number());
            assertTrue(lines.next().isEmpty());
            assertTrue(lines.next().isEmpty());
        }
    }

    @Test
    void aCarriageReturnBelongsToTheLine() throws Exception {
        try (LineReader lines = reader("a\r\n", 10)) {
            assertEquals("a\r", text(lines.next()));
        }
    }

    @Test
    void aLastLineWithoutLineFeedIsRefused() throws Exception {
        try (LineReader lines = reader("a\nb", 10)) {
            lines.next();
            BundleFault fault = assertThrows(BundleFault.class, lines::next);
            assertEquals(Reason.LINE_END, fault.reason());
            assertEquals("f, line 2", fault.place());
        }
    }

    @Test
    void aLineOfTheLimitPassesAndOneMoreByteDoesNot() throws Exception {
        try (LineReader lines = reader("abc\nabcd\n", 3)) {
            assertEquals("abc", text(lines.next()));
            BundleFault fault = assertThrows(BundleFault.class, lines::next);
            assertEquals(Reason.LIMIT, fault.reason());
            assertEquals("f, line 2", fault.place());
        }
    }

    @Test
    void aLineWithoutEndIsRefusedAtTheLimit() throws IOException {
        byte[] endless = new byte[1 << 22];
        Arrays.fill(endless, (byte) 'x');
        ByteArrayInputStream in = new ByteArrayInputStream(endless);
        try (LineReader lines = new LineReader(in, "f", 1 << 20)) {
            assertThrows(BundleFault.class, lines::next);
        }
        assertTrue(in.available() > 1 << 21, "read on beyond the limit");
    }

    @Test
    void linesAcrossTheBuffersEdgeComeWhole() throws Exception {
        List<byte[]> written = new ArrayList<>();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        for (int length : new int[] {65_534, 1, 0, 65_536, 65_535, 200_000, 3}) {
            byte[] line = new byte[length];
            Arrays.fill(line, (byte) ('a' + length % 26));
            written.add(line);
            bytes.writeBytes(line);
            bytes.write('\n');
        }
        try (LineReader lines = new LineReader(new ByteArrayInputStream(bytes.toByteArray()), "f", 1 << 20)) {
            for (byte[] line : written) {
                assertArrayEquals(line, lines.next().orElseThrow());
            }
            assertTrue(lines.next().isEmpty());
        }
    }

    private static LineReader reader(String text, int limit) {
        return new LineReader(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "f", limit);
    }

    private static String text(Optional<byte[]> line) {
        return new String(line.orElseThrow(), StandardCharsets.UTF_8);
    }
}
