package org.notchwork.cli;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;

/** Rows of text set in columns: the first columns to the left, the others to the right. */
final class Columns {

    private static final String GAP = "  ";

    private final int leftColumns;
    private final List<List<String>> rows = new ArrayList<>();

    /**
     * Creates a table.
     *
     * @param leftColumns how many of the first columns are set to the left
     * @param headings the first row
     */
    Columns(int leftColumns, List<String> headings) {
        this.leftColumns = leftColumns;
        rows.add(List.copyOf(headings));
    }

    /** Adds a row with as many cells as there are headings. */
    void add(List<String> cells) {
        if (cells.size() != rows.get(0).size()) {
            throw new IllegalArgumentException(
                    cells.size() + " cells under " + rows.get(0).size() + " headings");
        }
        rows.add(List.copyOf(cells));
    }

    /** Prints the rows, each column as wide as its widest cell. */
    void print(PrintStream out) {
        int columns = rows.get(0).size();
        int[] widths = new int[columns];
        for (List<String> row : rows) {
            for (int c = 0; c < columns; c++) {
                widths[c] = Math.max(widths[c], length(row.get(c)));
            }
        }
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < columns; c++) {
                String gap = " ".repeat(widths[c] - length(row.get(c)));
                line.append(c == 0 ? "" : GAP).append(c < leftColumns ? row.get(c) + gap : gap + row.get(c));
            }
            out.println(line.toString().stripTrailing());
        }
    }

    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }
}
