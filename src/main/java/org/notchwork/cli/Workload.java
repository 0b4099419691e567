package org.notchwork.cli;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.check.CrossChecker;
import org.notchwork.study.CellForecast;
import org.notchwork.study.Experiment;
import org.notchwork.study.Forecast;
import org.notchwork.study.Study;

/** How much of a study's work is done, each instance weighed by the forecast of its cost. */
final class Workload {

    private final Map<String, Double> weights = new HashMap<>();
    private double total;
    private double done;

    Workload(Study study) {
        List<CellForecast> cells = Forecast.of(study);
        for (CellForecast cell : cells) {
            String key =
                    CrossChecker.subject(cell.cell().experiment(), cell.cell().width());
            weights.merge(key, cell.nanosPerTrial(), Double::sum);
        }
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                String key = CrossChecker.subject(experiment.id(), width);
                weights.merge(key, Forecast.examinationNanos(study, experiment, width, 0), Double::sum);
                total += weights.get(key) * experiment.trials();
            }
        }
    }

    /** Notes that one instance is done. */
    void done(Experiment experiment, int width) {
        done += weights.get(CrossChecker.subject(experiment.id(), width));
    }

    /** Returns the share of the work that is done, 0 to 1. */
    double share() {
        return Math.min(1, done / total);
    }
}
