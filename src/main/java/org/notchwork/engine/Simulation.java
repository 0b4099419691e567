package org.notchwork.engine;

import org.notchwork.bits.Word;
import org.notchwork.seed.RandomStream;

/**
 * An engine opened on one instance. Not for use by several threads.
 *
 * <p>A circuit that the engine refuses (see {@link Engine#refusal}) throws {@link UnsupportedOperationException}.
 */
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
     * Runs the Fourier-sampling circuit once on an input register of any width.
     *
     * @param width the number of qubits of the input register
     * @param stream where the measurement's chance comes from
     */
    default Word fourierWord(int width, RandomStream stream) {
        return Word.of(width, fourierSample(stream));
    }

    /**
     * Runs the phase circuit once on a function with values of one bit and measures the input register: Hadamards on all
     * input qubits of |0…0⟩ beside (|0⟩ − |1⟩)/√2, one use of U_f, Hadamards again.
     *
     * @param stream where the measurement's chance comes from
     * @return the measured word y; one use of U_f is counted
     * @see "R. Cleve, A. Ekert, C. Macchiavello, M. Mosca, Proc. R. Soc. A 454 (1998), section 3"
     */
    default long phaseSample(RandomStream stream) {
        throw new UnsupportedOperationException("the phase circuit");
    }

    /**
     * Runs the Fourier-sampling circuit A, then one round of amplitude amplification with phases i, and measures the
     * input register: A; i on every state with y·w = 1; the inverse of A; i on |0…0⟩|0…0⟩ of both registers; A. Where
     * the test accepts with probability 1/2 under A, it then accepts with certainty; where never, never.
     *
     * @param test w, not 0
     * @param stream where the measurement's chance comes from
     * @return the measured word y; two uses of U_f and one of its inverse are counted
     * @see "G. Brassard, P. Høyer, An exact quantum polynomial-time algorithm for Simon's problem (1997)"
     */
    default long amplifiedSample(long test, RandomStream stream) {
        throw new UnsupportedOperationException("the amplified circuit");
    }

    /**
     * Returns the exact outcome distribution of {@link #fourierSample}, for cross-checks; nothing is counted.
     *
     * @throws IllegalArgumentException for widths above 12
     */
    Outcomes outcomes();

    /** Returns the exact outcome distribution of {@link #phaseSample}, likewise. */
    default Outcomes phaseOutcomes() {
        throw new UnsupportedOperationException("the phase circuit");
    }

    /** Returns the exact outcome distribution of {@link #amplifiedSample}, likewise. */
    default Outcomes amplifiedOutcomes(long test) {
        throw new UnsupportedOperationException("the amplified circuit");
    }
}
