package org.notchwork.trial;

import java.util.Optional;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.study.Cell;

/**
 * One control: the strategy of a cell on a function that hides nothing.
 *
 * @param cell the cell
 * @param trial the number of the trial
 * @param secret what the trial's own instance hides, which must not be found here
 * @param outcome what came of it
 * @param answer what was named; absent if the strategy gave no answer
 * @param certificate goes with the answer
 * @param counts the calls
 */
public record ControlRecord(
        Cell cell,
        long trial,
        Answer secret,
        ControlOutcome outcome,
        Optional<Answer> answer,
        Optional<Certificate> certificate,
        Counts counts) {

    /** Checks that a certificate goes with an answer, and something named with an answer. */
    public ControlRecord {
        if (answer.isPresent() != certificate.isPresent() || (answer.isEmpty() && outcome != ControlOutcome.NOTHING)) {
            throw new IllegalArgumentException("outcome " + outcome + " does not fit the answer or certificate");
        }
    }
}
