package org.notchwork.figure;

import java.math.BigDecimal;
import java.util.List;
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
 * @param unanswered how many ended without an answer although more queries were allowed
 * @param queries the number of queries, confirmation not included
 * @param confirming all confirming queries of the cell together
 * @param success the fraction solved
 * @param successInterval its 95 % interval by Clopper and Pearson (1934)
 * @param byFunction the queries of each function, where there are several
 * @param split the success on each side of a question with two
 * @param control what came of the controls, where there are any
 */
public record CellFigures(
        Cell cell,
        Optional<String> engine,
        Optional<String> sight,
        long trials,
        long solved,
        long wrong,
        long censored,
        long unanswered,
        QueryFigures queries,
        long confirming,
        BigDecimal success,
        Interval successInterval,
        List<FunctionFigures> byFunction,
        List<SplitFigures> split,
        Optional<ControlFigures> control) {

    /** Copies the lists. */
    public CellFigures {
        byFunction = List.copyOf(byFunction);
        split = List.copyOf(split);
    }

    /** Creates the figures of a cell with one function, one side and no control. */
    public CellFigures(
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
            Interval successInterval) {
        this(
                cell,
                engine,
                sight,
                trials,
                solved,
                wrong,
                censored,
                0,
                queries,
                confirming,
                success,
                successInterval,
                List.of(),
                List.of(),
                Optional.empty());
    }
}
