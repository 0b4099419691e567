package org.notchwork.engine.annihilator;

import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/** Fourier sampling of a function whose hidden subspace is known: its rows in reduced echelon form. */
final class ToldSubspace implements Simulation {

    private final Unitary unitary;
    private final long[] rows;

    ToldSubspace(Unitary unitary, long[] rows) {
        this.unitary = unitary;
        this.rows = rows;
    }

    @Override
    public long fourierSample(RandomStream stream) {
        unitary.use();
        return orthogonal(stream);
    }

    /** Draws y uniformly; if y·r = 1 for a row, flips in y the top set bit of the row, which no other row has. */
    private long orthogonal(RandomStream stream) {
        long y = stream.bits(unitary.width());
        for (long row : rows) {
            if ((Long.bitCount(y & row) & 1) != 0) {
                y ^= Long.highestOneBit(row);
            }
        }
        return y;
    }

    /** The test splits the orthogonal words in half unless it lies in the subspace; then it accepts none. */
    @Override
    public long amplifiedSample(long test, RandomStream stream) {
        unitary.use();
        unitary.useInverse();
        unitary.use();
        long y = orthogonal(stream);
        while (!isHidden(test) && (Long.bitCount(y & test) & 1) == 0) {
            y = orthogonal(stream);
        }
        return y;
    }

    private boolean isHidden(long test) {
        long rest = test;
        for (long row : rows) {
            if ((rest & Long.highestOneBit(row)) != 0) {
                rest ^= row;
            }
        }
        return rest == 0;
    }

    @Override
    public Outcomes outcomes() {
        return outcomes(0);
    }

    @Override
    public Outcomes amplifiedOutcomes(long test) {
        return outcomes(isHidden(test) ? 0 : test);
    }

    /** Uniform on the orthogonal words that a test accepts; a test of 0 stands for none. */
    private Outcomes outcomes(long test) {
        Reach.requireListable(unitary.width());
        long[] weights = new long[1 << unitary.width()];
        for (int y = 0; y < weights.length; y++) {
            boolean orthogonal = true;
            for (long row : rows) {
                orthogonal &= (Long.bitCount(y & row) & 1) == 0;
            }
            boolean accepted = test == 0 || (Long.bitCount(y & test) & 1) == 1;
            weights[y] = orthogonal && accepted ? 1 : 0;
        }
        return new Outcomes(weights);
    }
}
