package org.notchwork.study;

import java.util.List;
import java.util.Optional;
import org.notchwork.seed.Seed;

/**
 * What is compared, on what, how often, from which seed, and what is claimed. Valid if it exists.
 *
 * @param version the version of the format: 1 or 2. The second has controls at small widths and more cross-checks
 * @param title one line
 * @param question what the study asks, in the author's words
 * @param seed the one seed
 * @param experiments at least one
 * @param crossCheckWidth the largest width that is checked exhaustively, 0 (none) to 12
 * @param claims possibly none
 */
public record Study(
        int version,
        String title,
        String question,
        Seed seed,
        List<Experiment> experiments,
        int crossCheckWidth,
        List<Claim> claims) {

    /** The largest width with a control where the study does not say. */
    private static final int CONTROL_WIDTH = 8;

    /** Creates a study of the first version. */
    public Study(
            String title,
            String question,
            Seed seed,
            List<Experiment> experiments,
            int crossCheckWidth,
            List<Claim> claims) {
        this(1, title, question, seed, experiments, crossCheckWidth, claims);
    }

    /** Copies the lists. */
    public Study {
        experiments = List.copyOf(experiments);
        claims = List.copyOf(claims);
    }

    /** Returns all cells: by experiment, then width, then strategy, in the order of the study. */
    public List<Cell> cells() {
        return experiments.stream().flatMap(e -> e.cells().stream()).toList();
    }

    /** Returns whether distributions and rates are checked against their laws, and controls judged. */
    public boolean hasFullChecks() {
        return version >= 2;
    }

    /**
     * Returns the strategies of an experiment that have a control at a width, in its order: those that the study says, and
     * in the second version all others at widths to 8. There is none where the problem has no function to put in its place
     * or the engine cannot take it.
     */
    public List<StrategyChoice> controls(Experiment experiment, int width) {
        if (!experiment.problem().hasControl(width)) {
            return List.of();
        }
        boolean usual = version >= 2 && width <= CONTROL_WIDTH;
        return experiment.strategies().stream()
                .filter(choice -> choice.control().orElse(usual))
                .filter(choice -> choice.engine()
                        .map(e -> e.takesControlsOf(experiment.problem()))
                        .orElse(true))
                .toList();
    }

    /** Returns whether an experiment has a control at any width. */
    public boolean hasControls(Experiment experiment) {
        return experiment.widths().stream()
                .anyMatch(width -> !controls(experiment, width).isEmpty());
    }

    /** Returns the experiment of an id. */
    public Optional<Experiment> experiment(String id) {
        return experiments.stream().filter(e -> e.id().equals(id)).findFirst();
    }
}
