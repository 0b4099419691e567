package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.study.Cell;

/**
 * The figures of one cell.
 *
 * @param cell the cell
 * @param engine the engine of a quantum cell
 * @param sight {@code blind} or {@code sighted}, of a quantum cell
 * @param trials how many trials
 * @param solved how many named the right answer
 * @param wrong how many named a wrong one
 * @param censored how many reached the query limit
 * @param queries the number of queries, confirmation not included
 * @param confirming all confirming queries of the cell together
 * @param success the fraction solved
 * @param successInterval its 95 % interval by Clopper and Pearson (1934)
 */
public record CellFigures(
        Cell cell,
        Optional<String> engine,
        Optional<String> sight,
        long trials,
        long solved,
        long wrong,
        long censored,
        QueryFigures queries,
        long confirming,
        BigDecimal success,
        Interval successInterval) {}
