package org.notchwork.engine;

import org.notchwork.seed.RandomStream;

/** An engine opened on one instance. Not for use by several threads. */
public interface Simulation {

    /**
     * Runs the Fourier-sampling circuit once and measures the input register: Hadamards on all input qubits of
     * |0…0⟩|0…0⟩, one use of U_f, Hadamards again.
     *
     * @param stream where the measurement's chance comes from
     * @return the measured word y, below 2^width; one use of U_f is counted
     * @see "D. R. Simon, On the power of quantum computation, SIAM J. Comput. 26 (1997), section 3.1"
     */
    long fourierSample(RandomStream stream);

    /**
     * Returns the exact outcome distribution of {@link #fourierSample}, for cross-checks; nothing is counted.
     *
     * @throws IllegalArgumentException for widths above 12
     */
    Outcomes outcomes();
}
