package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.font.PDFont;

/** A table that may run over several pages; its headings are repeated on each. Cells wrap and never overlap. */
final class Table {

    private static final float GUTTER = 4;
    private static final float PADDING = 1.6f;

    /**
     * A column.
     *
     * @param heading the heading
     * @param share its share of the measure, any unit
     * @param right whether its cells are set to the right
     */
    record Column(String heading, float share, boolean right) {

        static Column left(String heading, float share) {
            return new Column(heading, share, false);
        }

        static Column right(String heading, float share) {
            return new Column(heading, share, true);
        }
    }

    private final List<Column> columns;
    private final Style body;
    private final Style head;
    private final List<List<String>> rows = new ArrayList<>();

    Table(List<Column> columns) {
        this(columns, Style.SMALL, Style.SMALL_STRONG);
    }

    private Table(List<Column> columns, Style body, Style head) {
        this.columns = List.copyOf(columns);
        this.body = body;
        this.head = head;
    }

    /** Returns a table with many columns, set smaller. */
    static Table wide(List<Column> columns) {
        return new Table(columns, Style.TINY, Style.TINY_STRONG);
    }

    /** Adds a row with one text a column. */
    void add(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException(cells.size() + " cells in " + columns.size() + " columns");
        }
        rows.add(List.copyOf(cells));
    }

    /** Sets the table. */
    void set(Flow flow) throws IOException {
        List<String> headings = columns.stream().map(Column::heading).toList();
        row(flow, headings, head, false);
        for (List<String> row : rows) {
            row(flow, row, body, true);
        }
        flow.gap(6);
    }

    private void row(Flow flow, List<String> cells, Style style, boolean repeatHeadings) throws IOException {
        PDFont font = style.font(flow.fonts());
        List<List<String>> wrapped = new ArrayList<>();
        int lines = 1;
        for (int c = 0; c < columns.size(); c++) {
            List<String> cell = Wrap.lines(font, style.size(), cells.get(c), width(c) - GUTTER);
            wrapped.add(cell);
            lines = Math.max(lines, cell.size());
        }
        float height = lines * style.leading() + 2 * PADDING;
        float before = flow.y();
        flow.require(height + (repeatHeadings ? 0 : 2 * style.leading()));
        if (repeatHeadings && flow.y() > before) {
            row(flow, columns.stream().map(Column::heading).toList(), head, false);
        }
        float x = Flow.MARGIN;
        for (int c = 0; c < columns.size(); c++) {
            for (int i = 0; i < wrapped.get(c).size(); i++) {
                String text = wrapped.get(c).get(i);
                float inset = columns.get(c).right() ? width(c) - GUTTER - Fonts.width(font, style.size(), text) : 0;
                float at = flow.y() - PADDING - style.leading() * i - style.size();
                flow.draw(style, Style.INK, text, x + inset, at);
            }
            x += width(c);
        }
        flow.down(height);
        flow.line(Flow.MARGIN, Flow.MARGIN + Flow.MEASURE, flow.y(), Style.RULE);
    }

    private float width(int column) {
        float all = 0;
        for (Column c : columns) {
            all += c.share();
        }
        return Flow.MEASURE * columns.get(column).share() / all;
    }
}
