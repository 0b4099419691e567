package org.notchwork.engine;

import java.math.BigInteger;
import org.notchwork.seed.RandomStream;

/**
 * What one round of amplitude amplification with phases i does to the outcomes of a Fourier-sampling circuit, in exact
 * integers.
 *
 * <p>With Ψ = A|0⟩ the state after the round is, up to a sign, ((i on the accepted, 1 on the others) − (1 − i)(i p + q))
 * times Ψ, where p and q = 1 − p are the probabilities that the test accepts or not. With p = g/T and q = b/T the
 * probability of an accepted word is multiplied by (T² + 4b²)/T², of another by (b − g)²/T². For g = b that doubles the
 * first and wipes out the second; for g = 0 it leaves everything as it was.
 *
 * <p>The test w·y = 1 accepts with p = (1 − N(w)/2^n)/2, N(w) being the number of x with f(x) = f(x ⊕ w): so T = 2^(n+1),
 * g = 2^n − N(w), b = 2^n + N(w).
 *
 * @see "G. Brassard, P. Høyer, A. Tapp, Quantum counting, ICALP 1998: amplification with complex phases"
 */
public final class Amplification {

    private final BigInteger good;
    private final BigInteger bad;
    private final BigInteger accepted;
    private final BigInteger rejected;

    /**
     * Prepares the round for one test.
     *
     * @param width n
     * @param equal N(w), even unless n is 0
     */
    public Amplification(int width, long equal) {
        BigInteger all = BigInteger.ONE.shiftLeft(width);
        BigInteger n = BigInteger.valueOf(equal);
        BigInteger t = all.shiftLeft(1);
        this.good = all.subtract(n);
        this.bad = all.add(n);
        this.accepted = t.multiply(t).add(bad.multiply(bad).shiftLeft(2));
        this.rejected = bad.subtract(good).pow(2);
    }

    /**
     * Draws whether the measured word passes the test.
     *
     * @throws ArithmeticException if the reduced probability does not fit 63 bits: from width 21 on, if N(w) is neither 0
     *     nor 2^n
     */
    public boolean isAccepted(RandomStream stream) {
        BigInteger yes = good.multiply(accepted);
        BigInteger no = bad.multiply(rejected);
        BigInteger divisor = yes.gcd(no);
        long yesWeight = yes.divide(divisor).longValueExact();
        long total = yes.add(no).divide(divisor).longValueExact();
        return stream.below(total) < yesWeight;
    }

    /**
     * Returns the distribution after the round.
     *
     * @param before the distribution of the circuit without the round
     * @param test w
     */
    public Outcomes outcomes(Outcomes before, long test) {
        BigInteger divisor = accepted.gcd(rejected);
        long yes = accepted.divide(divisor).longValueExact();
        long no = rejected.divide(divisor).longValueExact();
        long[] weights = new long[before.size()];
        for (int y = 0; y < weights.length; y++) {
            boolean passes = (Long.bitCount(y & test) & 1) == 1;
            weights[y] = Math.multiplyExact(before.weight(y), passes ? yes : no);
        }
        return new Outcomes(weights);
    }
}
