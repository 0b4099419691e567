package org.notchwork.report;

import java.util.stream.IntStream;

/**
 * Shares a measure among the columns of a table.
 *
 * <p>If every column can be as wide as its widest cell, what is left is spread evenly. If not, the columns with the
 * widest cells are held to one common width, but none to less than its widest word. If even the widest words do not fit
 * side by side, the columns that are not firm are held to less; firm ones, which hold numbers, only if nothing else
 * helps.
 */
final class ColumnWidths {

    private static final int HALVINGS = 40;

    private final float[] words;
    private final float[] wholes;
    private final boolean[] firm;

    /**
     * Takes what the columns want.
     *
     * @param words the widest word of each column, in points
     * @param wholes the widest cell of each column, unbroken, in points; at least its widest word
     * @param firm whether a column should never break a word
     */
    ColumnWidths(float[] words, float[] wholes, boolean[] firm) {
        this.words = words.clone();
        this.wholes = wholes.clone();
        this.firm = firm.clone();
    }

    /** Returns the widths, in points; their sum is at most the measure. */
    float[] share(float measure) {
        float spare = measure - sum(wholes);
        if (spare >= 0) {
            float[] widths = wholes.clone();
            for (int c = 0; c < widths.length; c++) {
                widths[c] += spare / widths.length;
            }
            return widths;
        }
        boolean wordsFit = sum(words) <= measure;
        boolean firmFit = sum(atMost(0, false)) <= measure;
        float low = 0;
        float high = measure;
        for (int i = 0; i < HALVINGS; i++) {
            float middle = (low + high) / 2;
            if (sum(held(middle, wordsFit, firmFit)) <= measure) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return held(low, wordsFit, firmFit);
    }

    private float[] held(float limit, boolean wordsFit, boolean firmFit) {
        if (!wordsFit) {
            return atMost(limit, !firmFit);
        }
        float[] widths = wholes.clone();
        for (int c = 0; c < widths.length; c++) {
            widths[c] = Math.max(words[c], Math.min(wholes[c], limit));
        }
        return widths;
    }

    private float[] atMost(float limit, boolean firmToo) {
        float[] widths = words.clone();
        for (int c = 0; c < widths.length; c++) {
            if (firmToo || !firm[c]) {
                widths[c] = Math.min(words[c], limit);
            }
        }
        return widths;
    }

    private static float sum(float[] values) {
        return (float)
                IntStream.range(0, values.length).mapToDouble(c -> values[c]).sum();
    }
}
