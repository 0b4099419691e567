package org.notchwork.cli;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * The two streams that the program speaks on: results on one, everything else on the other.
 *
 * <p>Both are UTF-8 whatever the machine's charset. A full or closed output is remembered by the stream and turned
 * into an exit code at the end, because the JVM by itself would end with 0.
 *
 * @param out results
 * @param err progress, warnings and faults
 * @param live whether {@code err} is a terminal on which a line may be drawn over
 */
public record Terminal(PrintStream out, PrintStream err, boolean live) {

    private static final int BUFFER = 1 << 16;

    /** Returns the streams of this process. */
    public static Terminal ofProcess() {
        return new Terminal(
                new PrintStream(
                        new BufferedOutputStream(new FileOutputStream(FileDescriptor.out), BUFFER),
                        false,
                        StandardCharsets.UTF_8),
                new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8),
                isTerminal());
    }

    /** Flushes and returns whether everything written to {@code out} arrived. */
    public boolean delivered() {
        out.flush();
        return !out.checkError();
    }

    /**
     * Returns whether standard error is a terminal. Java has no question for this stream alone, so the link that the
     * kernel keeps for it is read; where there is none the answer is no, and progress comes in plain lines.
     */
    private static boolean isTerminal() {
        if ("dumb".equals(System.getenv("TERM"))) {
            return false;
        }
        try {
            String target = Files.readSymbolicLink(Path.of("/proc/self/fd/2")).toString();
            return target.startsWith("/dev/pts/") || target.startsWith("/dev/tty");
        } catch (IOException | UnsupportedOperationException e) {
            return false;
        }
    }
}
