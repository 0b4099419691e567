package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.notchwork.Studies;
import org.notchwork.bundle.Limits;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.problem.Counts;
import org.notchwork.seed.Seed;
import org.notchwork.trial.TrialRecord;

/** Forgeries that agree with themselves everywhere: what finds them, and what cannot. */
class ForgedRunTest {

    private static final int LINES = 120;

    @TempDir
    static Path home;

    private static Path good;
    /** One quantum call fewer in one trial of {@code fourier-sampling@fibre}, everything else made anew. */
    private static Path forged;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeAGoodAndAForgedBundle() throws Exception {
        good = BundleFixture.make(home.resolve("good"));
        forged = BundleFixture.copy(good, home.resolve("forged"));
        Forger.forge(forged, Studies.small(), "all", 59, calls(0, 1));
    }

    @Test
    void anUnchangedRecordMadeAnewIsTheSameBundle() throws Exception {
        Path same = BundleFixture.copy(good, folder.resolve("same"));
        Forger.forge(same, Studies.small(), "all", 59, UnaryOperator.identity());
        assertEquals(
                BundleFixture.verify(good).seal(),
                BundleFixture.verify(same, new Rerun.All()).seal());
        assertEquals(0, BundleFixture.verify(same, new Rerun.All()).exitCode());
    }

    /** Without a re-run nothing can see it, and the stages say so. */
    @Test
    void aCountForgedThroughoutPassesWithoutAReRun() throws Exception {
        Verdict verdict = BundleFixture.verify(forged);
        assertEquals(0, verdict.exitCode(), verdict.sentence());
        assertTrue(Stage.CERTIFICATES.doesNotProve().contains("re-run"));
        assertTrue(Stage.FIGURES.doesNotProve().contains("re-run"));
        assertTrue(verdict.sentence().contains("no trial was run again"), verdict.sentence());
    }

    /** Only the seal from elsewhere tells it from the author's own bundle. */
    @Test
    void aCountForgedThroughoutDoesNotHaveTheExpectedSeal() throws Exception {
        Optional<String> seal = BundleFixture.verify(good).seal();
        Verdict verdict = BundleFixture.verify(forged, new Rerun.None(), seal);
        assertEquals(10, verdict.exitCode());
        assertEquals(StageOutcome.FAILED, verdict.stages().get(3).outcome());
    }

    @Test
    void aCountForgedThroughoutIsFoundByAFullReRunAndNamed() throws Exception {
        Verdict verdict = BundleFixture.verify(forged, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        String told = verdict.stages().get(6).findings().get(0).text();
        assertTrue(told.startsWith("data/trials-all.jsonl, line 59, /calls/quantum: found "), told);
    }

    /**
     * One line of 120 is forged, 30 are drawn: the law says that one sample in four finds it. Of 60 samples from
     * seeds fixed here between 5 and 25 must (mean 15, standard deviation 3.4), and a sample finds it exactly if it
     * holds it.
     */
    @Test
    void aSampleFindsAForgedTrialAsOftenAsTheLawSays() throws Exception {
        int found = 0;
        for (int i = 0; i < 60; i++) {
            VerifyOptions options = new VerifyOptions(
                    Optional.empty(), new Rerun.Sample(30), new Seed("a referee's seed, number " + i), 1, Limits.USUAL);
            Verdict verdict = Verifier.verify(forged, options, (stage, done, all) -> {});
            StageReport rerun = verdict.stages().get(6);
            if (rerun.outcome() == StageOutcome.FAILED) {
                assertEquals(59, rerun.findings().get(0).line().orElseThrow());
                found++;
            } else {
                assertTrue(rerun.sentence().contains("30 of " + LINES + " trials"), rerun.sentence());
            }
        }
        assertTrue(found >= 5 && found <= 25, found + " of 60");
    }

    /** The closed form fixes a deterministic strategy's count, so the forger's own cross-checks give it away. */
    @Test
    void aDeterministicCountForgedThroughoutFailsItsOwnCrossCheck() throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("forged"));
        Forger.forge(bundle, Studies.small(), "all", 1, calls(1, 0));
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(10, verdict.exitCode());
        assertTrue(verdict.failedChecks() >= 1, verdict.sentence());
        assertTrue(verdict.sentence().contains("the bundle itself reports"), verdict.sentence());
        for (StageReport report : verdict.stages().subList(0, 6)) {
            assertEquals(StageOutcome.PASSED, report.outcome(), report.sentence());
        }
    }

    /** A check that is left out, with all that counts it made anew, is missed by name and without a re-run. */
    @ParameterizedTest
    @EnumSource(
            value = CheckKind.class,
            names = {"PROMISE", "EXHAUSTIVE_ANSWER", "ALL_SECRETS", "ENGINES", "CLOSED_FORM", "THEORY_MEAN"})
    void aCrossCheckLeftOutIsMissedWithoutAReRun(CheckKind kind) throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("left-out"));
        Forger.checks(
                bundle,
                Studies.small(),
                checks -> checks.stream().filter(c -> c.kind() != kind).toList());
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(10, verdict.exitCode(), verdict.sentence());
        StageReport figures = verdict.stages().get(5);
        assertEquals(StageOutcome.FAILED, figures.outcome());
        Finding first = figures.findings().get(0);
        assertEquals("data/cross-checks.json", first.file());
        if (kind.needsInstances()) {
            assertTrue(first.text().contains(kind.word() + " of "), first.text());
        }
    }

    /** An outcome turned, with all that counts it made anew: from the lines if they are enough, else by a re-run. */
    @ParameterizedTest
    @EnumSource(
            value = CheckKind.class,
            names = {"PROMISE", "EXHAUSTIVE_ANSWER", "ALL_SECRETS", "ENGINES", "CLOSED_FORM", "THEORY_MEAN"})
    void aTurnedOutcomeOfACrossCheckIsFoundAndNamed(CheckKind kind) throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve("turned"));
        Forger.checks(
                bundle,
                Studies.small(),
                checks -> checks.stream()
                        .map(c -> c.kind() == kind && c.outcome() == CheckOutcome.AGREES ? turned(c) : c)
                        .toList());
        assertEquals(
                kind.needsInstances() ? 0 : 10, BundleFixture.verify(bundle).exitCode());
        Verdict verdict = BundleFixture.verify(bundle, new Rerun.All());
        assertEquals(10, verdict.exitCode());
        Finding first =
                verdict.stages().get(kind.needsInstances() ? 6 : 5).findings().get(0);
        assertTrue(first.pointer().matches("/checks/[0-9]+/outcome"), first.text());
        assertEquals("\"not-comparable\"", first.written());
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

    private static UnaryOperator<TrialRecord> calls(int fewerClassical, int fewerQuantum) {
        return r -> new TrialRecord(
                r.cell(),
                r.trial(),
                r.hidden(),
                r.outcome(),
                r.answer(),
                r.certificate(),
                new Counts(
                        r.counts().classical() - fewerClassical,
                        r.counts().quantum() - fewerQuantum,
                        r.counts().inverse(),
                        r.counts().confirming()),
                r.usage());
    }

    @Test
    void theForgedLineIsOneOfTheFibreEngine() throws Exception {
        TrialRecord record =
                Forger.records(good, Studies.small().experiments().get(0)).get(58);
        assertEquals("all/5/fourier-sampling@fibre", record.cell().id());
    }
}
