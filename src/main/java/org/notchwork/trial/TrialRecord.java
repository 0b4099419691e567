package org.notchwork.trial;

import java.util.Optional;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.strategy.Usage;
import org.notchwork.study.Cell;

/**
 * One trial, as it is written down.
 *
 * @param cell the cell
 * @param trial the number of the trial, from 0; the same number is the same instance in every cell of a width
 * @param hidden what the instance hides
 * @param outcome what came of it
 * @param answer the strategy's answer; absent exactly if censored
 * @param certificate what lets anybody check the answer; absent exactly if censored
 * @param counts the calls
 * @param usage what was used besides
 */
public record TrialRecord(
        Cell cell,
        long trial,
        Answer hidden,
        Outcome outcome,
        Optional<Answer> answer,
        Optional<Certificate> certificate,
        Counts counts,
        Usage usage) {

    /** Checks that an answer and a certificate are there exactly if the trial was not censored. */
    public TrialRecord {
        boolean answered = outcome != Outcome.CENSORED;
        if (answer.isPresent() != answered || certificate.isPresent() != answered) {
            throw new IllegalArgumentException("outcome " + outcome + " does not fit the answer or certificate");
        }
    }
}
