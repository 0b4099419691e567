package org.notchwork;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The study {@code first-light} gives the seal of the committed bundle, to the byte, whatever the threads, the Java
 * version, the locale, the time zone and the charset. Each run is a process of its own.
 */
class ReproducibilityTest {

    private static final Path STUDY = Path.of("configs", "first-light.json");
    private static final Path GOLDEN = Path.of("bundles", "first-light", "data");

    @TempDir
    Path folder;

    static Stream<Arguments> settings() {
        return Stream.of(
                Arguments.of("one thread", List.of(), 1),
                Arguments.of("two threads", List.of(), 2),
                Arguments.of("seven threads", List.of(), 7),
                Arguments.of("Turkish", List.of("-Duser.language=tr", "-Duser.country=TR"), 2),
                Arguments.of("Kiritimati", List.of("-Duser.timezone=Pacific/Kiritimati"), 2),
                Arguments.of("Latin-1", List.of("-Dfile.encoding=ISO-8859-1"), 2),
                Arguments.of(
                        "Egyptian, interpreted at first only",
                        List.of("-Duser.language=ar", "-Duser.country=EG", "-XX:TieredStopAtLevel=1"),
                        2));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("settings")
    void theSealIsTheSameWhateverTheSettings(String name, List<String> flags, int threads) throws Exception {
        assertSealedAlike(ChildJvm.running().withFlags(flags), threads);
    }

    @Test
    void theSealIsTheSameOnEveryOtherJavaFound() throws Exception {
        List<ChildJvm> others = ChildJvm.others();
        assumeTrue(!others.isEmpty(), "no other Java from 17 on was found beside the running one");
        for (ChildJvm other : others) {
            assertSealedAlike(other, 2);
        }
    }

    private void assertSealedAlike(ChildJvm java, int threads) throws IOException, InterruptedException {
        Path target = folder.resolve("bundle");
        ChildJvm.Ended ended = java.run(
                folder,
                "run",
                STUDY.toAbsolutePath().toString(),
                "--output",
                target.toString(),
                "--replace",
                "--threads",
                Integer.toString(threads));
        assertEquals(0, ended.exit(), () -> java + " said: " + ended.err());
        try (Stream<Path> files = Files.list(GOLDEN)) {
            List<Path> sealed = files.filter(f -> isSealed(f.getFileName().toString()))
                    .sorted()
                    .toList();
            assertTrue(sealed.size() >= 6, "the committed bundle has its sealed files");
            for (Path file : sealed) {
                Path made = target.resolve("data").resolve(file.getFileName().toString());
                assertArrayEquals(Files.readAllBytes(file), Files.readAllBytes(made), () -> java + ": " + file);
            }
        }
    }

    private static boolean isSealed(String name) {
        return name.startsWith("trials-")
                || List.of("study.json", "summary.json", "cross-checks.json", "claims.json", "seal.json")
                        .contains(name);
    }
}
