package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.classical.DifferenceCover;
import org.notchwork.strategy.classical.RandomDraws;
import org.notchwork.strategy.classical.SequentialScan;
import org.notchwork.strategy.quantum.FourierSampling;

/** The strategies there are. */
public final class Strategies {

    private static final List<Strategy> ALL =
            List.of(new SequentialScan(), new RandomDraws(), new DifferenceCover(), new FourierSampling());

    private Strategies() {}

    /** Returns the names, in the order of the documentation. */
    public static List<String> names() {
        return ALL.stream().map(Strategy::name).toList();
    }

    /** Returns the strategy of a name. */
    public static Optional<Strategy> strategy(String name) {
        return ALL.stream().filter(s -> s.name().equals(name)).findFirst();
    }
}
