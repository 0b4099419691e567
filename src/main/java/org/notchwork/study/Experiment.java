package org.notchwork.study;

import java.util.List;
import java.util.Optional;
import org.notchwork.problem.Problem;

/**
 * One problem at several widths, faced by several strategies on the same instances.
 *
 * @param id lower-case letters, digits and hyphens, at most 40; unique in the study
 * @param problem the problem with its settings
 * @param widths different widths, ascending
 * @param strategies different strategies, in the order of the study file
 * @param trials trials a cell, 1 to 1 000 000
 * @param queryLimit the most calls of one trial, at least 1
 */
public record Experiment(
        String id,
        Problem problem,
        List<Integer> widths,
        List<StrategyChoice> strategies,
        int trials,
        long queryLimit) {

    /** Copies the lists. */
    public Experiment {
        widths = List.copyOf(widths);
        strategies = List.copyOf(strategies);
    }

    /** Returns the cells: by width, then strategy. */
    public List<Cell> cells() {
        return widths.stream()
                .flatMap(w -> strategies.stream().map(s -> new Cell(id, w, s.label())))
                .toList();
    }

    /** Returns the choice of a label. */
    public Optional<StrategyChoice> choice(String label) {
        return strategies.stream().filter(s -> s.label().equals(label)).findFirst();
    }
}
