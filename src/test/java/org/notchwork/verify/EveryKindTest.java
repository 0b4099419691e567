package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.Studies;
import org.notchwork.bundle.CrossChecksFile;
import org.notchwork.bundle.Layout;
import org.notchwork.catalogue.Problems;
import org.notchwork.catalogue.Strategies;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.study.Study;

/** One study of every kind of problem with every strategy, run, sealed and run again by the referee. */
class EveryKindTest {

    private static final String TEXT = """
            {
              "format": "notchwork-study/2",
              "title": "Everything at once, invented",
              "question": "Invented for tests: does all of it run and verify?",
              "seed": "a seed of everything at once",
              "cross-check-width": 6,
              "experiments": [
                {
                  "id": "period", "problem": { "kind": "xor-period", "instances": "table" }, "widths": [4, 6],
                  "strategies": [
                    { "name": "sequential-scan" }, { "name": "random-draws" }, { "name": "random-draws-repeating" },
                    { "name": "difference-cover" }, { "name": "sidon-set" }, { "name": "cycle-walk" },
                    { "name": "distinguished-points", "distinguished-bits": 1, "stored-trails": 16 },
                    { "name": "fourier-sampling", "engine": "auto" },
                    { "name": "zero-error-fourier", "engine": "statevector" },
                    { "name": "zero-error-fourier", "engine": "annihilator" },
                    { "name": "fourier-sampling-fixed", "engine": "auto", "rounds": 30, "decoder": "pooled-elimination",
                      "noise": { "readout-flip": "0.02" }, "control": false },
                    { "name": "fourier-sampling-fixed", "engine": "fibre", "rounds": 30, "decoder": "likelihood",
                      "label": "noisy", "noise": { "readout-flip": "0.03", "uniform-mix": "0.1" } }
                  ],
                  "trials": 20, "query-limit": 2000
                },
                {
                  "id": "none", "problem": { "kind": "xor-period-or-none", "instances": "table" }, "widths": [4, 5],
                  "strategies": [
                    { "name": "random-draws" }, { "name": "collision-counting" },
                    { "name": "fourier-sampling", "engine": "auto" },
                    { "name": "fourier-sampling-fixed", "engine": "weights", "rounds": 8 }
                  ],
                  "trials": 20, "query-limit": 2000
                },
                {
                  "id": "subspace", "problem": { "kind": "hidden-subspace", "dimension": 2 }, "widths": [4, 5],
                  "strategies": [
                    { "name": "collision-span" },
                    { "name": "fourier-sampling", "engine": "auto" },
                    { "name": "fourier-sampling", "engine": "annihilator" }
                  ],
                  "trials": 20, "query-limit": 2000
                },
                {
                  "id": "mask", "problem": { "kind": "inner-product", "constant-bit": true }, "widths": [3, 6],
                  "strategies": [
                    { "name": "unit-vectors" },
                    { "name": "inner-product-fourier", "engine": "auto" },
                    { "name": "inner-product-fourier", "engine": "annihilator" }
                  ],
                  "trials": 20, "query-limit": 2000
                },
                {
                  "id": "balance", "problem": { "kind": "constant-or-balanced" }, "widths": [3, 5],
                  "strategies": [
                    { "name": "balance-scan" },
                    { "name": "balance-sampling", "queries": 4 },
                    { "name": "phase-query", "engine": "auto" }
                  ],
                  "trials": 20, "query-limit": 2000
                },
                {
                  "id": "affine", "problem": { "kind": "affine-period" }, "widths": [5, 70],
                  "strategies": [
                    { "name": "affine-solve" },
                    { "name": "fourier-sampling", "engine": "stabilizer" }
                  ],
                  "trials": 10, "query-limit": 2000
                },
                {
                  "id": "cipher", "problem": { "kind": "even-mansour" }, "widths": [6],
                  "strategies": [
                    { "name": "collision-counting" },
                    { "name": "data-time-tradeoff" },
                    { "name": "fourier-sampling", "engine": "auto" }
                  ],
                  "trials": 20, "query-limit": 4000
                },
                {
                  "id": "feistel", "problem": { "kind": "feistel-three" }, "widths": [5],
                  "strategies": [
                    { "name": "collision-counting" },
                    { "name": "fourier-sampling", "engine": "auto" }
                  ],
                  "trials": 20, "query-limit": 4000
                }
              ],
              "claims": []
            }
            """;

    @TempDir
    Path folder;

    /** All but tables, which need a file of their own. */
    @Test
    void theStudyNamesEveryKindAndEveryStrategy() {
        Set<String> kinds = new HashSet<>();
        Set<String> names = new HashSet<>();
        Studies.of(TEXT).experiments().forEach(e -> {
            kinds.add(e.problem().kind());
            e.strategies().forEach(s -> names.add(s.strategy().name()));
        });
        Set<String> wanted = new HashSet<>(Problems.kinds());
        wanted.remove("table");
        assertEquals(wanted, kinds);
        assertEquals(new HashSet<>(Strategies.names()), names);
    }

    @Test
    void itIsSealedWithoutADifferenceAndVerifiesWithAFullReRun() throws Exception {
        Study study = Studies.of(TEXT);
        Path bundle = BundleFixture.make(study, folder.resolve("everything"));
        List<CrossCheck> checks = CrossChecksFile.read(
                new JsonReader(JsonLimits.FILE)
                        .readCanonical(Files.readAllBytes(bundle.resolve("data").resolve(Layout.CROSS_CHECKS))),
                new ArrayList<>());
        assertTrue(checks.size() > 60, checks.size() + " checks");
        assertEquals(
                List.of(),
                checks.stream().filter(c -> c.outcome() == CheckOutcome.DIFFERS).toList());
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(0, verdict.exitCode(), verdict.sentence());
        assertEquals(0, BundleFixture.verify(bundle, new Rerun.Sample(100)).exitCode());
    }

    @Test
    void theSealIsTheSameOnEveryRun() throws Exception {
        Study study = Studies.of(TEXT);
        Path first = BundleFixture.make(study, folder.resolve("first"));
        Path second = BundleFixture.make(study, folder.resolve("second"));
        assertEquals(
                Files.readString(first.resolve("data/seal.json"), StandardCharsets.UTF_8),
                Files.readString(second.resolve("data/seal.json"), StandardCharsets.UTF_8));
    }
}
