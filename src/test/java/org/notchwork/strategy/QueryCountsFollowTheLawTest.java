package org.notchwork.strategy;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.law.FourierRoundsLaw;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Studies;
import org.notchwork.trial.TrialGroup;

class QueryCountsFollowTheLawTest {

    private static final int TRIALS = 5_000;

    private static long[] counts(Labelling labelling, int width, StrategyChoice choice, int size) {
        Experiment experiment = new Experiment(
                "main", new XorPeriod(labelling), List.of(width), List.of(choice), TRIALS, 1L << (width + 7));
        long[] counts = new long[size];
        for (TrialGroup group : Studies.run(experiment)) {
            long queries = group.records().get(0).counts().queries();
            counts[(int) Math.min(size - 1, queries)]++;
        }
        return counts;
    }

    /** P(Q = m + 1 | Q > m) = m / (2^n − m), the law of the first matching pair. */
    @ParameterizedTest
    @CsvSource({"TABLE, 4", "TABLE, 6", "TABLE, 8", "PERMUTATION, 4", "PERMUTATION, 6", "PERMUTATION, 8"})
    void randomDrawsCollideAsTheLawSaysOnTablesAndPermutations(Labelling labelling, int width) {
        int size = (1 << (width - 1)) + 2;
        double[] weights = new double[size];
        double more = 1;
        for (int m = 0; m < size - 1; m++) {
            double next = (double) m / ((1 << width) - m);
            weights[m + 1] = more * next;
            more *= 1 - next;
        }
        ChiSquared.of(counts(labelling, width, Studies.classical("random-draws"), size), weights)
                .assertFits();
    }

    @ParameterizedTest
    @CsvSource({"2", "4", "6"})
    void fourierRoundsFollowTheLawWithEveryEngine(int width) {
        int size = width + 25;
        double[] weights = new double[size];
        FourierRoundsLaw law = new FourierRoundsLaw();
        double before = 0;
        for (int m = 0; m < size - 1; m++) {
            double within = law.within(width, m).orElseThrow().value().doubleValue();
            weights[m] = within - before;
            before = within;
        }
        weights[size - 1] = 1 - before;
        Studies.allChoices().stream()
                .filter(c -> c.engine().isPresent())
                .forEach(c -> ChiSquared.of(counts(Labelling.TABLE, width, c, size), weights)
                        .assertFits());
    }
}
