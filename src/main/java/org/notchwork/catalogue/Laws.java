package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.law.DifferenceCoverLaw;
import org.notchwork.law.FourierRoundsLaw;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.RandomDrawsLaw;
import org.notchwork.law.SequentialScanLaw;

/** Which law belongs to a strategy on a problem. */
public final class Laws {

    private record Entry(String problem, String strategy, QueryLaw law) {}

    private static final List<Entry> ALL = List.of(
            new Entry("xor-period", "sequential-scan", new SequentialScanLaw()),
            new Entry("xor-period", "random-draws", new RandomDrawsLaw()),
            new Entry("xor-period", "difference-cover", new DifferenceCoverLaw()),
            new Entry("xor-period", "fourier-sampling", new FourierRoundsLaw()));

    private Laws() {}

    /** Returns the law of a strategy on a problem, empty if theory gives none. */
    public static Optional<QueryLaw> law(String problemKind, String strategyName) {
        return ALL.stream()
                .filter(e -> e.problem().equals(problemKind) && e.strategy().equals(strategyName))
                .map(Entry::law)
                .findFirst();
    }
}
