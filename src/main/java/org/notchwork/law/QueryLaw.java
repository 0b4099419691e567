package org.notchwork.law;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalLong;

/** What theory says about the number of queries of a strategy on instances of a width. Stateless. */
public interface QueryLaw {

    /** Returns whether the law gives figures at a width; the other methods may throw where it does not. */
    default boolean reaches(int width) {
        return true;
    }

    /** Returns the exact mean number of queries. */
    Prediction mean(int width);

    /** Returns the exact variance of the number of queries, where a formula is known. */
    Optional<BigDecimal> variance(int width);

    /** Returns the largest number of queries that can occur; empty if there is no bound. */
    OptionalLong worst(int width);

    /** Returns the exact number of queries for one hidden period; empty if it depends on chance. */
    OptionalLong queries(int width, long period);

    /**
     * Returns the exact probability of at most m queries, without a query limit; empty where no formula is known.
     *
     * @param width the number of input bits
     * @param queries m, at least 0
     */
    default Optional<Prediction> within(int width, long queries) {
        return Optional.empty();
    }

    /** Returns the formula of the mean, in one line of plain text. */
    String formula();

    /** Returns where the law comes from. */
    String source();
}
