package org.notchwork.strategy;

import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;

/** How an attempt ended. A closed set. */
public sealed interface Attempt {

    /** Returns what was used besides queries. */
    Usage usage();

    /**
     * The strategy named an answer.
     *
     * @param answer the answer
     * @param certificate what lets anybody check it
     * @param usage what was used besides queries
     */
    record Answered(Answer answer, Certificate certificate, Usage usage) implements Attempt {}

    /**
     * The query limit was reached before there was an answer.
     *
     * @param usage what was used besides queries
     */
    record Censored(Usage usage) implements Attempt {}

    /**
     * The strategy did all that it does and has no answer; more queries were allowed.
     *
     * @param usage what was used besides queries
     */
    record Unanswered(Usage usage) implements Attempt {}
}
