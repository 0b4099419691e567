package org.notchwork.bits;

/**
 * A growing set of linearly independent words over GF(2), kept in reduced echelon form.
 *
 * <p>Row r with leading bit b is the only row with bit b set, so adding a word costs at most one pass over the rows
 * and the orthogonal complement can be read off. Words have at most 63 bits. Not for use by several threads.
 */
public final class EchelonBasis {

    private final int width;
    private final long[] rowByLead;
    private int rank;

    /** Creates an empty basis for words of {@code width} bits, 1 to 63. */
    public EchelonBasis(int width) {
        if (width < 1 || width > 63) {
            throw new IllegalArgumentException("width " + width + " is not in 1 to 63");
        }
        this.width = width;
        this.rowByLead = new long[width];
    }

    /**
     * Adds a word.
     *
     * @param word the word, below 2^width
     * @return whether it was independent of the words before it; if not, nothing changes
     */
    public boolean add(long word) {
        long rest = reduce(word);
        if (rest == 0) {
            return false;
        }
        int lead = 63 - Long.numberOfLeadingZeros(rest);
        for (int i = lead + 1; i < width; i++) {
            if ((rowByLead[i] >>> lead & 1) != 0) {
                rowByLead[i] ^= rest;
            }
        }
        rowByLead[lead] = rest;
        rank++;
        return true;
    }

    /** Returns what is left of a word after subtracting the rows; 0 exactly if it lies in the span. */
    public long reduce(long word) {
        if (word >>> width != 0) {
            throw new IllegalArgumentException("word does not fit " + width + " bits");
        }
        long rest = word;
        for (int i = width - 1; i >= 0; i--) {
            if ((rest >>> i & 1) != 0) {
                rest ^= rowByLead[i];
            }
        }
        return rest;
    }

    /** Returns the number of independent words, 0 to the width. */
    public int rank() {
        return rank;
    }

    /** Returns the row whose leading bit is {@code lead}, 0 if there is none. */
    public long row(int lead) {
        return rowByLead[lead];
    }

    /**
     * Returns a basis of the orthogonal complement {t : t·w = 0 for every word w added}.
     *
     * @return width − rank words; the k-th is the only one with the k-th free bit set
     */
    public long[] complement() {
        long[] words = new long[width - rank];
        int next = 0;
        for (int free = 0; free < width; free++) {
            if (rowByLead[free] == 0) {
                long word = 1L << free;
                for (int lead = free + 1; lead < width; lead++) {
                    word |= (rowByLead[lead] >>> free & 1) << lead;
                }
                words[next++] = word;
            }
        }
        return words;
    }
}
