package org.notchwork.verify;

import java.io.IOException;
import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.LineReader;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;

/** The lines of one file as they are written, walked forward and compared with trials that were run again. */
final class WrittenLines implements AutoCloseable {

    private final String path;
    private final LineReader lines;
    private final Findings findings;

    /**
     * Opens a file.
     *
     * @param findings where differences are noted
     */
    WrittenLines(Bag bag, String path, int lineLimit, Findings findings) throws IOException {
        this.path = path;
        this.lines = new LineReader(bag.open(path), path, lineLimit);
        this.findings = findings;
    }

    /** Says that the lines, which were read before, cannot be read again. */
    static final class Stopped extends Exception {

        private static final long serialVersionUID = 1L;

        Stopped(Exception cause) {
            super(cause.getMessage(), cause);
        }
    }

    /**
     * Compares a line, to the byte, with the trial that was run again; a difference is noted field by field.
     *
     * @param index the line's place in the file, from 0; never before the last one asked for
     * @param again the line that the trial came to
     */
    void compare(long index, JsonObject again) throws Stopped {
        byte[] right = CanonicalJson.bytes(again);
        byte[] written = at(index).orElseGet(() -> new byte[0]);
        if (!Arrays.equals(written, right)) {
            difference(written, right);
        }
    }

    /** Notes something about the line that was compared last. */
    void note(String found, String right) {
        findings.add(new Finding(path, OptionalLong.of(lines.number()), "", found, right));
    }

    private Optional<byte[]> at(long index) throws Stopped {
        try {
            Optional<byte[]> line = lines.next();
            while (line.isPresent() && lines.number() <= index) {
                line = lines.next();
            }
            return line;
        } catch (IOException | BundleFault e) {
            throw new Stopped(e);
        }
    }

    private void difference(byte[] written, byte[] right) {
        OptionalLong number = OptionalLong.of(lines.number());
        JsonReader reader = new JsonReader(JsonLimits.LINE);
        try {
            new JsonDifference((pointer, a, b) -> findings.add(new Finding(path, number, pointer, a, b)))
                    .compare(reader.read(written), reader.read(right));
        } catch (JsonFault e) {
            findings.add(new Finding(path, number, "", "not JSON: " + e.getMessage(), "a trial line"));
        }
    }

    @Override
    public void close() throws IOException {
        lines.close();
    }
}
