package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import org.notchwork.engine.Noise;
import org.notchwork.law.BalancedSampleSuccess;
import org.notchwork.law.BalancedScanLaw;
import org.notchwork.law.CycleWalkLaw;
import org.notchwork.law.DecidingRoundsLaw;
import org.notchwork.law.DecidingSuccess;
import org.notchwork.law.DifferenceCoverLaw;
import org.notchwork.law.FixedRoundsLaw;
import org.notchwork.law.FixedRoundsSuccess;
import org.notchwork.law.FourierRoundsLaw;
import org.notchwork.law.OneQueryLaw;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.RandomDrawsLaw;
import org.notchwork.law.RandomDrawsRepeatingLaw;
import org.notchwork.law.SequentialScanLaw;
import org.notchwork.law.SidonSetLaw;
import org.notchwork.law.SubspaceCollisionsLaw;
import org.notchwork.law.SubspaceRoundsLaw;
import org.notchwork.law.SuccessLaw;
import org.notchwork.law.UnitVectorsLaw;
import org.notchwork.law.ZeroErrorLaw;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.classical.BalanceSampling;
import org.notchwork.strategy.quantum.FourierSamplingFixed;
import org.notchwork.strategy.quantum.decoder.Elimination;

/** Which law belongs to a strategy on a problem. */
public final class Laws {

    private record Entry(Question question, String strategy, BiFunction<Problem, Strategy, Optional<QueryLaw>> law) {}

    private static final List<Entry> QUERIES = List.of(
            new Entry(Question.PERIOD, "sequential-scan", drawn(new SequentialScanLaw())),
            new Entry(Question.PERIOD, "random-draws", any(new RandomDrawsLaw())),
            new Entry(Question.PERIOD, "random-draws-repeating", any(new RandomDrawsRepeatingLaw())),
            new Entry(Question.PERIOD, "difference-cover", drawn(new DifferenceCoverLaw())),
            new Entry(Question.PERIOD, "sidon-set", drawn(new SidonSetLaw())),
            new Entry(
                    Question.PERIOD,
                    "cycle-walk",
                    (p, s) -> p.promise().labels() == Promise.Labels.RANDOM
                            ? Optional.of(new CycleWalkLaw())
                            : Optional.empty()),
            new Entry(Question.PERIOD, "affine-solve", any(new UnitVectorsLaw(true))),
            new Entry(Question.PERIOD, "fourier-sampling", any(new FourierRoundsLaw())),
            new Entry(Question.PERIOD, "zero-error-fourier", drawn(new ZeroErrorLaw())),
            new Entry(Question.PERIOD_OR_NONE, "fourier-sampling", drawn(new DecidingRoundsLaw())),
            new Entry(
                    Question.SUBSPACE,
                    "collision-span",
                    (p, s) -> Optional.of(new SubspaceCollisionsLaw(p.promise().dimension()))),
            new Entry(
                    Question.SUBSPACE,
                    "fourier-sampling",
                    (p, s) -> Optional.of(new SubspaceRoundsLaw(p.promise().dimension()))),
            new Entry(
                    Question.MASK,
                    "unit-vectors",
                    (p, s) -> Optional.of(new UnitVectorsLaw(p.promise().offset()))),
            new Entry(Question.MASK, "inner-product-fourier", any(new OneQueryLaw())),
            new Entry(Question.CONSTANT_OR_BALANCED, "balance-scan", drawn(new BalancedScanLaw())),
            new Entry(Question.CONSTANT_OR_BALANCED, "phase-query", any(new OneQueryLaw())));

    private Laws() {}

    /** Returns what theory says about the number of queries of a strategy on a problem; empty if it says nothing. */
    public static Optional<QueryLaw> queries(Problem problem, Strategy strategy, Noise noise) {
        if (!problem.promise().isExact() || problem.isPromiseBroken()) {
            return Optional.empty();
        }
        if (strategy instanceof FourierSamplingFixed fixed) {
            return Optional.of(
                    new FixedRoundsLaw(fixed.rounds().isExtra(), fixed.rounds().number()));
        }
        return QUERIES.stream()
                .filter(e -> noise.isNone()
                        && e.question() == problem.promise().question()
                        && e.strategy().equals(strategy.name()))
                .findFirst()
                .flatMap(e -> e.law().apply(problem, strategy));
    }

    /** Returns what theory says about the probability of a right answer; empty if it says nothing. */
    public static Optional<SuccessLaw> success(Problem problem, Strategy strategy, Noise noise) {
        if (!noise.isNone() || !problem.promise().isExact() || problem.isPromiseBroken()) {
            return Optional.empty();
        }
        if (strategy instanceof FourierSamplingFixed fixed && fixed.decoder() instanceof Elimination) {
            boolean isExtra = fixed.rounds().isExtra();
            long number = fixed.rounds().number();
            if (problem.promise().question() == Question.PERIOD_OR_NONE) {
                return isDrawn(problem) ? Optional.of(new DecidingSuccess(isExtra, number)) : Optional.empty();
            }
            return Optional.of(new FixedRoundsSuccess(isExtra, number, 1));
        }
        if (strategy instanceof BalanceSampling sampling && isBalancedDrawn(problem)) {
            return Optional.of(new BalancedSampleSuccess(sampling.queries()));
        }
        return Optional.empty();
    }

    /** A given table is one function; what it hides is not drawn. */
    private static boolean isDrawn(Problem problem) {
        return problem.attachments().isEmpty();
    }

    private static boolean isBalancedDrawn(Problem problem) {
        return problem.promise().question() == Question.CONSTANT_OR_BALANCED && isDrawn(problem);
    }

    /** A law that holds for any function that keeps the promise. */
    private static BiFunction<Problem, Strategy, Optional<QueryLaw>> any(QueryLaw law) {
        return (problem, strategy) -> Optional.of(law);
    }

    /** A law that takes what is hidden to be drawn as the family says, which that of a given table is not. */
    private static BiFunction<Problem, Strategy, Optional<QueryLaw>> drawn(QueryLaw law) {
        return (problem, strategy) -> isDrawn(problem) ? Optional.of(law) : Optional.empty();
    }
}
