package org.notchwork.bundle;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;
import java.util.Optional;

/** Splits a stream into lines, each ended by one line feed and none longer than a limit. */
public final class LineReader implements AutoCloseable {

    private final InputStream in;
    private final String file;
    private final int limit;
    private final byte[] buffer = new byte[1 << 16];
    private int from;
    private int to;
    private long number;

    /**
     * Opens a stream.
     *
     * @param in the bytes
     * @param file the name of the file, for messages
     * @param limit the longest line in bytes
     */
    public LineReader(InputStream in, String file, int limit) {
        this.in = in;
        this.file = file;
        this.limit = limit;
    }

    /** Returns the number of the line that was read last, from 1. */
    public long number() {
        return number;
    }

    /** Returns the next line without its line feed; empty at the end. */
    public Optional<byte[]> next() throws IOException, BundleFault {
        ByteArrayOutputStream pieces = new ByteArrayOutputStream(0);
        while (true) {
            if (from == to) {
                to = Math.max(0, in.read(buffer));
                from = 0;
                if (to == 0) {
                    return end(pieces);
                }
            }
            int end = indexOfLineFeed();
            if (pieces.size() + (end - from) > limit) {
                throw new BundleFault(
                        BundleFault.Reason.LIMIT, file + ", line " + (number + 1), "longer than " + limit + " bytes");
            }
            if (end < to) {
                byte[] line = Arrays.copyOfRange(buffer, from, end);
                from = end + 1;
                number++;
                return Optional.of(pieces.size() == 0 ? line : joined(pieces, line));
            }
            pieces.write(buffer, from, to - from);
            from = to;
        }
    }

    private Optional<byte[]> end(ByteArrayOutputStream pieces) throws BundleFault {
        if (pieces.size() > 0) {
            throw new BundleFault(
                    BundleFault.Reason.LINE_END,
                    file + ", line " + (number + 1),
                    "the last line has no line feed; every line ends with one");
        }
        return Optional.empty();
    }

    private int indexOfLineFeed() {
        int i = from;
        while (i < to && buffer[i] != '\n') {
            i++;
        }
        return i;
    }

    private static byte[] joined(ByteArrayOutputStream pieces, byte[] rest) {
        pieces.write(rest, 0, rest.length);
        return pieces.toByteArray();
    }

    @Override
    public void close() throws IOException {
        in.close();
    }
}
