package org.notchwork.study;

import java.util.List;
import java.util.Optional;
import org.notchwork.seed.Seed;

/**
 * What is compared, on what, how often, from which seed, and what is claimed. Valid if it exists.
 *
 * @param title one line
 * @param question what the study asks, in the author's words
 * @param seed the one seed
 * @param experiments at least one
 * @param crossCheckWidth the largest width that is checked exhaustively, 0 (none) to 12
 * @param claims possibly none
 */
public record Study(
        String title,
        String question,
        Seed seed,
        List<Experiment> experiments,
        int crossCheckWidth,
        List<Claim> claims) {

    /** Copies the lists. */
    public Study {
        experiments = List.copyOf(experiments);
        claims = List.copyOf(claims);
    }

    /** Returns all cells: by experiment, then width, then strategy, in the order of the study. */
    public List<Cell> cells() {
        return experiments.stream().flatMap(e -> e.cells().stream()).toList();
    }

    /** Returns the experiment of an id. */
    public Optional<Experiment> experiment(String id) {
        return experiments.stream().filter(e -> e.id().equals(id)).findFirst();
    }
}
