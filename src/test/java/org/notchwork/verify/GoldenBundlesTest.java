package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every bundle that is kept verifies, and all its trials, controls and cross-checks come out the same again. */
class GoldenBundlesTest {

    private static final Path KEPT = Path.of("bundles");

    static List<Path> bundles() throws IOException {
        try (Stream<Path> folders = Files.list(KEPT)) {
            return folders.filter(Files::isDirectory).sorted().toList();
        }
    }

    @Test
    void oneOfEachVersionIsKept() throws IOException {
        List<String> names =
                bundles().stream().map(p -> p.getFileName().toString()).toList();
        assertTrue(names.containsAll(List.of("catalogue", "first-light")), names.toString());
        assertTrue(Files.readString(KEPT.resolve("first-light/data/study.json")).contains("notchwork-study/1"));
        assertTrue(Files.readString(KEPT.resolve("catalogue/data/study.json")).contains("notchwork-study/2"));
    }

    @ParameterizedTest
    @MethodSource("bundles")
    void aKeptBundleIsIntactAndRunsTheSameAgain(Path bundle) throws IOException, InterruptedException {
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(0, verdict.exitCode(), verdict.sentence());
    }
}
