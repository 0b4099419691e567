package org.notchwork.bundle;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Guesses what a file is that was named instead of a bundle, by its first bytes, to help its sender. */
final class Likeness {

    private static final int BYTES = 8;

    private Likeness() {}

    /** Returns a remark in brackets. */
    static String of(Path file) {
        if (!Files.isRegularFile(file)) {
            return " (it is neither a folder nor a plain file)";
        }
        try (InputStream in = Files.newInputStream(file)) {
            String start = new String(in.readNBytes(BYTES), StandardCharsets.ISO_8859_1);
            if (start.isEmpty()) {
                return " (it is an empty file)";
            }
            if (start.startsWith("%PDF")) {
                return " (it starts like a PDF)";
            }
            if (start.startsWith("PK")) {
                return " (it starts like a zip; unpack it and name the folder)";
            }
            return start.startsWith("{") ? " (it starts like JSON; a study is run, not verified)" : " (it is a file)";
        } catch (IOException e) {
            return " (it cannot be read)";
        }
    }
}
