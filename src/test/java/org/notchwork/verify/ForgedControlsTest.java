package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.Controlled;
import org.notchwork.Studies;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Study;

/** Controls that were changed, dropped, repeated or turned, with all digests made anew: what finds them. */
class ForgedControlsTest {

    private static final Study STUDY = Studies.of(Controlled.TEXT);
    private static final String FILE = "controls-c.jsonl";

    /** Two widths with four controls a trial, one with one; 30 trials each. */
    private static final int LINES = 270;

    @TempDir
    static Path home;

    private static Path good;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeOneGoodBundle() throws IOException, InterruptedException {
        good = BundleFixture.make(STUDY, home.resolve("good"));
    }

    private Path changed(Consumer<List<String>> change) throws IOException {
        Path bundle = BundleFixture.copy(good, folder.resolve("changed"));
        BundleFixture.editLines(bundle, FILE, lines -> {
            change.accept(lines);
            return lines;
        });
        return bundle;
    }

    private static List<String> lines() throws IOException {
        return Files.readAllLines(good.resolve("data").resolve(FILE), StandardCharsets.UTF_8);
    }

    private static String without(JsonObject object, String... names) {
        Map<String, JsonValue> members = new LinkedHashMap<>(object.members());
        for (String name : names) {
            members.remove(name);
        }
        return CanonicalJson.text(new JsonObject(members));
    }

    private static String with(String line, String name, String text) {
        return CanonicalJson.text(Forger.with(Forger.object(line), name, new JsonText(text)));
    }

    private static int first(String text) throws IOException {
        List<String> lines = lines();
        for (int i = 0; i < lines.size(); i++) {
            if (lines.get(i).contains(text)) {
                return i;
            }
        }
        throw new IllegalStateException("no line with " + text);
    }

    @Test
    void anHonestBundleWithControlsVerifies() throws Exception {
        assertEquals(LINES, lines().size());
        Verdict verdict = BundleFixture.verify(good, new Rerun.All());
        assertEquals(0, verdict.exitCode(), verdict.sentence());
        Path same = BundleFixture.copy(good, folder.resolve("same"));
        Forger.derive(same, STUDY);
        assertEquals(verdict.seal(), BundleFixture.verify(same).seal());
    }

    @Test
    void aChangedLineHasAnotherDigest() throws Exception {
        Path bundle = changed(l -> l.set(0, l.get(0).replace("\"trial\":0", "\"trial\":1")));
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(StageOutcome.FAILED, verdict.stages().get(1).outcome());
        assertEquals("data/" + FILE, verdict.stages().get(1).findings().get(0).file());
    }

    static Stream<Arguments> misplaced() {
        return Stream.of(
                misplaced(
                        l -> l.remove(5),
                        "line 6: trial 1 of fourier-sampling@fibre at width 4 is dropped; the file has 269 lines, the study calls"
                                + " for 270"),
                misplaced(
                        l -> l.remove(269),
                        "line 270: trial 29 of difference-cover at width 9 is dropped; the file has 269 lines, the study calls"
                                + " for 270"),
                misplaced(l -> l.add(5, l.get(5)), "line 7: the trial of line 6 is repeated; the file has 271 lines"),
                misplaced(l -> l.add(l.get(0)), "line 271: one line too many; the file has 271 lines"),
                misplaced(
                        l -> Collections.swap(l, 2, 3),
                        "line 3: out of order: the trial of line 4 stands where trial 0 of fourier-sampling@annihilator at width 4"
                                + " should; the file has 270 lines, the study calls for 270"),
                misplaced(
                        l -> l.set(3, l.get(3).replace("\"trial\":0", "\"trial\":30")),
                        "line 4: a trial that the study does not call for stands where trial 0 of difference-cover at width 4"
                                + " should"),
                misplaced(
                        l -> l.set(0, with(l.get(0), "strategy", "sequential-scan")),
                        "line 1: a trial that the study does not call for stands where trial 0 of random-draws at width 4"));
    }

    private static Arguments misplaced(Consumer<List<String>> change, String told) {
        return Arguments.of(change, told);
    }

    /** No re-run is needed for it, and the sentence says what became of the line. */
    @ParameterizedTest
    @MethodSource("misplaced")
    void aLineDroppedRepeatedOrMovedIsTold(Consumer<List<String>> change, String told) throws Exception {
        Path bundle = changed(change);
        BundleFixture.reseal(bundle, STUDY);
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(10, verdict.exitCode());
        StageReport figures = verdict.stages().get(5);
        assertEquals(StageOutcome.FAILED, figures.outcome());
        assertTrue(figures.sentence().contains("data/" + FILE + ", " + told), figures.sentence());
        assertEquals("data/" + FILE, figures.findings().get(0).file());
        assertEquals(StageOutcome.PASSED, verdict.stages().get(3).outcome(), "resealed, so the digests fit");
    }

    /** The function is drawn again, and the certificate held against it. */
    @Test
    void anOutcomeTurnedIsFoundWithoutAReRun() throws Exception {
        int failed = first("\"outcome\":\"failed\"");
        int claimed = first("\"outcome\":\"claimed\"");
        int secret = first("\"outcome\":\"secret\"");
        Path bundle = changed(l -> {
            l.set(failed, with(l.get(failed), "outcome", "claimed"));
            l.set(claimed, with(l.get(claimed), "outcome", "secret"));
            l.set(secret, with(l.get(secret), "outcome", "failed"));
        });
        Forger.derive(bundle, STUDY);
        StageReport certificates = BundleFixture.verify(bundle).stages().get(4);
        assertEquals(StageOutcome.FAILED, certificates.outcome());
        assertEquals(3, certificates.differences());
        for (Finding finding : certificates.findings()) {
            assertEquals("data/" + FILE, finding.file());
            assertEquals("/outcome", finding.pointer());
        }
        assertTrue(certificates.findings().stream()
                .anyMatch(f -> f.line().getAsLong() == failed + 1
                        && f.written().equals("claimed")
                        && f.right().equals("failed")));
    }

    @Test
    void anotherSecretIsFoundWithoutAReRun() throws Exception {
        Path bundle = changed(l -> {
            JsonObject line = Forger.object(l.get(3));
            JsonObject other = Forger.object(l.get(7));
            l.set(
                    3,
                    CanonicalJson.text(
                            Forger.with(line, "secret", other.members().get("secret"))));
        });
        Forger.derive(bundle, STUDY);
        StageReport certificates = BundleFixture.verify(bundle).stages().get(4);
        assertEquals(StageOutcome.FAILED, certificates.outcome());
        assertTrue(certificates.findings().stream().anyMatch(f -> f.pointer().equals("/secret")));
    }

    /** A forger who hides that the sighted engine was told: the bundle agrees with itself, the re-run does not. */
    @Test
    void aSightedCellMadeBlindIsFoundByAFullReRun() throws Exception {
        Path bundle = changed(l -> l.replaceAll(line -> line.contains("annihilator")
                ? with(without(Forger.object(line), "answer", "certificate"), "outcome", "nothing")
                : line));
        Forger.derive(bundle, STUDY);
        Verdict without = BundleFixture.verify(bundle);
        assertEquals(0, without.exitCode(), without.sentence());
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        Finding finding = verdict.stages().get(6).findings().get(0);
        assertEquals("data/" + FILE, finding.file());
        assertEquals(3, finding.line().orElseThrow());
    }

    /** No figure depends on the calls of a control. */
    @Test
    void forgedCallsOfAControlAreFoundByAFullReRun() throws Exception {
        Path bundle = changed(l -> l.set(3, l.get(3).replaceFirst("\"classical\":[0-9]+", "\"classical\":1")));
        BundleFixture.reseal(bundle, STUDY);
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        String told = verdict.stages().get(6).findings().get(0).text();
        assertTrue(told.startsWith("data/" + FILE + ", line 4, /calls/classical: found 1"), told);
    }

    /** Lines changed and digests made anew, but not the figures. */
    @Test
    void figuresThatDoNotFollowFromTheControlsAreFound() throws Exception {
        Path bundle = changed(l -> l.replaceAll(line -> line.contains("annihilator")
                ? with(without(Forger.object(line), "answer", "certificate"), "outcome", "nothing")
                : line));
        BundleFixture.reseal(bundle, STUDY);
        StageReport figures = BundleFixture.verify(bundle).stages().get(5);
        assertEquals(StageOutcome.FAILED, figures.outcome());
        assertTrue(
                figures.findings().stream().anyMatch(f -> f.pointer().contains("/control/named")),
                figures.findings().toString());
    }

    @Test
    void aLineWithAFaultIsMalformed() throws Exception {
        Path bundle = changed(l -> l.set(1, with(l.get(1), "outcome", "odd")));
        BundleFixture.reseal(bundle, STUDY);
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(12, verdict.exitCode());
        assertTrue(verdict.sentence().contains(FILE + ", line 2, /outcome: \"odd\""), verdict.sentence());
    }

    @Test
    void aMissingFileOfControlsIsNotOverlooked() throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("missing"));
        Files.delete(bundle.resolve("data").resolve(FILE));
        BundleFixture.manifests(bundle);
        Verdict verdict = BundleFixture.verify(bundle);
        assertFalse(verdict.exitCode() == 0, verdict.sentence());
        assertTrue(verdict.sentence().contains(FILE), verdict.sentence());
    }

    @ParameterizedTest
    @EnumSource(
            value = CheckKind.class,
            names = {"QUERY_DISTRIBUTION", "CLASSICAL_BOUND", "CONTROL"})
    void aStatisticalCheckLeftOutOrTurnedIsFoundWithoutAReRun(CheckKind kind) throws Exception {
        Path out = BundleFixture.copy(good, folder.resolve("left-out"));
        Forger.checks(
                out,
                STUDY,
                checks -> checks.stream().filter(c -> c.kind() != kind).toList());
        StageReport figures = BundleFixture.verify(out).stages().get(5);
        assertEquals(StageOutcome.FAILED, figures.outcome());
        assertEquals("data/cross-checks.json", figures.findings().get(0).file());

        Path turned = BundleFixture.copy(good, folder.resolve("turned"));
        Forger.checks(
                turned,
                STUDY,
                checks -> checks.stream()
                        .map(c -> c.kind() == kind && c.outcome() == CheckOutcome.AGREES ? turned(c) : c)
                        .toList());
        Finding first = BundleFixture.verify(turned).stages().get(5).findings().get(0);
        assertTrue(first.pointer().matches("/checks/[0-9]+/outcome"), first.text());
        assertEquals("\"agrees\"", first.right());
    }

    private static CrossCheck turned(CrossCheck c) {
        return new CrossCheck(
                c.kind(),
                c.subject(),
                c.compared(),
                c.expected(),
                c.observed(),
                c.standardErrors(),
                CheckOutcome.NOT_COMPARABLE);
    }

    @Test
    void aBundleOfTheFirstFormatHasNoControlFile() throws Exception {
        Path first = BundleFixture.make(folder.resolve("first"));
        try (Stream<Path> files = Files.list(first.resolve("data"))) {
            assertTrue(files.noneMatch(f -> f.getFileName().toString().startsWith("controls")));
        }
        assertFalse(Files.readString(first.resolve("data/seal.json")).contains("controls"));
        assertTrue(Files.readString(good.resolve("data/seal.json")).contains("\"" + FILE + "\""));
        assertEquals(0, BundleFixture.verify(first).exitCode());
    }
}
