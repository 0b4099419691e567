package org.notchwork;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** Starts the program in a Java process of its own, as a user would. */
public record ChildJvm(Path java, List<String> flags) {

    private static final long LIMIT_SECONDS = 300;

    /** How a process ended. */
    public record Ended(int exit, String out, String err) {}

    /** Returns the Java that runs the tests. */
    public static ChildJvm running() {
        return new ChildJvm(Path.of(System.getProperty("java.home"), "bin", "java"), List.of());
    }

    /** Returns every other Java from 17 on that is installed beside the running one or where Linux puts them. */
    public static List<ChildJvm> others() throws IOException {
        List<ChildJvm> found = new ArrayList<>();
        Path running = running().java().toRealPath();
        List<Path> seen = new ArrayList<>(List.of(running));
        for (Path folder :
                List.of(Path.of(System.getProperty("java.home")).resolveSibling("."), Path.of("/usr/lib/jvm"))) {
            if (!Files.isDirectory(folder)) {
                continue;
            }
            try (Stream<Path> homes = Files.list(folder)) {
                for (Path home : homes.sorted().toList()) {
                    Path java = home.resolve("bin").resolve("java");
                    if (Files.isExecutable(java) && !seen.contains(java.toRealPath()) && feature(home) >= 17) {
                        seen.add(java.toRealPath());
                        found.add(new ChildJvm(java, List.of()));
                    }
                }
            }
        }
        return found;
    }

    /** Returns the same Java with flags for the machine. */
    public ChildJvm withFlags(List<String> more) {
        return new ChildJvm(java, List.copyOf(more));
    }

    /** Runs the program and waits for its end. */
    public Ended run(Path folder, String... arguments) throws IOException, InterruptedException {
        Path out = Files.createTempFile(folder, "out", ".txt");
        Path err = Files.createTempFile(folder, "err", ".txt");
        Process process = start(folder, out, err, arguments);
        if (!process.waitFor(LIMIT_SECONDS, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new IOException("not ended after " + LIMIT_SECONDS + " s: " + String.join(" ", arguments));
        }
        return new Ended(
                process.exitValue(),
                Files.readString(out, StandardCharsets.UTF_8),
                Files.readString(err, StandardCharsets.UTF_8));
    }

    /** Starts the program, its streams going to files. */
    public Process start(Path folder, Path out, Path err, String... arguments) throws IOException {
        List<String> command = new ArrayList<>(List.of(java.toString()));
        command.addAll(flags);
        // The class path of the tests holds a logging interface without a logger, which would say so.
        command.addAll(List.of(
                "-Djava.awt.headless=true",
                "-Dslf4j.internal.verbosity=ERROR",
                "-cp",
                System.getProperty("java.class.path")));
        command.add("org.notchwork.cli.Main");
        command.addAll(List.of(arguments));
        return new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectOutput(out.toFile())
                .redirectError(err.toFile())
                .start();
    }

    /** Returns the feature version that a Java home states in its release file, 0 if it states none. */
    private static int feature(Path home) throws IOException {
        Path release = home.resolve("release");
        if (!Files.isReadable(release)) {
            return 0;
        }
        return Files.readAllLines(release, StandardCharsets.UTF_8).stream()
                .filter(l -> l.startsWith("JAVA_VERSION=\""))
                .map(l -> l.substring(14).replaceAll("[^0-9].*", ""))
                .mapToInt(Integer::parseInt)
                .findFirst()
                .orElse(0);
    }
}
