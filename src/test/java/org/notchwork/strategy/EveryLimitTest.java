package org.notchwork.strategy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.engine.Noise;
import org.notchwork.engine.weights.WeightsEngine;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.affine.AffinePeriod;
import org.notchwork.problem.balance.ConstantOrBalanced;
import org.notchwork.problem.cipher.EvenMansour;
import org.notchwork.problem.cipher.FeistelThree;
import org.notchwork.problem.mask.InnerProduct;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.problem.subspace.HiddenSubspace;
import org.notchwork.strategy.classical.AffineSolve;
import org.notchwork.strategy.classical.BalanceSampling;
import org.notchwork.strategy.classical.BalanceScan;
import org.notchwork.strategy.classical.CollisionCounting;
import org.notchwork.strategy.classical.CollisionSpan;
import org.notchwork.strategy.classical.CycleWalk;
import org.notchwork.strategy.classical.DataTimeTradeoff;
import org.notchwork.strategy.classical.DifferenceCover;
import org.notchwork.strategy.classical.DistinguishedPoints;
import org.notchwork.strategy.classical.RandomDraws;
import org.notchwork.strategy.classical.RandomDrawsRepeating;
import org.notchwork.strategy.classical.SequentialScan;
import org.notchwork.strategy.classical.SidonSet;
import org.notchwork.strategy.classical.UnitVectors;
import org.notchwork.strategy.quantum.FourierSampling;
import org.notchwork.strategy.quantum.FourierSamplingFixed;
import org.notchwork.strategy.quantum.InnerProductFourier;
import org.notchwork.strategy.quantum.PhaseQuery;
import org.notchwork.strategy.quantum.Rounds;
import org.notchwork.strategy.quantum.ZeroErrorFourier;
import org.notchwork.strategy.quantum.decoder.Elimination;
import org.notchwork.support.Facing;
import org.notchwork.support.Streams;

/** Under every limit below what it needs a strategy ends censored, never with another answer and never beyond the limit. */
class EveryLimitTest {

    private static final int MOST_TRIED = 120;

    static Stream<Arguments> pairs() {
        XorPeriod period = new XorPeriod(Labelling.TABLE);
        PeriodOrNone orNone = new PeriodOrNone(Labelling.TABLE);
        return Stream.of(
                pair(period, new RandomDrawsRepeating()),
                pair(period, new SidonSet()),
                pair(period, new CycleWalk()),
                pair(period, new DistinguishedPoints(1, 8)),
                pair(period, new CollisionCounting()),
                pair(orNone, new SequentialScan()),
                pair(orNone, new RandomDraws()),
                pair(orNone, new RandomDrawsRepeating()),
                pair(orNone, new DifferenceCover()),
                pair(orNone, new SidonSet()),
                pair(orNone, new CollisionCounting()),
                pair(new HiddenSubspace(2), new CollisionSpan()),
                pair(new InnerProduct(true), new UnitVectors()),
                pair(new ConstantOrBalanced(), new BalanceScan()),
                pair(new ConstantOrBalanced(), new BalanceSampling(4)),
                pair(new AffinePeriod(), new AffineSolve()),
                pair(new EvenMansour(), new CollisionCounting()),
                pair(new EvenMansour(), new DataTimeTradeoff(Optional.of(1))),
                pair(new FeistelThree(true), new CollisionCounting()),
                pair(period, new FourierSampling()),
                pair(orNone, new FourierSampling()),
                pair(new HiddenSubspace(2), new FourierSampling()),
                pair(new EvenMansour(), new FourierSampling()),
                pair(period, new ZeroErrorFourier()),
                pair(period, new FourierSamplingFixed(new Rounds(true, 3), new Elimination())),
                pair(orNone, new FourierSamplingFixed(new Rounds(true, 3), new Elimination())),
                pair(new InnerProduct(true), new InnerProductFourier()),
                pair(new ConstantOrBalanced(), new PhaseQuery()));
    }

    private static Arguments pair(Problem problem, Strategy strategy) {
        return Arguments.of(problem, strategy);
    }

    private static Facing face(Problem problem, Strategy strategy, Instance instance, long limit, long number) {
        return strategy instanceof QuantumStrategy quantum
                ? Facing.quantum(
                        quantum,
                        new WeightsEngine(),
                        Noise.NONE,
                        instance,
                        problem.promise(),
                        limit,
                        Streams.numbered("limit", number))
                : Facing.classical(
                        (ClassicalStrategy) strategy,
                        instance,
                        problem.promise(),
                        limit,
                        Streams.numbered("limit", number));
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void belowTheNeedAStrategyIsCensored(Problem problem, Strategy strategy) {
        for (int width = 2; width <= 4; width++) {
            if (width < problem.leastWidth() || strategy.refusal(problem, width).isPresent()) {
                continue;
            }
            for (long number = 0; number < 25; number++) {
                Instance instance = problem.draw(width, Streams.numbered("every limit " + width, number));
                Facing free = face(problem, strategy, instance, 1L << 20, number);
                long need = free.counts().total();
                for (long limit = 1; limit < Math.min(need, MOST_TRIED); limit++) {
                    Facing cut = face(problem, strategy, instance, limit, number);
                    assertInstanceOf(Attempt.Censored.class, cut.attempt(), "width " + width + ", limit " + limit);
                    assertTrue(cut.counts().total() <= limit);
                }
                assertEquals(free, face(problem, strategy, instance, need, number), "with all that it needs");
            }
        }
    }
}
