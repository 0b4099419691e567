package org.notchwork.study;

/** What a claim is about. A closed set. */
public sealed interface Quantity {

    /**
     * A figure of one cell.
     *
     * @param cell the cell
     * @param figure which figure
     */
    record OfCell(Cell cell, FigureKind figure) implements Quantity {}

    /**
     * The mean queries of one cell divided by those of another at the same experiment and width, on paired trials.
     *
     * @param of the numerator
     * @param to the denominator
     */
    record Ratio(Cell of, Cell to) implements Quantity {}
}
