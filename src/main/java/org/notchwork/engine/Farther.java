package org.notchwork.engine;

import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;

/** Says which engine reaches a width that another does not: the reaches of all engines, in one place. */
public final class Farther {

    private Farther() {}

    /** Returns half a sentence that names an engine which reaches a width. */
    public static String than(Problem problem, int width) {
        if (width <= 26) {
            return "engine fibre reaches width 26";
        }
        if (problem.promise().labels() == Promise.Labels.AFFINE) {
            return "engine stabilizer reaches width 2048";
        }
        return width <= 63 ? "engine annihilator reaches width 63 but is sighted" : "no engine reaches it";
    }
}
