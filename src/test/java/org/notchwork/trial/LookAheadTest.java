package org.notchwork.trial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.study.Experiment;

/** Workers do not run away from a slow sink, so memory does not grow with the number of trials. */
class LookAheadTest {

    private static final int RANGE = 10;
    private static final int RANGES_AHEAD = 4;

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5})
    void onlyAFewRangesAThreadAreStartedBeforeTheSinkHasTakenTheFirst(int threads) throws InterruptedException {
        AtomicLong started = new AtomicLong();
        List<Long> taken = new ArrayList<>();
        new TrialPool(threads)
                .<Long, InterruptedException>run(
                        ranges(200),
                        (e, w, t) -> {
                            started.incrementAndGet();
                            return t;
                        },
                        trial -> {
                            if (taken.size() % 100 == 0) {
                                // Long enough for idle workers to start whatever they may.
                                Thread.sleep(20);
                            }
                            taken.add(trial);
                            long ahead = started.get() - taken.size();
                            assertTrue(ahead <= (long) RANGE * RANGES_AHEAD * threads, ahead + " trials ahead");
                        });
        assertEquals(2000, taken.size());
        assertEquals(taken.stream().sorted().toList(), taken);
    }

    private static List<TrialRange> ranges(int count) {
        Experiment experiment = Studies.small().experiments().get(0);
        List<TrialRange> ranges = new ArrayList<>();
        for (long i = 0; i < count; i++) {
            ranges.add(new TrialRange(experiment, 3, i * RANGE, (i + 1) * RANGE));
        }
        return ranges;
    }
}
