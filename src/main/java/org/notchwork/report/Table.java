package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureElement;
import org.apache.pdfbox.pdmodel.documentinterchange.taggedpdf.PDTableAttributeObject;
import org.apache.pdfbox.pdmodel.font.PDFont;

/** A table that may run over several pages; its headings are repeated on each. Cells wrap and never overlap. */
final class Table {

    private static final Style BODY = Style.SMALL;
    private static final Style HEAD = Style.SMALL_STRONG;
    private static final float GUTTER = 8;
    private static final float PADDING = 1.4f;

    /** No column is thought wider than this until all have what they need. */
    private static final float LONG = 260;

    /**
     * A column.
     *
     * @param heading the heading
     * @param right whether its cells are set to the right
     */
    record Column(String heading, boolean right) {

        static Column left(String heading) {
            return new Column(heading, false);
        }

        static Column right(String heading) {
            return new Column(heading, true);
        }
    }

    private record Row(List<String> cells, boolean opensGroup) {}

    private final List<Column> columns;
    private final List<Row> rows = new ArrayList<>();
    private boolean groupNext;

    Table(Column... columns) {
        this.columns = List.of(columns);
    }

    /** Adds a row with one text a column. */
    void add(String... cells) {
        if (cells.length != columns.size()) {
            throw new IllegalArgumentException(cells.length + " cells in " + columns.size() + " columns");
        }
        rows.add(new Row(List.of(cells), groupNext && !rows.isEmpty()));
        groupNext = false;
    }

    /** Sets a stronger line before the next row, if there are rows before it. */
    void group() {
        groupNext = true;
    }

    /** Sets the table; nothing if it has no rows. */
    void set(Flow flow) throws IOException {
        if (rows.isEmpty()) {
            return;
        }
        float[] widths = widths(flow.fonts());
        PDStructureElement table = flow.structure().add("Table");
        List<List<String>> head = wrapped(
                flow.fonts(), HEAD, columns.stream().map(Column::heading).toList(), widths);
        flow.require(height(head, HEAD) + 3 * BODY.leading());
        head(flow, table, head, widths);
        for (Row row : rows) {
            List<List<String>> cells = wrapped(flow.fonts(), BODY, row.cells(), widths);
            if (flow.require(height(cells, BODY))) {
                repeated(flow, head, widths);
            } else if (row.opensGroup()) {
                flow.line(flow.y(), Style.RULE);
            }
            PDStructureElement line = flow.structure().add(table, "TR");
            float x = Flow.MARGIN;
            for (int c = 0; c < columns.size(); c++) {
                cell(flow, flow.structure().add(line, "TD"), BODY, cells.get(c), x, widths[c], c);
                x += widths[c] + GUTTER;
            }
            flow.down(height(cells, BODY));
            flow.line(flow.y(), Style.HAIR);
        }
        flow.line(flow.y(), Style.RULE);
        flow.gap(6);
    }

    private void head(Flow flow, PDStructureElement table, List<List<String>> head, float[] widths) throws IOException {
        PDStructureElement line = flow.structure().add(table, "TR");
        float x = Flow.MARGIN;
        for (int c = 0; c < columns.size(); c++) {
            PDStructureElement heading = flow.structure().add(line, "TH");
            PDTableAttributeObject scope = new PDTableAttributeObject();
            scope.setScope(PDTableAttributeObject.SCOPE_COLUMN);
            heading.addAttribute(scope);
            cell(flow, heading, HEAD, head.get(c), x, widths[c], c);
            x += widths[c] + GUTTER;
        }
        flow.down(height(head, HEAD));
        flow.line(flow.y(), Style.RULE);
    }

    private void repeated(Flow flow, List<List<String>> head, float[] widths) throws IOException {
        float x = Flow.MARGIN;
        for (int c = 0; c < columns.size(); c++) {
            for (int i = 0; i < head.get(c).size(); i++) {
                String text = head.get(c).get(i);
                flow.drawRepeated(
                        HEAD, Style.INK, text, x + inset(flow.fonts(), HEAD, text, widths[c], c), at(flow, HEAD, i));
            }
            x += widths[c] + GUTTER;
        }
        flow.down(height(head, HEAD));
        flow.line(flow.y(), Style.RULE);
    }

    private void cell(Flow flow, PDStructureElement cell, Style style, List<String> lines, float x, float width, int c)
            throws IOException {
        for (int i = 0; i < lines.size(); i++) {
            String text = lines.get(i);
            if (!text.isEmpty()) {
                float inset = inset(flow.fonts(), style, text, width, c);
                flow.draw(cell, style, Style.INK, text, x + inset, at(flow, style, i));
            }
        }
    }

    private static float at(Flow flow, Style style, int line) {
        return flow.y() - PADDING - style.leading() * line - style.size();
    }

    private float inset(Fonts fonts, Style style, String text, float width, int column) throws IOException {
        return columns.get(column).right() ? width - Fonts.width(style.font(fonts), style.size(), text) : 0;
    }

    private static float height(List<List<String>> cells, Style style) {
        int lines = cells.stream().mapToInt(List::size).max().orElse(1);
        return lines * style.leading() + 2 * PADDING;
    }

    private static List<List<String>> wrapped(Fonts fonts, Style style, List<String> cells, float[] widths)
            throws IOException {
        List<List<String>> wrapped = new ArrayList<>();
        for (int c = 0; c < cells.size(); c++) {
            // A hair more than the measured width, so that rounding never breaks a cell that fits.
            wrapped.add(Wrap.lines(style.font(fonts), style.size(), cells.get(c), widths[c] + 0.01f));
        }
        return wrapped;
    }

    private float[] widths(Fonts fonts) throws IOException {
        return wanted(fonts).share(Flow.MEASURE - GUTTER * (columns.size() - 1));
    }

    private ColumnWidths wanted(Fonts fonts) throws IOException {
        float[] words = new float[columns.size()];
        float[] wholes = new float[columns.size()];
        boolean[] firm = new boolean[columns.size()];
        PDFont head = HEAD.font(fonts);
        PDFont body = BODY.font(fonts);
        for (int c = 0; c < words.length; c++) {
            String heading = columns.get(c).heading();
            words[c] = Wrap.widestPart(head, HEAD.size(), heading);
            wholes[c] = Fonts.width(head, HEAD.size(), heading);
            firm[c] = columns.get(c).right();
            for (Row row : rows) {
                String text = Fonts.drawable(body, row.cells().get(c));
                words[c] = Math.max(words[c], Wrap.widestPart(body, BODY.size(), text));
                wholes[c] = Math.max(wholes[c], Math.min(LONG, Fonts.width(body, BODY.size(), text)));
            }
            wholes[c] = Math.max(wholes[c], words[c]);
        }
        return new ColumnWidths(words, wholes, firm);
    }
}
