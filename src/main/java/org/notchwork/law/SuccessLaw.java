package org.notchwork.law;

/** What theory says about the probability that a strategy answers right on an instance of a width. Stateless. */
public interface SuccessLaw {

    /** Returns the exact probability of a right answer, the instance drawn at random. */
    Prediction success(int width);

    /** Returns the formula, in one line of plain text. */
    String formula();

    /** Returns where the law comes from. */
    String source();
}
