package org.notchwork.study;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;

/** Reads one claim. */
final class ClaimReader {

    private static final int LONGEST_TEXT = 1000;
    private static final String DECIMAL_MEND = "a decimal in quotes is wanted, for example \"12.5\"";

    private final NamedCells cells;

    /** Creates a reader of claims about these cells. */
    ClaimReader(NamedCells cells) {
        this.cells = cells;
    }

    /** Returns the claim; empty if faults were noted, or it is about a cell of a faulty experiment. */
    Optional<Claim> read(Fields fields, Ids ids) {
        if (fields.isStandIn()) {
            return Optional.empty();
        }
        int before = fields.faults().size();
        String id = ids.read(fields);
        String text = fields.text("text", 1, LONGEST_TEXT);
        Optional<Quantity> quantity = quantity(fields);
        Optional<Bound> bound = bound(fields);
        fields.end();
        if (fields.faults().size() > before || quantity.isEmpty() || bound.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Claim(id, text, quantity.get(), bound.get()));
    }

    private Optional<Quantity> quantity(Fields fields) {
        boolean hasFigure = fields.has("figure");
        boolean ofCell = fields.has("cell") || hasFigure;
        boolean ofRatio = fields.has("ratio");
        if (ofCell == ofRatio) {
            fields.faults()
                    .add(new Fault(
                            fields.pointer(),
                            ofCell ? "a claim about a cell and a ratio at once" : "a claim about nothing",
                            "either \"figure\" and \"cell\", or \"ratio\" is wanted"));
            return Optional.empty();
        }
        return ofCell ? figure(fields) : ratio(fields.object("ratio"));
    }

    private Optional<Quantity> figure(Fields fields) {
        String word = fields.text("figure", 1, 60);
        Optional<FigureKind> kind = FigureKind.of(word);
        if (kind.isEmpty() && !word.isEmpty()) {
            List<String> words =
                    Arrays.stream(FigureKind.values()).map(FigureKind::word).toList();
            fields.fault("figure", "no figure " + Fields.quoted(word), Spelling.mend(word, words));
        }
        Optional<Cell> cell = cells.read(fields, "cell");
        return kind.isPresent() && cell.isPresent()
                ? Optional.of(new Quantity.OfCell(cell.get(), kind.get()))
                : Optional.empty();
    }

    private Optional<Quantity> ratio(Fields fields) {
        Optional<Cell> of = cells.read(fields, "of");
        Optional<Cell> to = cells.read(fields, "to");
        fields.end();
        if (of.isEmpty() || to.isEmpty()) {
            return Optional.empty();
        }
        boolean paired = of.get().experiment().equals(to.get().experiment())
                && of.get().width() == to.get().width();
        if (!paired || of.get().equals(to.get())) {
            fields.fault(
                    "to",
                    of.get().equals(to.get()) ? "a cell over itself" : "cells that do not face the same instances",
                    "another strategy of the same experiment and width is wanted");
            return Optional.empty();
        }
        return Optional.of(new Quantity.Ratio(of.get(), to.get()));
    }

    private static Optional<Bound> bound(Fields fields) {
        List<String> given = new ArrayList<>();
        for (String name : List.of("at-most", "at-least", "between")) {
            if (fields.has(name)) {
                given.add(name);
            }
        }
        if (given.size() != 1) {
            fields.faults()
                    .add(new Fault(
                            fields.pointer(),
                            given.isEmpty() ? "a claim without a bound" : "a claim with " + given.size() + " bounds",
                            "exactly one of \"at-most\", \"at-least\", \"between\" is wanted"));
            return Optional.empty();
        }
        return switch (given.get(0)) {
            case "at-most" -> decimal(fields, "at-most").map(Bound.AtMost::new);
            case "at-least" -> decimal(fields, "at-least").map(Bound.AtLeast::new);
            default -> between(fields);
        };
    }

    private static Optional<BigDecimal> decimal(Fields fields, String name) {
        String text = fields.text(name, Decimals.FORM, DECIMAL_MEND);
        return text.isEmpty() ? Optional.empty() : Optional.of(new BigDecimal(text));
    }

    private static Optional<Bound> between(Fields fields) {
        List<Fields.Item> items = fields.items("between", 2, 2);
        if (items.size() != 2) {
            return Optional.empty();
        }
        String low = items.get(0).text(Decimals.FORM, DECIMAL_MEND);
        String high = items.get(1).text(Decimals.FORM, DECIMAL_MEND);
        if (low.isEmpty() || high.isEmpty()) {
            return Optional.empty();
        }
        if (new BigDecimal(low).compareTo(new BigDecimal(high)) > 0) {
            fields.fault("between", low + " is above " + high, "the lower bound goes first");
            return Optional.empty();
        }
        return Optional.of(new Bound.Between(new BigDecimal(low), new BigDecimal(high)));
    }
}
