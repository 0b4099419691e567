package org.notchwork.trial;

import java.util.List;
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
 * @param answer the strategy's answer; absent exactly if censored or unanswered
 * @param certificate what lets anybody check the answer; likewise
 * @param counts the calls, all functions together
 * @param byFunction the calls of each function, where there are several; empty otherwise
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
        List<Counts> byFunction,
        Usage usage) {

    /** Creates the record of a trial with one function. */
    public TrialRecord(
            Cell cell,
            long trial,
            Answer hidden,
            Outcome outcome,
            Optional<Answer> answer,
            Optional<Certificate> certificate,
            Counts counts,
            Usage usage) {
        this(cell, trial, hidden, outcome, answer, certificate, counts, List.of(), usage);
    }

    /** Copies the list and checks that an answer and a certificate are there exactly if the outcome is about one. */
    public TrialRecord {
        byFunction = List.copyOf(byFunction);
        boolean answered = outcome == Outcome.SOLVED || outcome == Outcome.WRONG;
        if (answer.isPresent() != answered || certificate.isPresent() != answered) {
            throw new IllegalArgumentException("outcome " + outcome + " does not fit the answer or certificate");
        }
    }
}
