package org.notchwork.bits;

import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.List;

/**
 * A growing set of linearly independent words over GF(2), kept in reduced echelon form: {@link EchelonBasis} for words
 * of any width up to {@value #MOST_BITS}.
 *
 * <p>A row's leading bit is its highest and is set in no other row, so the rows depend on the span alone and not on the
 * words that were added. Adding a word costs at most one pass over the rows. Not for use by several threads while words
 * are added.
 */
public final class WideBasis {

    /** The largest width. */
    public static final int MOST_BITS = 8192;

    private final int width;
    private final long[][] rowByLead;
    private int rank;

    /** Creates an empty basis for words of {@code width} bits, 1 to {@value #MOST_BITS}. */
    public WideBasis(int width) {
        if (width < 1 || width > MOST_BITS) {
            throw new IllegalArgumentException("width " + width + " is not in 1 to " + MOST_BITS);
        }
        this.width = width;
        this.rowByLead = new long[width][];
    }

    /**
     * Adds a word.
     *
     * @param word the word, 0 ≤ word &lt; 2^width
     * @return whether it was independent of the words before it; if not, nothing changes
     */
    public boolean add(BigInteger word) {
        long[] rest = rest(word);
        int lead = lead(rest);
        if (lead < 0) {
            return false;
        }
        for (int i = lead + 1; i < width; i++) {
            if (rowByLead[i] != null && bit(rowByLead[i], lead)) {
                addTo(rowByLead[i], rest);
            }
        }
        rowByLead[lead] = rest;
        rank++;
        return true;
    }

    /**
     * Returns what is left of a word after subtracting the rows: the one word that differs from it by a member of the
     * span and is 0 at all leading bits.
     */
    public BigInteger reduce(BigInteger word) {
        return word(rest(word));
    }

    /** Returns whether the word, 0 ≤ word &lt; 2^width, lies in the span. */
    public boolean contains(BigInteger word) {
        return lead(rest(word)) < 0;
    }

    /** Returns the number of independent words, 0 to the width. */
    public int rank() {
        return rank;
    }

    /** Returns the rows by rising leading bits. */
    public List<BigInteger> rows() {
        List<BigInteger> rows = new ArrayList<>(rank);
        for (long[] row : rowByLead) {
            if (row != null) {
                rows.add(word(row));
            }
        }
        return List.copyOf(rows);
    }

    /**
     * Returns the sum of chosen rows.
     *
     * @param chosen bit i stands for the i-th of the {@link #rows}; 0 ≤ chosen &lt; 2^rank
     */
    public BigInteger combination(BigInteger chosen) {
        if (chosen.signum() < 0 || chosen.bitLength() > rank) {
            throw new IllegalArgumentException("there are " + rank + " rows to choose from");
        }
        long[] sum = new long[length()];
        long[] choice = limbs(chosen);
        int next = 0;
        for (long[] row : rowByLead) {
            if (row != null && bit(choice, next++)) {
                addTo(sum, row);
            }
        }
        return word(sum);
    }

    /**
     * Returns a basis of the orthogonal complement {t : t·w = 0 for every word w added}.
     *
     * <p>A bit is free if it leads no row. The k-th word returned has the k-th free bit as its lowest bit, and no other
     * free bit: the reduced echelon form seen from the low end, which depends on the span alone.
     *
     * @return width − rank words by rising free bits
     */
    public List<BigInteger> complement() {
        List<BigInteger> words = new ArrayList<>(width - rank);
        for (int free = 0; free < width; free++) {
            if (rowByLead[free] == null) {
                long[] word = new long[length()];
                word[free >> 6] |= 1L << free;
                for (int lead = free + 1; lead < width; lead++) {
                    if (rowByLead[lead] != null && bit(rowByLead[lead], free)) {
                        word[lead >> 6] |= 1L << lead;
                    }
                }
                words.add(word(word));
            }
        }
        return List.copyOf(words);
    }

    private long[] rest(BigInteger word) {
        if (word.signum() < 0 || word.bitLength() > width) {
            throw new IllegalArgumentException("word does not fit " + width + " bits");
        }
        long[] rest = limbs(word);
        for (int i = word.bitLength() - 1; i >= 0; i--) {
            if (rowByLead[i] != null && bit(rest, i)) {
                addTo(rest, rowByLead[i]);
            }
        }
        return rest;
    }

    private int length() {
        return (width + Long.SIZE - 1) / Long.SIZE;
    }

    private static void addTo(long[] sum, long[] summand) {
        for (int i = 0; i < sum.length; i++) {
            sum[i] ^= summand[i];
        }
    }

    private static boolean bit(long[] limbs, int index) {
        return (limbs[index >> 6] >>> index & 1) != 0;
    }

    private static int lead(long[] limbs) {
        for (int i = limbs.length - 1; i >= 0; i--) {
            if (limbs[i] != 0) {
                return i * Long.SIZE + 63 - Long.numberOfLeadingZeros(limbs[i]);
            }
        }
        return -1;
    }

    /** Returns the number, lowest 64 bits first. */
    private long[] limbs(BigInteger word) {
        long[] limbs = new long[length()];
        byte[] digits = word.toByteArray();
        for (int i = 0; i < digits.length; i++) {
            int place = digits.length - 1 - i;
            // The highest byte may be one of sign, which is 0 and may lie beyond the width.
            if (digits[i] != 0) {
                limbs[place >> 3] |= (long) Byte.toUnsignedInt(digits[i]) << (place % Long.BYTES * Byte.SIZE);
            }
        }
        return limbs;
    }

    private static BigInteger word(long[] limbs) {
        ByteBuffer digits = ByteBuffer.allocate(limbs.length * Long.BYTES);
        for (int i = limbs.length - 1; i >= 0; i--) {
            digits.putLong(limbs[i]);
        }
        return new BigInteger(1, digits.array());
    }
}
