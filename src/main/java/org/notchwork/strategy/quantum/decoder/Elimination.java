package org.notchwork.strategy.quantum.decoder;

import java.util.Optional;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.seed.RandomStream;

/** The one word orthogonal to all measured ones, if there is exactly one: if their rank is n − 1. */
public record Elimination() implements Decoder {

    private static final int GREATEST = 63;

    @Override
    public String name() {
        return "elimination";
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 16L * width;
    }

    @Override
    public Optional<Long> decode(int width, long[] words, RandomStream stream) {
        EchelonBasis basis = new EchelonBasis(width);
        for (long word : words) {
            basis.add(word);
        }
        return basis.rank() == width - 1 ? Optional.of(basis.complement()[0]) : Optional.empty();
    }
}
