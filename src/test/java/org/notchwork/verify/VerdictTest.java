package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonText;

/** How stages add up to a verdict, and its form. */
class VerdictTest {

    @TempDir
    static Path home;

    private static Path good;
    private static Schema schema;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeABundleAndReadTheSchema() throws IOException, InterruptedException {
        good = BundleFixture.make(home.resolve("good"));
        schema = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(Files.readString(Path.of("schemas/verdict.schema.json")), InputFormat.JSON);
    }

    /** P passed, F failed, M malformed, - not done, ~ not finished; then failed checks, exit code and first word. */
    @ParameterizedTest
    @CsvSource({
        "PPPPPPP, 0, 0, YES",
        "PPPPPP-, 0, 0, YES",
        "PPPPPP~, 0, 11, NOT FINISHED",
        "PPPPPPF, 0, 10, NO: re-run",
        "PPPPFPP, 0, 10, NO: certificates",
        "PFPFPPP, 0, 10, NO: hashes",
        "PPPPPF~, 0, 10, NO: figures",
        "PPPPPPP, 2, 10, NO: intact",
        "PPPPPP~, 1, 10, NO: intact",
        "M------, 0, 12, MALFORMED: container",
        "PFM----, 0, 12, MALFORMED: schema"
    })
    void theWorstStageDecides(String outcomes, long failedChecks, int exit, String begins) {
        List<StageReport> reports = new ArrayList<>();
        for (Stage stage : Stage.values()) {
            reports.add(StageReport.of(
                    stage,
                    outcome(reports.size() < outcomes.length() ? outcomes.charAt(reports.size()) : '-'),
                    "a sentence"));
        }
        Verdict verdict = new Verdict(reports, Optional.empty(), failedChecks, List.of());
        assertEquals(exit, verdict.exitCode());
        assertTrue(verdict.sentence().startsWith(begins), verdict.sentence());
        assertEquals(List.of(), faults(verdict));
    }

    @Test
    void verdictsOfRealBundlesFitTheSchema() throws Exception {
        Path forged = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(forged, "study.json", t -> t.replace("a seed of the small", "a seed of another"));
        BundleFixture.reseal(forged, Studies.small());
        Path broken = BundleFixture.copy(good, folder.resolve("broken"));
        BundleFixture.edit(broken, "claims.json", t -> "\u001b" + t);
        BundleFixture.manifests(broken);
        List<Verdict> verdicts = List.of(
                BundleFixture.verify(good),
                BundleFixture.verify(good, new Rerun.Sample(5)),
                BundleFixture.verify(good, new Rerun.All()),
                BundleFixture.verify(forged, new Rerun.Sample(5)),
                BundleFixture.verify(broken),
                BundleFixture.verify(folder.resolve("nowhere")));
        assertEquals(
                List.of(0, 0, 0, 10, 12, 12),
                verdicts.stream().map(Verdict::exitCode).toList());
        for (Verdict verdict : verdicts) {
            assertEquals(List.of(), faults(verdict), verdict.sentence());
            assertEquals(Stage.values().length, verdict.stages().size());
        }
    }

    @Test
    void theSchemaIsNotBlind() throws Exception {
        String text = CanonicalJson.text(BundleFixture.verify(good).json());
        for (String[] change : new String[][] {
            {"\"exit-code\":0", "\"exit-code\":1"},
            {"notchwork-verdict/1", "notchwork-verdict/2"},
            {"\"outcome\":\"passed\"", "\"outcome\":\"verified\""},
            {"\"stage\":\"seal\"", "\"stage\":\"stamp\""},
            {"\"verdict\":", "\"judgement\":"},
            {"\"differences\":0", "\"differences\":-1"}
        }) {
            assertTrue(text.contains(change[0]), text);
            assertFalse(faults(text.replace(change[0], change[1])).isEmpty(), change[1]);
        }
    }

    @Test
    void manyDifferencesAreCountedAndTwentyTold() throws Exception {
        Path forged = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(forged, "study.json", t -> t.replace("a seed of the small", "a seed of another"));
        BundleFixture.reseal(forged, Studies.small());
        StageReport report = BundleFixture.verify(forged).stages().get(4);
        assertEquals(20, report.findings().size());
        assertTrue(report.differences() > 50, "" + report.differences());
    }

    /** What nobody looked into is named by the verdict itself, on the screen and in JSON. */
    @Test
    void filesThatAreNotUnderTheSealAreNamed() throws Exception {
        Path changed = BundleFixture.copy(good, folder.resolve("changed"));
        Files.writeString(changed.resolve("data/report.pdf"), "%PDF-1.4 a report of somebody else");
        BundleFixture.edit(changed, "environment.json", t -> t.replace("System of a test", "System of another"));
        Verdict before = BundleFixture.verify(changed);
        assertEquals(12, before.exitCode(), "the payload's size in the bag tells already");
        BundleFixture.manifests(changed);
        Verdict verdict = BundleFixture.verify(changed, new Rerun.All());
        assertEquals(0, verdict.exitCode());
        assertEquals(List.of("README.txt", "environment.json", "report.pdf", "schemas.json"), verdict.notCovered());
        assertTrue(CanonicalJson.text(verdict.json()).contains("\"report.pdf\""));
    }

    @Test
    void aReportOfTheSameSizeIsFoundByItsDigestAndNamed() throws Exception {
        Path changed = BundleFixture.copy(good, folder.resolve("changed"));
        Path report = changed.resolve("data/report.pdf");
        byte[] bytes = Files.readAllBytes(report);
        bytes[bytes.length / 2] ^= 1;
        Files.write(report, bytes);
        Verdict verdict = BundleFixture.verify(changed);
        assertEquals(10, verdict.exitCode());
        StageReport hashes = verdict.stages().get(1);
        assertEquals(StageOutcome.FAILED, hashes.outcome());
        assertEquals("data/report.pdf", hashes.findings().get(0).file());
        assertEquals(StageOutcome.PASSED, verdict.stages().get(3).outcome(), "the seal is not over the report");
    }

    /** A right-to-left override in a sealed text reaches neither the screen nor the JSON as itself. */
    @Test
    void textOfABundleIsEscapedBeforeItIsTold() throws Exception {
        Path forged = BundleFixture.copy(good, folder.resolve("forged"));
        BundleFixture.edit(forged, "claims.json", t -> t.replaceFirst("\"reason\":\"", "\"reason\":\"\u202e"));
        BundleFixture.reseal(forged, Studies.small());
        Verdict verdict = BundleFixture.verify(forged);
        assertEquals(10, verdict.exitCode());
        String told = verdict.stages().get(5).findings().get(0).text();
        assertTrue(told.contains("\\u{202e}"), told);
        assertFalse(CanonicalJson.text(verdict.json()).contains("\u202e"));
    }

    /** The words that belong to people, or that would claim more than was done. */
    @Test
    void noWordClaimsMoreThanWasDone() throws Exception {
        for (Rerun rerun : List.of(new Rerun.None(), new Rerun.Sample(9), new Rerun.All())) {
            String text =
                    CanonicalJson.text(BundleFixture.verify(good, rerun).json()).toLowerCase(Locale.ROOT);
            for (String word : List.of("reproduced", "replicated", "verified", "reproducible", "trusted")) {
                assertFalse(text.contains(word), word + " in " + text);
            }
            assertTrue(text.contains("intact"));
        }
    }

    @Test
    void theSealOfTheJsonIsThatOfTheBundle() throws Exception {
        Verdict verdict = BundleFixture.verify(good);
        assertEquals(
                Optional.of(new JsonText(verdict.seal().orElseThrow())),
                verdict.json().member("seal"));
        assertEquals(Optional.of(new JsonInteger(0)), verdict.json().member("exit-code"));
    }

    private static StageOutcome outcome(char letter) {
        return switch (letter) {
            case 'P' -> StageOutcome.PASSED;
            case 'F' -> StageOutcome.FAILED;
            case 'M' -> StageOutcome.MALFORMED;
            case '-' -> StageOutcome.NOT_DONE;
            case '~' -> StageOutcome.NOT_FINISHED;
            default -> throw new IllegalArgumentException("" + letter);
        };
    }

    private static List<String> faults(Verdict verdict) {
        return faults(CanonicalJson.text(verdict.json()));
    }

    private static List<String> faults(String document) {
        return schema.validate(document, InputFormat.JSON).stream()
                .map(e -> e.getInstanceLocation() + ": " + e.getMessage())
                .toList();
    }
}
