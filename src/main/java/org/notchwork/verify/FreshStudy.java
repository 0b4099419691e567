package org.notchwork.verify;

import java.util.List;
import org.notchwork.seed.Seed;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;

/** The author's study on another seed, with another number of trials. */
final class FreshStudy {

    private FreshStudy() {}

    /**
     * Returns the study to run.
     *
     * @param trials how many trials a cell
     */
    static Study of(Study author, Seed seed, int trials) {
        List<Experiment> experiments = author.experiments().stream()
                .map(e -> new Experiment(e.id(), e.problem(), e.widths(), e.strategies(), trials, e.queryLimit()))
                .toList();
        return new Study(
                author.version(),
                author.title(),
                author.question(),
                seed,
                experiments,
                author.crossCheckWidth(),
                author.claims());
    }
}
