package org.notchwork.check;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.BinomialTail;
import org.notchwork.figure.CellFigures;
import org.notchwork.law.SamplingBound;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Question;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/**
 * How often a fixed number of samples must name the period at least, where other inputs share values by accident: for each
 * instance 1 − ½ Σ_t ((1 + N(t)/2^n)/2)^m over t other than 0 and the period (M. Kaplan, G. Leurent, A. Leverrier, M.
 * Naya-Plasencia, CRYPTO 2016, theorem 1, in its sharper form), at least 0; averaged over the instances.
 */
final class SamplingBounds {

    private static final BigDecimal LEVEL = new BigDecimal("0.001");

    private SamplingBounds() {}

    /** Returns the strategies of an experiment that such a bound is about. */
    static List<StrategyChoice> choices(Experiment experiment) {
        boolean isNear = experiment.problem().promise().question() == Question.PERIOD
                && !experiment.problem().promise().isExact();
        return experiment.strategies().stream()
                .filter(c -> isNear
                        && c.noise().isNone()
                        && c.strategy() instanceof QuantumStrategy quantum
                        && quantum.samples(1).isPresent())
                .toList();
    }

    /** Returns the bound of each such strategy on one instance, by label. */
    static Map<String, BigDecimal> of(Experiment experiment, Instance instance) {
        Map<String, BigDecimal> bounds = new TreeMap<>();
        for (StrategyChoice choice : choices(experiment)) {
            int width = instance.function().width();
            int samples = ((QuantumStrategy) choice.strategy()).samples(width).orElseThrow();
            int period = (int) ((Answer.Period) instance.hidden()).s().bits();
            BigDecimal failure = new SamplingBound()
                    .sharper(equalValues(instance.function()), period, samples)
                    .value();
            // A later sum must not depend on how trials were spread, so each is a whole number of steps.
            bounds.put(
                    choice.label(),
                    BigDecimal.ONE.subtract(failure).max(BigDecimal.ZERO).setScale(30, RoundingMode.FLOOR));
        }
        return bounds;
    }

    private static List<Integer> equalValues(BitFunction function) {
        List<Integer> counts = new ArrayList<>();
        int size = 1 << function.width();
        for (int t = 0; t < size; t++) {
            int equal = 0;
            for (int x = 0; x < size; x++) {
                equal += function.at(x) == function.at(x ^ t) ? 1 : 0;
            }
            counts.add(equal);
        }
        return counts;
    }

    /** Returns the check of one cell. */
    static CrossCheck check(CellFigures figures, InstanceTally tally) {
        long instances = tally.promise().compared();
        BigDecimal sum = tally.samplingBounds().getOrDefault(figures.cell().label(), BigDecimal.ZERO);
        BigDecimal bound =
                instances == 0 ? BigDecimal.ZERO : sum.divide(BigDecimal.valueOf(instances), Decimals.CONTEXT);
        BigDecimal p = BinomialTail.atMost(figures.solved(), figures.trials(), bound);
        boolean comparable = instances > 0 && figures.censored() == 0;
        CheckOutcome outcome = p.compareTo(LEVEL) < 0 ? CheckOutcome.DIFFERS : CheckOutcome.AGREES;
        return new CrossCheck(
                CheckKind.SAMPLING_BOUND,
                figures.cell().id(),
                instances,
                "success rate at least " + Decimals.text(bound) + ", the bound averaged over the instances",
                figures.solved() + " of " + figures.trials() + ", p = " + Decimals.text(p),
                Optional.empty(),
                comparable ? outcome : CheckOutcome.NOT_COMPARABLE);
    }
}
