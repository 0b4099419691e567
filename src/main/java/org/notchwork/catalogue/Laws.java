package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import org.notchwork.engine.Noise;
import org.notchwork.law.DifferenceCoverLaw;
import org.notchwork.law.FourierRoundsLaw;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.RandomDrawsLaw;
import org.notchwork.law.SequentialScanLaw;
import org.notchwork.law.SuccessLaw;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.strategy.Strategy;

/** Which law belongs to a strategy on a problem. */
public final class Laws {

    private record Entry(Question question, String strategy, BiFunction<Problem, Strategy, Optional<QueryLaw>> law) {}

    private static final List<Entry> QUERIES = List.of(
            new Entry(Question.PERIOD, "sequential-scan", drawn(new SequentialScanLaw())),
            new Entry(Question.PERIOD, "random-draws", any(new RandomDrawsLaw())),
            new Entry(Question.PERIOD, "difference-cover", drawn(new DifferenceCoverLaw())),
            new Entry(Question.PERIOD, "fourier-sampling", any(new FourierRoundsLaw())));

    private Laws() {}

    /** Returns what theory says about the number of queries of a strategy on a problem; empty if it says nothing. */
    public static Optional<QueryLaw> queries(Problem problem, Strategy strategy, Noise noise) {
        if (!noise.isNone() || !problem.promise().isExact() || problem.isPromiseBroken()) {
            return Optional.empty();
        }
        return QUERIES.stream()
                .filter(e -> e.question() == problem.promise().question()
                        && e.strategy().equals(strategy.name()))
                .findFirst()
                .flatMap(e -> e.law().apply(problem, strategy));
    }

    /** Returns what theory says about the probability of a right answer; empty if it says nothing. */
    public static Optional<SuccessLaw> success(Problem problem, Strategy strategy, Noise noise) {
        return Optional.empty();
    }

    /** A law that holds for any function that keeps the promise. */
    private static BiFunction<Problem, Strategy, Optional<QueryLaw>> any(QueryLaw law) {
        return (problem, strategy) -> Optional.of(law);
    }

    /** A law that takes the period to be drawn uniformly, which that of a given table is not. */
    private static BiFunction<Problem, Strategy, Optional<QueryLaw>> drawn(QueryLaw law) {
        return (problem, strategy) ->
                problem.promise().labels() == Promise.Labels.ANY ? Optional.empty() : Optional.of(law);
    }
}
