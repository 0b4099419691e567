package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.bundle.Limits;
import org.notchwork.seed.Seed;

/** A sample of trials run again: which, how many, on how many threads, and what is said of it. */
class SampleStageTest {

    @TempDir
    static Path home;

    private static Path good;

    @BeforeAll
    static void makeOneGoodBundle() throws Exception {
        good = BundleFixture.make(home.resolve("good"));
    }

    @Test
    void theSentenceIsTheSameForAnyNumberOfThreads() throws Exception {
        String one = sample(25, 1, "a seed of a referee").sentence();
        assertEquals(one, sample(25, 3, "a seed of a referee").sentence());
        assertTrue(one.contains("25 of 120 trials"), one);
        assertTrue(one.contains("referee seed \"a seed of a referee\""), one);
        assertFalse(one.contains("re-run, all equal"), one);
    }

    /** Sixteen instances are narrow enough to be searched; each is searched and counted once, however many lines. */
    @Test
    void anInstanceIsCountedOnceHoweverManyOfItsTrialsAreDrawn() throws Exception {
        String all = sample(120, 2, "a seed of a referee").sentence();
        assertTrue(all.contains("120 of 120 trials"), all);
        assertTrue(all.contains("; 16 instances agree with exhaustive search"), all);
        assertTrue(all.contains("probability 1.000"), all);
    }

    @Test
    void moreThanThereAreIsAll() throws Exception {
        assertTrue(sample(100_000, 2, "a seed of a referee").sentence().contains("120 of 120 trials"));
    }

    @Test
    void progressIsToldLineByLineUpToAll() throws Exception {
        List<Long> steps = new ArrayList<>();
        VerifyOptions options = options(500, 2, "a seed of a referee");
        Verifier.verify(good, options, (stage, done, all) -> {
            if (stage == Stage.RERUN) {
                assertEquals(120, all);
                steps.add(done);
            }
        });
        assertEquals(120, steps.size());
        assertEquals(120, steps.get(119));
    }

    @Test
    void anInterruptIsToldWithWhatWasDone() throws Exception {
        try {
            Verdict verdict = Verifier.verify(good, options(60, 1, "a seed of a referee"), (stage, done, all) -> {
                if (stage == Stage.RERUN && done == 3) {
                    Thread.currentThread().interrupt();
                }
            });
            assertEquals(11, verdict.exitCode());
            StageReport rerun = verdict.stages().get(6);
            assertEquals(StageOutcome.NOT_FINISHED, rerun.outcome());
            assertTrue(
                    rerun.sentence().matches("not finished: [0-9]{1,2} of 60 trials re-run, all equal"),
                    rerun.sentence());
            assertTrue(verdict.sentence().startsWith("NOT FINISHED"), verdict.sentence());
        } finally {
            Thread.interrupted();
        }
    }

    private static StageReport sample(int trials, int threads, String seed) throws Exception {
        Verdict verdict = Verifier.verify(good, options(trials, threads, seed), (stage, done, all) -> {});
        assertEquals(0, verdict.exitCode(), verdict.sentence());
        return verdict.stages().get(6);
    }

    private static VerifyOptions options(int trials, int threads, String seed) {
        return new VerifyOptions(Optional.empty(), new Rerun.Sample(trials), new Seed(seed), threads, Limits.USUAL);
    }
}
