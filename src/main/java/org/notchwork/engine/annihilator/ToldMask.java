package org.notchwork.engine.annihilator;

import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Reach;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;

/** The phase circuit on an inner product whose word is known: the word is measured with certainty. */
record ToldMask(Unitary unitary, long mask) implements Simulation {

    @Override
    public long fourierSample(RandomStream stream) {
        throw new UnsupportedOperationException("theory is told of the phase circuit only");
    }

    @Override
    public Outcomes outcomes() {
        throw new UnsupportedOperationException("theory is told of the phase circuit only");
    }

    @Override
    public long phaseSample(RandomStream stream) {
        unitary.use();
        return mask;
    }

    @Override
    public Outcomes phaseOutcomes() {
        Reach.requireListable(unitary.width());
        long[] weights = new long[1 << unitary.width()];
        weights[(int) mask] = 1;
        return new Outcomes(weights);
    }
}
