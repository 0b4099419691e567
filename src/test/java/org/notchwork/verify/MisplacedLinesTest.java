package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.Studies;

/**
 * Trials dropped, repeated, moved: which, and where. The file {@code all} has six lines an instance, eight instances
 * at width 3, then eight at width 5; the file {@code cut} two lines an instance, twelve at width 6.
 */
class MisplacedLinesTest {

    private static final String ALL = "trials-all.jsonl";
    private static final String CUT = "trials-cut.jsonl";

    @TempDir
    static Path home;

    private static Path good;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeOneGoodBundle() throws IOException, InterruptedException {
        good = BundleFixture.make(home.resolve("good"));
    }

    static Stream<Arguments> changes() {
        return Stream.of(
                change(
                        ALL,
                        l -> l.remove(7),
                        119,
                        "line 8: trial 1 of random-draws at width 3 is dropped; the file has 95 lines, the study calls"
                                + " for 96"),
                change(
                        ALL,
                        l -> l.subList(0, 6).clear(),
                        114,
                        "line 1: trial 0 of sequential-scan at width 3 is dropped; the file has 90 lines"),
                change(
                        ALL,
                        l -> l.remove(95),
                        119,
                        "line 96: trial 7 of fourier-sampling@annihilator at width 5 is dropped; the file has 95"),
                change(
                        CUT,
                        l -> l.remove(23),
                        119,
                        "line 24: trial 11 of fourier-sampling@fibre at width 6 is dropped; the file has 23"),
                change(ALL, l -> l.add(7, l.get(7)), 121, "line 9: the trial of line 8 is repeated; the file has 97"),
                change(ALL, l -> l.add(50, l.get(0)), 121, "line 51: the trial of line 1 is repeated"),
                change(ALL, l -> l.add(l.get(0)), 121, "line 97: one line too many; the file has 97"),
                change(
                        ALL,
                        l -> Collections.swap(l, 2, 3),
                        120,
                        "line 3: out of order: the trial of line 4 stands where trial 0 of difference-cover at width 3"
                                + " should; the file has 96 lines, the study calls for 96"),
                change(
                        ALL,
                        l -> Collections.rotate(l, 48),
                        120,
                        "line 1: out of order: the trial of line 49 stands where trial 0 of sequential-scan"),
                change(
                        ALL,
                        l -> l.set(4, l.get(4).replace("\"sight\":\"blind\"", "\"sight\":\"sighted\"")),
                        120,
                        "line 5: trial 0 of fourier-sampling@fibre at width 3 is named with another engine or sight"),
                change(
                        ALL,
                        l -> l.set(3, l.get(3).replace("\"trial\":0", "\"trial\":8")),
                        120,
                        "line 4: a trial that the study does not call for stands where trial 0 of"
                                + " fourier-sampling@statevector at width 3 should"));
    }

    @ParameterizedTest
    @MethodSource("changes")
    void whatBecameOfTheTrialsIsSaidInWords(String file, Consumer<List<String>> change, long lines, String told)
            throws Exception {
        Path bundle = changed(file, change);
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        StageReport figures = verdict.stages().get(5);
        assertEquals(StageOutcome.FAILED, figures.outcome());
        assertTrue(figures.sentence().contains("data/" + file + ", " + told), figures.sentence());
        assertEquals("data/" + file, figures.findings().get(0).file());
        // What is said of all lines was looked at in all lines.
        assertTrue(
                verdict.stages().get(2).sentence().endsWith(lines + " trial lines"),
                verdict.stages().get(2).sentence());
        assertEquals(StageOutcome.PASSED, verdict.stages().get(3).outcome(), "resealed, so the tree fits");
        assertEquals(StageOutcome.NOT_DONE, verdict.stages().get(6).outcome());
    }

    @Test
    void aFaultAfterAMisplacedLineIsStillFound() throws Exception {
        Path bundle = changed(ALL, l -> {
            Collections.swap(l, 2, 3);
            l.set(80, l.get(80).replace("\"width\":5}", "\"width\":5 }"));
        });
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(12, verdict.exitCode());
        assertTrue(verdict.sentence().contains(ALL + ", line 81"), verdict.sentence());
    }

    @Test
    void anAnswerAfterAMisplacedLineIsStillChecked() throws Exception {
        Path bundle = changed(ALL, l -> {
            l.remove(2);
            l.set(80, l.get(80).replace("\"outcome\":\"solved\"", "\"outcome\":\"wrong\""));
        });
        Verdict verdict = BundleFixture.verify(bundle);
        StageReport certificates = verdict.stages().get(4);
        assertEquals(StageOutcome.FAILED, certificates.outcome(), certificates.sentence());
        assertEquals(1, certificates.differences());
        assertEquals(
                "data/" + ALL + ", line 81, /outcome: found wrong, should be solved",
                certificates.findings().get(0).text());
        assertEquals(StageOutcome.FAILED, verdict.stages().get(5).outcome());
    }

    private Path changed(String file, Consumer<List<String>> change) throws IOException {
        Path bundle = BundleFixture.copy(good, folder.resolve("changed"));
        BundleFixture.editLines(bundle, file, lines -> {
            change.accept(lines);
            return lines;
        });
        BundleFixture.reseal(bundle, Studies.small());
        return bundle;
    }

    private static Arguments change(String file, Consumer<List<String>> change, long lines, String told) {
        return Arguments.of(file, change, lines, told);
    }
}
