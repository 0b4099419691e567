package org.notchwork.engine.stabilizer;

import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import org.notchwork.bits.WideBasis;
import org.notchwork.seed.RandomStream;

/**
 * What a measurement of some qubits of a stabilizer state in the computational basis may find: an affine space of
 * words, every one of them equally likely and no other word possible.
 *
 * <p>Bit i of a word is the outcome of the i-th listed qubit. The directions of the space are spanned by the X-parts
 * of the stabilizers at these qubits: what is orthogonal to all of them is a word of Z that commutes with every
 * stabilizer, hence itself a stabilizer up to its sign, hence fixed; and nothing else is. Does not change; later
 * changes of the tableau do not reach it.
 */
public final class OutcomeSpace {

    private static final int CHUNK = 63;

    private final BigInteger offset;
    private final WideBasis directions;

    private OutcomeSpace(BigInteger offset, WideBasis directions) {
        this.offset = offset;
        this.directions = directions;
    }

    /**
     * Returns the outcomes of measuring the listed qubits together. The tableau stays as it is.
     *
     * @param tableau the state before the measurement
     * @param qubits at least one, none twice
     * @throws IllegalArgumentException if no qubit is listed or one twice
     * @throws IndexOutOfBoundsException if there is no such qubit
     */
    public static OutcomeSpace of(Tableau tableau, List<Integer> qubits) {
        if (qubits.isEmpty() || new HashSet<>(qubits).size() < qubits.size()) {
            throw new IllegalArgumentException("the qubits to measure are none, or one is listed twice");
        }
        qubits.forEach(q -> Objects.checkIndex(q, tableau.qubits()));
        WideBasis directions = directions(tableau, qubits);
        return new OutcomeSpace(directions.reduce(someOutcome(tableau, qubits)), directions);
    }

    /** Returns the dimension d: there are 2^d outcomes, of probability 2^−d each. */
    public int dimension() {
        return directions.rank();
    }

    /** Returns the one outcome that is 0 at the leading bits of all words of the {@link #basis}. */
    public BigInteger offset() {
        return offset;
    }

    /**
     * Returns the reduced basis of the differences of outcomes, by rising leading bits; the leading bit of a word is
     * its highest and is 0 in all others.
     */
    public List<BigInteger> basis() {
        return directions.rows();
    }

    /** Returns whether the word is a possible outcome. */
    public boolean contains(BigInteger word) {
        return directions.reduce(word).equals(offset);
    }

    /**
     * Draws an outcome: the offset plus the words of the basis that random bits choose.
     *
     * @param stream gives {@link #dimension} bits, 63 at a time and in the end the rest; the i-th bit, the lowest of a
     *     draw being its first, stands for the i-th word of the basis
     */
    public BigInteger sample(RandomStream stream) {
        BigInteger chosen = BigInteger.ZERO;
        for (int from = 0; from < dimension(); from += CHUNK) {
            long bits = stream.bits(Math.min(CHUNK, dimension() - from));
            chosen = chosen.or(BigInteger.valueOf(bits).shiftLeft(from));
        }
        return offset.xor(directions.combination(chosen));
    }

    private static WideBasis directions(Tableau tableau, List<Integer> qubits) {
        int bytes = (qubits.size() + Byte.SIZE - 1) / Byte.SIZE;
        byte[][] words = new byte[tableau.qubits()][bytes];
        for (int i = 0; i < qubits.size(); i++) {
            long[] column = tableau.stabilizersWithX(qubits.get(i));
            int place = bytes - 1 - i / Byte.SIZE;
            int bit = 1 << i % Byte.SIZE;
            for (int w = 0; w < column.length; w++) {
                for (long rest = column[w]; rest != 0; rest &= rest - 1) {
                    byte[] word = words[w * Long.SIZE + Long.numberOfTrailingZeros(rest)];
                    word[place] = (byte) (word[place] | bit);
                }
            }
        }
        WideBasis basis = new WideBasis(qubits.size());
        for (byte[] word : words) {
            basis.add(new BigInteger(1, word));
        }
        return basis;
    }

    private static BigInteger someOutcome(Tableau tableau, List<Integer> qubits) {
        Tableau measured = tableau.copy();
        byte[] word = new byte[(qubits.size() + Byte.SIZE - 1) / Byte.SIZE];
        for (int i = 0; i < qubits.size(); i++) {
            int place = word.length - 1 - i / Byte.SIZE;
            word[place] = (byte) (word[place] | measured.measureZeroIfPossible(qubits.get(i)) << i % Byte.SIZE);
        }
        return new BigInteger(1, word);
    }
}
