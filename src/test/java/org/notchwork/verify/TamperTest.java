package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.Studies;
import org.notchwork.bundle.Limits;
import org.notchwork.seed.Seed;

/** Good bundles pass; bundles made wrong in one way fail in the stage that should find it, with the place named. */
class TamperTest {

    private static final String CELLS = "summary.json";
    private static final String ALL = "trials-all.jsonl";
    private static final String SMALLEST = """
            {"format":"notchwork-study/1","title":"T (invented)","question":"?","seed":"a seed of one trial","cross-check-width":0,
             "experiments":[{"id":"e","problem":{"kind":"xor-period"},"widths":[2],"trials":1,"query-limit":9,
               "strategies":[{"name":"fourier-sampling","engine":"fibre"}]}]}
            """;

    @TempDir
    static Path home;

    private static Path good;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeOneGoodBundle() throws IOException, InterruptedException {
        good = BundleFixture.make(home.resolve("good"));
    }

    static Stream<Rerun> reruns() {
        return Stream.of(new Rerun.None(), new Rerun.Sample(1), new Rerun.Sample(40), new Rerun.All());
    }

    @ParameterizedTest
    @MethodSource("reruns")
    void aGoodBundlePassesEveryStage(Rerun rerun) throws Exception {
        Verdict verdict = BundleFixture.verify(good, rerun);
        assertEquals(0, verdict.exitCode(), verdict.sentence());
        for (StageReport report : verdict.stages()) {
            boolean notAsked =
                    report.stage() == Stage.FRESH || (report.stage() == Stage.RERUN && rerun instanceof Rerun.None);
            StageOutcome expected = notAsked ? StageOutcome.NOT_DONE : StageOutcome.PASSED;
            assertEquals(expected, report.outcome(), report.sentence());
        }
        assertTrue(verdict.sentence().startsWith("YES"));
    }

    /** Forgeries with all digests made anew, the stage that finds each, and a part of the place it names. */
    static Stream<Arguments> forgeries() {
        return Stream.of(
                forgery(
                        "an answer changed",
                        Stage.CERTIFICATES,
                        "/outcome",
                        ALL,
                        line(3, "\"answer\":{\"period\":\"", 1)),
                forgery(
                        "a secret swapped",
                        Stage.CERTIFICATES,
                        "/hidden/period",
                        ALL,
                        line(3, "\"hidden\":{\"period\":\"", 1)),
                forgery(
                        "a colliding value changed",
                        Stage.CERTIFICATES,
                        "/certificate/collision/fx",
                        ALL,
                        line(1, "\"fx\":\"", 1)),
                forgery(
                        "a colliding point changed",
                        Stage.CERTIFICATES,
                        "/certificate/collision",
                        ALL,
                        line(1, "\"x\":\"", 1)),
                forgery(
                        "an equation changed",
                        Stage.CERTIFICATES,
                        "/certificate/equations/words",
                        ALL,
                        first("\"words\":\\[\"[0-9a-f]\"", "\"words\":[\"0\"")),
                forgery(
                        "a censored trial called wrong",
                        Stage.SCHEMA,
                        "/answer",
                        "trials-cut.jsonl",
                        text("censored", "wrong")),
                forgery("a count in a line", Stage.FIGURES, "/cells/0/queries", ALL, line(1, "\"classical\":", 1)),
                forgery("a random count in a line", Stage.FIGURES, "/cells/", ALL, line(2, "\"classical\":", 1)),
                forgery(
                        "calls above the limit",
                        Stage.CERTIFICATES,
                        "/calls",
                        "trials-cut.jsonl",
                        text("\"confirming\":0", "\"confirming\":70")),
                forgery("a trial dropped", Stage.FIGURES, "/strategy", ALL, lines(l -> l.remove(7))),
                forgery("the last trial dropped", Stage.FIGURES, "line ", ALL, lines(l -> l.remove(l.size() - 1))),
                forgery("a trial repeated", Stage.FIGURES, "/strategy", ALL, lines(l -> l.add(7, l.get(7)))),
                forgery("a trial too many", Stage.FIGURES, "one more line", ALL, lines(l -> l.add(l.get(0)))),
                forgery("trials reordered", Stage.FIGURES, "/strategy", ALL, lines(l -> Collections.swap(l, 2, 3))),
                forgery(
                        "instances reordered",
                        Stage.FIGURES,
                        "/trial",
                        ALL,
                        lines(l -> Collections.rotate(l.subList(0, 12), 6))),
                forgery(
                        "sighted called blind",
                        Stage.FIGURES,
                        "/sight",
                        ALL,
                        text("\"sight\":\"sighted\"", "\"sight\":\"blind\"")),
                forgery(
                        "an engine renamed",
                        Stage.FIGURES,
                        "/engine",
                        ALL,
                        text("\"engine\":\"annihilator\"", "\"engine\":\"fibre\"")),
                forgery(
                        "sighted called blind in the figures",
                        Stage.FIGURES,
                        "/sight",
                        CELLS,
                        text("\"sight\":\"sighted\"", "\"sight\":\"blind\"")),
                forgery("a mean moved in the last digit", Stage.FIGURES, "/queries/mean", CELLS, digit("\"mean\":\"")),
                forgery("an interval moved", Stage.FIGURES, "-interval/high", CELLS, digit("\"high\":\"")),
                forgery("a median moved", Stage.FIGURES, "/queries/median", CELLS, digit("\"median\":")),
                forgery("a count of solved trials moved", Stage.FIGURES, "/solved", CELLS, digit("\"solved\":")),
                forgery("a ratio moved", Stage.FIGURES, "/ratio", CELLS, digit("\"ratio\":\"")),
                forgery(
                        "a cell left out",
                        Stage.FIGURES,
                        "/cells",
                        CELLS,
                        first("\\{\"cell\":.*?\\},\\{\"cell\":", "{\"cell\":")),
                forgery(
                        "attention turned off",
                        Stage.FIGURES,
                        "/attention",
                        CELLS,
                        text("All cross-checks", "all cross-checks")),
                forgery(
                        "a verdict flipped",
                        Stage.FIGURES,
                        "/verdict",
                        "claims.json",
                        text("\"verdict\":\"supported\"", "\"verdict\":\"refuted\"")),
                forgery("a claim's text changed", Stage.FIGURES, "/claim/text", "claims.json", text("few", "fewer")),
                forgery(
                        "a claim's reason changed",
                        Stage.FIGURES,
                        "/reason",
                        "claims.json",
                        text("lies wholly", "lies partly")),
                forgery(
                        "a check's observation changed",
                        Stage.FIGURES,
                        "/observed",
                        "cross-checks.json",
                        text(", standard error ", ", standard errors ")),
                forgery(
                        "a check's standard errors changed",
                        Stage.FIGURES,
                        "/standard-errors",
                        "cross-checks.json",
                        digit("\"standard-errors\":\"")),
                forgery(
                        "a check renamed",
                        Stage.SCHEMA,
                        "/kind",
                        "cross-checks.json",
                        text("\"kind\":\"promise\"", "\"kind\":\"honour\"")),
                forgery(
                        "a study's claim loosened",
                        Stage.FIGURES,
                        "/claim/at-most",
                        "study.json",
                        text("\"at-most\":\"9\"", "\"at-most\":\"99\"")),
                forgery(
                        "another seed in the study",
                        Stage.CERTIFICATES,
                        "/hidden/period",
                        "study.json",
                        text("a seed of the small", "a seed of another")),
                forgery(
                        "fewer trials in the study",
                        Stage.FIGURES,
                        "/width",
                        "study.json",
                        text("\"trials\":8", "\"trials\":7")),
                forgery(
                        "a member too many in a line",
                        Stage.SCHEMA,
                        "/zeal",
                        ALL,
                        text("\"width\":3}", "\"width\":3,\"zeal\":1}")),
                forgery("a member too few in a line", Stage.SCHEMA, "/equations", ALL, text("\"equations\":0,", "")),
                forgery(
                        "a line that is not canonical",
                        Stage.SCHEMA,
                        "canonical",
                        ALL,
                        text("\"width\":3}", "\"width\":3 }")),
                forgery("a line that is not JSON", Stage.SCHEMA, "line 1", ALL, text("{\"answer\"", "\"answer\"")),
                forgery(
                        "a word that is not hexadecimal",
                        Stage.SCHEMA,
                        "/answer/period",
                        ALL,
                        first("\"period\":\".", "\"period\":\"G")),
                forgery("a study that is not canonical", Stage.SCHEMA, "study.json", "study.json", t -> t + "\n"),
                forgery(
                        "a future format",
                        Stage.SCHEMA,
                        "format",
                        CELLS,
                        text("notchwork-summary/1", "notchwork-summary/2")),
                forgery(
                        "a figure as a fraction",
                        Stage.SCHEMA,
                        "fraction",
                        CELLS,
                        text("\"trials\":8", "\"trials\":8.0")),
                forgery(
                        "a member twice",
                        Stage.SCHEMA,
                        "second member",
                        "claims.json",
                        text("\"format\":", "\"format\":\"x\",\"format\":")));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("forgeries")
    void aForgeryWithNewDigestsIsFoundByTheStageThatShould(
            String what, Stage stage, String place, String file, UnaryOperator<String> change) throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(bundle, file, change);
        BundleFixture.reseal(bundle, Studies.small());
        Verdict verdict = BundleFixture.verify(bundle);
        StageReport first = verdict.stages().stream()
                .filter(s -> s.outcome() == StageOutcome.FAILED || s.outcome() == StageOutcome.MALFORMED)
                .findFirst()
                .orElseThrow(() -> new AssertionError(what + " was not found: " + verdict.sentence()));
        assertEquals(stage, first.stage(), first.sentence() + first.findings());
        assertEquals(stage == Stage.SCHEMA ? 12 : 10, verdict.exitCode());
        String told = first.sentence() + " "
                + first.findings().stream().map(Finding::text).toList();
        assertTrue(told.contains(place), told);
    }

    /** Without new digests every change is found by the hashes, and the file is named. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("forgeries")
    void aChangeWithoutNewDigestsIsFoundByTheHashes(
            String what, Stage stage, String place, String file, UnaryOperator<String> change) throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("changed"));
        BundleFixture.edit(bundle, file, change);
        Verdict verdict = BundleFixture.verify(bundle);
        assertNotEquals(0, verdict.exitCode());
        // A change of size is noticed even before, by the payload's size in the bag.
        StageReport first = verdict.stages().stream()
                .filter(s -> s.outcome() != StageOutcome.PASSED)
                .findFirst()
                .orElseThrow();
        assertTrue(first.stage() == Stage.HASHES || first.stage() == Stage.CONTAINER, what + first.sentence());
        if (first.stage() == Stage.HASHES) {
            assertEquals("data/" + file, first.findings().get(0).file());
        }
    }

    /** The seal is compared with the bytes, not with what a manifest says of them. */
    @Test
    void aChangedFileBreaksTheSealAsWellAsItsDigest() throws Exception {
        for (String file : List.of(CELLS, "claims.json", "cross-checks.json")) {
            Path bundle = BundleFixture.copy(good, folder.resolve("changed-" + file));
            BundleFixture.edit(bundle, file, t -> t.replaceFirst("all/5", "all/3"));
            List<StageReport> stages = BundleFixture.verify(bundle).stages();
            assertEquals(StageOutcome.FAILED, stages.get(1).outcome(), file);
            assertEquals(
                    StageOutcome.FAILED,
                    stages.get(3).outcome(),
                    file + stages.get(3).sentence());
            assertTrue(stages.get(3).findings().get(0).text().contains("/files/" + file), file);
        }
    }

    @Test
    void aForgedExhaustiveCheckIsFoundByAFullReRunOnly() throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(
                bundle,
                "cross-checks.json",
                t -> t.replaceFirst("(\"kind\":\"promise\",\"observed\":\")0 of 8", "$10 of 9"));
        BundleFixture.reseal(bundle, Studies.small());
        assertEquals(0, BundleFixture.verify(bundle).exitCode());
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        StageReport rerun = verdict.stages().get(6);
        assertEquals(StageOutcome.FAILED, rerun.outcome());
        assertTrue(
                rerun.findings().get(0).text().contains("/observed"),
                rerun.findings().get(0).text());
    }

    @Test
    void aConsistentForgeryOfACountIsFoundByAReRun() throws Exception {
        // One memory word more in one line: no figure and no certificate depends on it.
        Path bundle = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(bundle, ALL, line(10, "\"memory-words\":", 1));
        BundleFixture.reseal(bundle, Studies.small());
        assertEquals(0, BundleFixture.verify(bundle).exitCode());
        for (Rerun rerun : List.of(new Rerun.All(), new Rerun.Sample(120))) {
            Verdict verdict = BundleFixture.verify(bundle, rerun);
            assertEquals(10, verdict.exitCode());
            String text = verdict.stages().get(6).findings().get(0).text();
            assertTrue(text.startsWith("data/trials-all.jsonl, line 10, /memory-words: found "), text);
        }
    }

    @Test
    void aBundleThatReportsAFailedCheckIsANo() throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("failed"));
        String failed = "CROSS-CHECKS FAILED: 1 of 32 differ. Do not rely on these figures; see cross-checks.json.";
        BundleFixture.edit(bundle, "cross-checks.json", t -> {
            String changed =
                    t.replaceFirst("(\"kind\":\"promise\".*?)\"outcome\":\"agrees\"", "$1\"outcome\":\"differs\"");
            int checks = changed.split("\"kind\":", -1).length - 1;
            return changed.replace(
                    "All cross-checks that could be made agree.", failed.replace("of 32", "of " + checks));
        });
        BundleFixture.reseal(bundle, Studies.small());
        assertEquals(10, BundleFixture.verify(bundle).exitCode());
        assertEquals(1, BundleFixture.verify(bundle).failedChecks());
    }

    @Test
    void theExpectedSealIsComparedToTheDigitsThatAreGiven() throws Exception {
        String seal = BundleFixture.verify(good).seal().orElseThrow();
        for (String expect : List.of(
                seal,
                seal.substring(0, 40),
                seal.substring(0, 8) + " " + seal.substring(8).toUpperCase(Locale.ROOT))) {
            assertEquals(
                    0,
                    BundleFixture.verify(good, new Rerun.None(), Optional.of(expect))
                            .exitCode());
        }
        String other = (seal.charAt(0) == 'a' ? "b" : "a") + seal.substring(1);
        Verdict verdict = BundleFixture.verify(good, new Rerun.None(), Optional.of(other));
        assertEquals(10, verdict.exitCode());
        assertTrue(verdict.sentence().startsWith("NO: seal"), verdict.sentence());
    }

    @Test
    void whatIsNotUnderTheSealMayChangeWithNewManifests() throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("changed"));
        BundleFixture.edit(bundle, "environment.json", t -> t.replace("System of a test", "System of another"));
        BundleFixture.manifests(bundle);
        assertEquals(0, BundleFixture.verify(bundle).exitCode());
    }

    @Test
    void anInterruptDuringAReRunIsToldWithWhatWasDone() throws Exception {
        Path bundle = good;
        Thread.currentThread().interrupt();
        try {
            VerifyOptions options = new VerifyOptions(
                    Optional.empty(), new Rerun.All(), new Seed("the seed of a referee"), 1, Limits.USUAL);
            // The interrupt comes back when the re-run begins.
            Thread.interrupted();
            Verdict verdict = Verifier.verify(bundle, options, (stage, done, all) -> {
                if (stage == Stage.RERUN && done == 3) {
                    Thread.currentThread().interrupt();
                }
            });
            assertEquals(11, verdict.exitCode());
            assertTrue(
                    verdict.stages().get(6).sentence().startsWith("not finished: "),
                    verdict.stages().get(6).sentence());
            assertTrue(verdict.stages().get(6).sentence().endsWith("re-run, all equal"));
        } finally {
            Thread.interrupted();
        }
    }

    /** One byte of every 97th place flipped; never a yes. The whole walk is the long test below. */
    @Test
    void noSampledFlippedByteIsOverlooked() throws Exception {
        flip(BundleFixture.copy(good, folder.resolve("flipped")), 97);
    }

    /** Every byte of the smallest bundle there is. */
    @Tag("soak")
    @Test
    void noFlippedByteIsOverlooked() throws Exception {
        flip(BundleFixture.make(Studies.of(SMALLEST), folder.resolve("flipped")), 1);
    }

    private static void flip(Path bundle, int step) throws Exception {
        List<Path> files = new ArrayList<>();
        try (Stream<Path> walk = Files.walk(bundle)) {
            walk.filter(Files::isRegularFile).sorted().forEach(files::add);
        }
        int place = 0;
        for (Path file : files) {
            byte[] bytes = Files.readAllBytes(file);
            for (int i = place++ % step; i < bytes.length; i += step) {
                bytes[i] ^= 1;
                Files.write(file, bytes);
                Verdict verdict = BundleFixture.verify(bundle);
                String name = bundle.relativize(file).toString();
                assertNotEquals(0, verdict.exitCode(), name + " byte " + i);
                assertTrue(
                        verdict.stages().stream().anyMatch(s -> told(s).contains(name)),
                        () -> name + " is not named: " + verdict.sentence());
                bytes[i] ^= 1;
            }
            Files.write(file, bytes);
        }
        assertEquals(0, BundleFixture.verify(bundle).exitCode());
    }

    private static String told(StageReport report) {
        return report.sentence() + report.findings();
    }

    private static Arguments forgery(
            String what, Stage stage, String place, String file, UnaryOperator<String> change) {
        return Arguments.of(what, stage, place, file, change);
    }

    private static UnaryOperator<String> text(String from, String to) {
        return t -> t.replaceFirst(Pattern.quote(from), Matcher.quoteReplacement(to));
    }

    private static UnaryOperator<String> first(String pattern, String replacement) {
        return t -> t.replaceFirst(pattern, replacement);
    }

    /** Raises the first digit after a mark by one, around the end. */
    private static UnaryOperator<String> digit(String mark) {
        return t -> raised(t, mark, 1);
    }

    private static String raised(String text, String mark, int by) {
        int at = text.indexOf(mark) + mark.length();
        int digit = Character.digit(text.charAt(at), 16);
        int base = Character.isDigit(text.charAt(at)) && !mark.endsWith("\"") ? 10 : 8;
        char other = Character.forDigit((digit + by) % base, 16);
        return text.substring(0, at) + (other == '0' && digit != 0 ? '1' : other) + text.substring(at + 1);
    }

    private static UnaryOperator<String> line(int number, String mark, int by) {
        return lines(l -> l.set(number - 1, raised(l.get(number - 1), mark, by)));
    }

    private static UnaryOperator<String> lines(Consumer<List<String>> change) {
        return t -> {
            List<String> lines = new ArrayList<>(t.lines().toList());
            change.accept(lines);
            return String.join("\n", lines) + "\n";
        };
    }
}
