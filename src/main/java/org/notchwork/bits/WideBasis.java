package org.notchwork.bits;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * A growing set of linearly independent words over GF(2) of any width, kept in reduced echelon form: the wide twin of
 * {@link EchelonBasis}. Not for use by several threads.
 */
public final class WideBasis {

    private final int width;
    private final BigInteger[] rowByLead;
    private int rank;

    /** Creates an empty basis for words of {@code width} bits, at least 1. */
    public WideBasis(int width) {
        if (width < 1) {
            throw new IllegalArgumentException("width " + width + " is below 1");
        }
        this.width = width;
        this.rowByLead = new BigInteger[width];
    }

    /**
     * Adds a word.
     *
     * @param word the word, below 2^width
     * @return whether it was independent of the words before it; if not, nothing changes
     */
    public boolean add(BigInteger word) {
        BigInteger rest = reduce(word);
        if (rest.signum() == 0) {
            return false;
        }
        int lead = rest.bitLength() - 1;
        for (int i = lead + 1; i < width; i++) {
            if (rowByLead[i] != null && rowByLead[i].testBit(lead)) {
                rowByLead[i] = rowByLead[i].xor(rest);
            }
        }
        rowByLead[lead] = rest;
        rank++;
        return true;
    }

    private BigInteger reduce(BigInteger word) {
        if (word.signum() < 0 || word.bitLength() > width) {
            throw new IllegalArgumentException("word does not fit " + width + " bits");
        }
        BigInteger rest = word;
        for (int i = width - 1; i >= 0; i--) {
            if (rowByLead[i] != null && rest.testBit(i)) {
                rest = rest.xor(rowByLead[i]);
            }
        }
        return rest;
    }

    /** Returns the number of independent words, 0 to the width. */
    public int rank() {
        return rank;
    }

    /**
     * Returns a basis of the orthogonal complement {t : t·w = 0 for every word w added}.
     *
     * @return width − rank words; the k-th is the only one with the k-th free bit set
     */
    public List<BigInteger> complement() {
        List<BigInteger> words = new ArrayList<>();
        for (int free = 0; free < width; free++) {
            if (rowByLead[free] == null) {
                BigInteger word = BigInteger.ONE.shiftLeft(free);
                for (int lead = free + 1; lead < width; lead++) {
                    if (rowByLead[lead] != null && rowByLead[lead].testBit(free)) {
                        word = word.setBit(lead);
                    }
                }
                words.add(word);
            }
        }
        return words;
    }
}
