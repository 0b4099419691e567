package org.notchwork.study;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.exact.Decimals;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.strategy.QuantumStrategy;

/**
 * What a study will probably cost, from the laws of its strategies and a plain model of the work.
 *
 * <p>The model counts elementary steps: one for a table entry or an evaluation, a few for a query that is remembered,
 * 2n · 2^2n for a state vector, n · 2^n for sorting a domain into fibres. Its constants were measured once and are
 * good to a factor of two or three between machines; a caller may measure its own machine and scale.
 */
public final class Forecast {

    /** Nanoseconds of drawing one table entry. */
    private static final double DRAW = 8;

    /** Nanoseconds of a query that is looked up among those before it. */
    private static final double QUERY = 35;

    /** Nanoseconds of one gate on one amplitude, memory traffic included. */
    private static final double AMPLITUDE = 0.7;

    /** Nanoseconds of one comparison while sorting a domain. */
    private static final double SORT = 4;

    /** How many times as long a gate takes on complex amplitudes of 16 bytes as on real ones of 4. */
    private static final double COMPLEX = 4;
    /** Nanoseconds of a tableau of all gates of a circuit, over the cube of the width. */
    private static final double TABLEAU = 1;
    /** Nanoseconds of writing and hashing the line of a trial. */
    private static final double LINE = 15_000;

    /** Calls by which a quantum strategy confirms its answer, which its law does not count. */
    private static final int CONFIRMING = 2;

    private static final int ENGINES_WIDTH = 10;
    private static final long FIRST_INSTANCES = 16;

    private Forecast() {}

    /** Returns the forecast of every cell, in the order of the study. */
    public static List<CellForecast> of(Study study) {
        List<CellForecast> forecasts = new ArrayList<>();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                for (StrategyChoice choice : experiment.strategies()) {
                    forecasts.add(cell(experiment, width, choice));
                }
            }
        }
        return forecasts;
    }

    /** Returns the expected time of exhaustively checking one instance of a width on one core, in nanoseconds. */
    public static double examinationNanos(Study study, Experiment experiment, int width, long trial) {
        if (width > study.crossCheckWidth()) {
            return 0;
        }
        double nanos = drawing(experiment.problem(), width) + 10.0 * Math.scalb(1.0, width);
        boolean quantum =
                experiment.strategies().stream().anyMatch(s -> s.engine().isPresent());
        if (quantum && (width <= ENGINES_WIDTH || trial < FIRST_INSTANCES)) {
            for (Engine engine : Engines.reference()) {
                nanos += preparing(engine, width, Circuit.FOURIER) + Math.scalb(2.0, 2 * width);
            }
        }
        return nanos;
    }

    /** Returns the expected time of all work on one core, in nanoseconds. */
    public static double totalNanos(Study study) {
        double nanos = of(study).stream().mapToDouble(CellForecast::nanos).sum();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                for (long trial = 0; trial < experiment.trials(); trial++) {
                    nanos += examinationNanos(study, experiment, width, trial);
                }
            }
        }
        return nanos;
    }

    private static CellForecast cell(Experiment experiment, int width, StrategyChoice choice) {
        Problem problem = experiment.problem();
        Optional<BigDecimal> mean =
                choice.law(problem, width).map(law -> law.mean(width).value());
        BigDecimal limit = BigDecimal.valueOf(experiment.queryLimit());
        BigDecimal queries = mean.orElseGet(() -> guess(problem, width)).min(limit);
        double perQuery = choice.engine().isPresent() ? sampling(choice.engine().get(), width, circuit(choice)) : QUERY;
        double preparing =
                choice.engine().map(e -> preparing(e, width, circuit(choice))).orElse(0.0);
        double share = drawing(problem, width) / experiment.strategies().size();
        long memory = problem.memoryBytes(width)
                + choice.engine().map(e -> e.memoryBytes(width)).orElse(0L)
                + choice.strategy().memoryBytes(width, experiment.queryLimit());
        return new CellForecast(
                new Cell(experiment.id(), width, choice.label()),
                experiment.trials(),
                queries,
                LINE + share + preparing + queries.doubleValue() * perQuery,
                memory,
                mean.flatMap(m -> remark(m, choice, experiment.queryLimit())));
    }

    /**
     * Returns a warning if a trial of mean length is cut; the limit is on all calls, those that confirm included.
     *
     * <p>At the mean itself 41 % to 67 % of random draws, 50 % to 67 % of scans and 34 % to 50 % of Fourier samplings are
     * cut (derived from their distributions, widths 2 to 16); a lower limit cuts more.
     */
    private static Optional<String> remark(BigDecimal mean, StrategyChoice choice, long limit) {
        int confirming = choice.engine().isPresent() ? CONFIRMING : 0;
        if (mean.add(BigDecimal.valueOf(confirming)).compareTo(BigDecimal.valueOf(limit)) <= 0) {
            return Optional.empty();
        }
        String calls = "mean " + Decimals.text(mean, confirming == 0 ? 0 : 1)
                + (confirming == 0 ? " is" : " and " + confirming + " confirming calls are");
        return Optional.of(calls + " above the limit " + limit + ": many trials will be censored");
    }

    private static double drawing(Problem problem, int width) {
        return problem.memoryBytes(width) > 1 << 10 ? DRAW * Math.scalb(1.0, width) : 2000;
    }

    private static Circuit circuit(StrategyChoice choice) {
        return choice.strategy() instanceof QuantumStrategy quantum ? quantum.circuit() : Circuit.FOURIER;
    }

    /** Where no law is known: four times the square root of the number of words, and n at least. */
    private static BigDecimal guess(Problem problem, int width) {
        double root = problem.promise().question() == Question.CONSTANT_OR_BALANCED ? 2 : Math.scalb(4.0, width / 2);
        return BigDecimal.valueOf(Math.max(width, root));
    }

    /** Nanoseconds before the first sample. */
    private static double preparing(Engine engine, int width, Circuit circuit) {
        int qubits = circuit == Circuit.PHASE ? width + 1 : 2 * width;
        return switch (engine.name()) {
            case "statevector" -> circuit == Circuit.AMPLIFIED ? 0 : gates(width) * Math.scalb(1.0, qubits);
            case "fibre", "weights" -> SORT * width * Math.scalb(1.0, width);
            case "stabilizer" -> TABLEAU * width * width * width;
            default -> 0;
        };
    }

    private static double gates(int width) {
        return (2 * width + 2) * AMPLITUDE;
    }

    /** Nanoseconds of one sample, by the calls that it counts. */
    private static double sampling(Engine engine, int width, Circuit circuit) {
        return switch (engine.name()) {
            case "annihilator" -> 100.0;
            case "stabilizer" -> 300.0 + width * (double) width;
            case "statevector" ->
                circuit == Circuit.AMPLIFIED
                        ? COMPLEX * gates(width) * Math.scalb(1.0, 2 * width)
                        : 300.0 + 20.0 * width;
            default -> 300.0 + 20.0 * width + (circuit == Circuit.AMPLIFIED ? Math.scalb(1.0, width) : 0);
        };
    }
}
