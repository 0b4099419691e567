package org.notchwork.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Study;

class TrialPoolTest {

    private final Study study = Studies.small();
    private final TrialRunner runner = new TrialRunner(new SeedTree(study.seed()));

    @Test
    void recordsAreTheSameAndInTheOrderOfTheStudyWhateverTheThreads() throws InterruptedException {
        List<TrialGroup> expected = new ArrayList<>();
        study.experiments()
                .forEach(e -> e.widths().forEach(w -> {
                    for (long t = 0; t < e.trials(); t++) {
                        expected.add(runner.run(e, w, t));
                    }
                }));
        for (int threads : new int[] {1, 2, 7}) {
            assertEquals(expected, run(threads));
        }
    }

    @Test
    void everyStrategyOfATrialFacesTheSameInstance() throws InterruptedException {
        for (TrialGroup group : run(2)) {
            assertEquals(
                    1,
                    group.records().stream().map(TrialRecord::hidden).distinct().count());
        }
    }

    @Test
    void whateverAWorkerThrowsReachesTheCaller() {
        for (Throwable thrown : new Throwable[] {
            new OutOfMemoryError("pretended"), new StackOverflowError(), new IllegalStateException("pretended")
        }) {
            Throwable caught = assertThrows(
                    Throwable.class,
                    () -> new TrialPool(2)
                            .<Long, RuntimeException>run(
                                    TrialRange.of(study), (e, w, t) -> raise(thrown, t), result -> {}));
            assertSame(thrown, caught);
        }
    }

    @Test
    void anInterruptStopsThePool() {
        AtomicLong seen = new AtomicLong();
        assertThrows(InterruptedException.class, () -> {
            Thread.currentThread().interrupt();
            new TrialPool(2)
                    .<Long, RuntimeException>run(
                            TrialRange.of(study), (e, w, t) -> t, result -> seen.incrementAndGet());
        });
        assertEquals(0, seen.get());
    }

    @Test
    void whatTheSinkThrowsReachesTheCaller() {
        assertThrows(
                IllegalArgumentException.class,
                () -> new TrialPool(2).<Long, RuntimeException>run(TrialRange.of(study), (e, w, t) -> t, result -> {
                    throw new IllegalArgumentException("full");
                }));
    }

    private List<TrialGroup> run(int threads) throws InterruptedException {
        List<TrialGroup> groups = new ArrayList<>();
        new TrialPool(threads).<TrialGroup, RuntimeException>run(TrialRange.of(study), runner::run, groups::add);
        return groups;
    }

    private static long raise(Throwable thrown, long trial) {
        if (trial == 3) {
            if (thrown instanceof Error error) {
                throw error;
            }
            throw (RuntimeException) thrown;
        }
        return trial;
    }
}
