package org.notchwork.figure;

import java.util.List;

/**
 * All figures of a study.
 *
 * @param cells one a cell, in the order of the study
 * @param ratios one an ordered pair of strategies (earlier over later) of each experiment and width
 */
public record Summary(List<CellFigures> cells, List<RatioFigures> ratios) {

    /** Copies the lists. */
    public Summary {
        cells = List.copyOf(cells);
        ratios = List.copyOf(ratios);
    }
}
