package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.OptionalLong;

/** A strategy that asks the same number of queries on every instance of a width. */
interface ConstantCountLaw extends QueryLaw {

    /** Returns the number of queries, at least 1. */
    long count(int width);

    @Override
    default Prediction mean(int width) {
        return Prediction.ratio(BigInteger.valueOf(count(width)), BigInteger.ONE);
    }

    @Override
    default Optional<BigDecimal> variance(int width) {
        return Optional.of(BigDecimal.ZERO);
    }

    @Override
    default OptionalLong worst(int width) {
        return OptionalLong.of(count(width));
    }

    @Override
    default OptionalLong queries(int width, long period) {
        return OptionalLong.of(count(width));
    }

    @Override
    default Optional<Prediction> within(int width, long queries) {
        return Optional.of((queries < count(width) ? Fraction.ZERO : Fraction.ONE).prediction());
    }
}
