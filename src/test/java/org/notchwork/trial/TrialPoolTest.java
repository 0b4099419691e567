package org.notchwork.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.study.Experiment;
import org.notchwork.support.Studies;

@Timeout(60)
class TrialPoolTest {

    private final Experiment experiment = Studies.experiment(List.of(3, 9, 10), Studies.allChoices(), 70, 1000);
    private final List<TrialRange> ranges = TrialRange.of(Studies.study(experiment));

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7})
    void resultsAndTheirOrderDoNotDependOnTheThreads(int threads) throws InterruptedException {
        TrialRunner runner = Studies.runner();
        List<TrialGroup> groups = new ArrayList<>();
        Thread caller = Thread.currentThread();
        new TrialPool(threads).run(ranges, runner::run, group -> {
            assertSame(caller, Thread.currentThread());
            groups.add(group);
        });
        assertEquals(Studies.run(experiment), groups);
    }

    @Test
    void rangesHoldEveryTrialOnceInTheOrderOfTheStudy() {
        List<String> trials = new ArrayList<>();
        for (TrialRange range : ranges) {
            for (long trial = range.from(); trial < range.to(); trial++) {
                trials.add(range.width() + " " + trial);
            }
        }
        List<String> expected = new ArrayList<>();
        for (int width : List.of(3, 9, 10)) {
            for (int trial = 0; trial < 70; trial++) {
                expected.add(width + " " + trial);
            }
        }
        assertEquals(expected, trials);
        assertThrows(IllegalArgumentException.class, () -> new TrialRange(experiment, 3, 5, 5));
        assertThrows(IllegalArgumentException.class, () -> new TrialRange(experiment, 3, -1, 5));
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7})
    void anErrorOfAWorkerReachesTheCaller(int threads) {
        AssertionError thrown = new AssertionError("of a worker");
        List<Long> taken = new ArrayList<>();
        AssertionError caught = assertThrows(
                AssertionError.class,
                () -> new TrialPool(threads)
                        .run(
                                ranges,
                                (e, width, trial) -> {
                                    if (width == 9 && trial == 40) {
                                        throw thrown;
                                    }
                                    return trial;
                                },
                                taken::add));
        assertSame(thrown, caught);
        assertTrue(taken.size() >= 70 && taken.size() <= 110, () -> taken.size() + " taken before");
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 7})
    void anExceptionOfAWorkerReachesTheCaller(int threads) {
        IllegalStateException thrown = new IllegalStateException("of a worker");
        IllegalStateException caught = assertThrows(
                IllegalStateException.class,
                () -> new TrialPool(threads)
                        .run(
                                ranges,
                                (e, width, trial) -> {
                                    if (trial == 69) {
                                        throw thrown;
                                    }
                                    return trial;
                                },
                                result -> assertTrue(result < 69)));
        assertSame(thrown, caught);
    }

    @Test
    void anExceptionOfTheSinkStopsTheTrials() {
        IOException thrown = new IOException("of the sink");
        AtomicLong done = new AtomicLong();
        Experiment long64 = Studies.experiment(List.of(14), Studies.allChoices(), 5000, 1000);
        IOException caught = assertThrows(
                IOException.class,
                () -> new TrialPool(2)
                        .run(TrialRange.of(Studies.study(long64)), (e, w, t) -> done.incrementAndGet(), r -> {
                            throw thrown;
                        }));
        assertSame(thrown, caught);
        assertTrue(done.get() < 5000, () -> done + " trials done");
    }

    @Test
    void anInterruptedCallerStopsItsWorkers() throws InterruptedException {
        CountDownLatch working = new CountDownLatch(1);
        CountDownLatch stopped = new CountDownLatch(1);
        AtomicReference<Throwable> caught = new AtomicReference<>();
        Thread caller = new Thread(() -> {
            try {
                new TrialPool(1).run(ranges, (e, width, trial) -> waitForEver(working, stopped), taken -> {});
            } catch (InterruptedException e) {
                caught.set(e);
            }
        });
        caller.start();
        assertTrue(working.await(30, TimeUnit.SECONDS));
        caller.interrupt();
        caller.join(30_000);
        assertFalse(caller.isAlive());
        assertTrue(caught.get() instanceof InterruptedException);
        assertTrue(stopped.await(30, TimeUnit.SECONDS), "the worker was interrupted");
    }

    private static long waitForEver(CountDownLatch working, CountDownLatch stopped) {
        working.countDown();
        try {
            new CountDownLatch(1).await();
            return 0;
        } catch (InterruptedException e) {
            stopped.countDown();
            throw new IllegalStateException(e);
        }
    }

    @Test
    void aPoolHasAtLeastOneThread() {
        assertThrows(IllegalArgumentException.class, () -> new TrialPool(0));
    }
}
