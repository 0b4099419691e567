package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.strategy.StrategyForm;
import org.notchwork.strategy.classical.AffineSolve;
import org.notchwork.strategy.classical.BalanceSamplingForm;
import org.notchwork.strategy.classical.BalanceScan;
import org.notchwork.strategy.classical.CollisionCounting;
import org.notchwork.strategy.classical.CollisionSpan;
import org.notchwork.strategy.classical.CycleWalk;
import org.notchwork.strategy.classical.DataTimeTradeoffForm;
import org.notchwork.strategy.classical.DifferenceCover;
import org.notchwork.strategy.classical.DistinguishedPointsForm;
import org.notchwork.strategy.classical.RandomDraws;
import org.notchwork.strategy.classical.RandomDrawsRepeating;
import org.notchwork.strategy.classical.SequentialScan;
import org.notchwork.strategy.classical.SidonSet;
import org.notchwork.strategy.classical.UnitVectors;
import org.notchwork.strategy.quantum.FourierSampling;
import org.notchwork.strategy.quantum.FourierSamplingFixedForm;
import org.notchwork.strategy.quantum.InnerProductFourier;
import org.notchwork.strategy.quantum.PhaseQuery;
import org.notchwork.strategy.quantum.ZeroErrorFourier;

/** The strategies there are. */
public final class Strategies {

    private static final List<StrategyForm> ALL = List.of(
            StrategyForm.of(new SequentialScan()),
            StrategyForm.of(new RandomDraws()),
            StrategyForm.of(new RandomDrawsRepeating()),
            StrategyForm.of(new DifferenceCover()),
            StrategyForm.of(new SidonSet()),
            StrategyForm.of(new CycleWalk()),
            new DistinguishedPointsForm(),
            StrategyForm.of(new CollisionSpan()),
            StrategyForm.of(new UnitVectors()),
            StrategyForm.of(new BalanceScan()),
            new BalanceSamplingForm(),
            StrategyForm.of(new AffineSolve()),
            StrategyForm.of(new CollisionCounting()),
            new DataTimeTradeoffForm(),
            StrategyForm.of(new FourierSampling()),
            new FourierSamplingFixedForm(),
            StrategyForm.of(new ZeroErrorFourier()),
            StrategyForm.of(new InnerProductFourier()),
            StrategyForm.of(new PhaseQuery()));

    private Strategies() {}

    /** Returns the names, in the order of the documentation. */
    public static List<String> names() {
        return ALL.stream().map(StrategyForm::name).toList();
    }

    /** Returns the form of the strategies of a name. */
    public static Optional<StrategyForm> form(String name) {
        return ALL.stream().filter(s -> s.name().equals(name)).findFirst();
    }
}
