package org.notchwork.law;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * Fourier rounds until the words span the annihilator of a hidden subspace, which has dimension n − k.
 *
 * @param dimension k, the dimension of the hidden subspace, 1 to n
 */
public record SubspaceRoundsLaw(int dimension) implements QueryLaw {

    private static final FourierRoundsLaw ROUNDS = new FourierRoundsLaw();

    public SubspaceRoundsLaw {
        if (dimension < 1) {
            throw new IllegalArgumentException("dimension " + dimension + " is below 1");
        }
    }

    @Override
    public Prediction mean(int width) {
        return ROUNDS.mean(reduced(width));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        return ROUNDS.variance(reduced(width));
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.empty();
    }

    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public Optional<Prediction> within(int width, long queries) {
        return ROUNDS.within(reduced(width), queries);
    }

    @Override
    public String formula() {
        return "sum_{i=1}^{n-k} 1 / (1 - 2^-i), k = " + dimension;
    }

    @Override
    public String source() {
        return "derived: as for a period, in dimension n - k";
    }

    private int reduced(int width) {
        if (width < dimension) {
            throw new IllegalArgumentException("width " + width + " is below the dimension " + dimension);
        }
        return width - dimension + 1;
    }
}
