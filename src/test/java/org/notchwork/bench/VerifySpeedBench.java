package org.notchwork.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.commons.codec.digest.DigestUtils;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.Studies;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.LineReader;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.verify.BundleFixture;

/**
 * How long verification without a re-run takes, as a multiple of hashing the same files and parsing the same lines.
 * Prints its figures and judges none: speed does not belong in a test.
 */
@Tag("bench")
class VerifySpeedBench {

    private static final int ROUNDS = 7;

    @TempDir
    Path home;

    @Test
    void verifyingAHundredThousandTrials() throws Exception {
        Path bundle = BundleFixture.make(Studies.of("""
                        {"format":"notchwork-study/1","title":"Many small trials (invented)","question":"?",
                         "seed":"a seed of a hundred thousand trials","cross-check-width":0,
                         "experiments":[{"id":"many","problem":{"kind":"xor-period"},"widths":[4,6,8,10],
                           "strategies":[{"name":"sequential-scan"},{"name":"random-draws"},{"name":"difference-cover"},
                             {"name":"fourier-sampling","engine":"fibre"},{"name":"fourier-sampling","engine":"annihilator"}],
                           "trials":5000,"query-limit":100000}]}
                        """), home.resolve("many"));
        List<Double> plain = new ArrayList<>();
        List<Double> verified = new ArrayList<>();
        List<Double> ratios = new ArrayList<>();
        for (int i = 0; i < ROUNDS; i++) {
            long start = System.nanoTime();
            hashAndParse(bundle);
            long middle = System.nanoTime();
            assertEquals(0, BundleFixture.verify(bundle).exitCode());
            long end = System.nanoTime();
            plain.add((middle - start) / 1e9);
            verified.add((end - middle) / 1e9);
            ratios.add((double) (end - middle) / (middle - start));
        }
        System.out.println("100 000 trials: hash and parse " + median(plain) + " s, verify " + median(verified)
                + " s, ratio " + median(ratios) + " (medians of " + ROUNDS + ")");
    }

    private static void hashAndParse(Path bundle) throws IOException, BundleFault, JsonFault {
        try (Stream<Path> files = Files.list(bundle.resolve("data"))) {
            for (Path file : files.toList()) {
                try (InputStream in = Files.newInputStream(file)) {
                    DigestUtils.sha256(in);
                }
            }
        }
        JsonReader reader = new JsonReader(JsonLimits.LINE);
        Path lines = bundle.resolve("data/trials-many.jsonl");
        try (LineReader in = new LineReader(Files.newInputStream(lines), "lines", JsonLimits.LINE.bytes())) {
            for (Optional<byte[]> line = in.next(); line.isPresent(); line = in.next()) {
                reader.read(line.get());
            }
        }
    }

    private static double median(List<Double> values) {
        List<Double> sorted = new ArrayList<>(values);
        Collections.sort(sorted);
        return Math.round(sorted.get(sorted.size() / 2) * 1000) / 1000.0;
    }
}
