package org.notchwork.bundle;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.ControlFigures;
import org.notchwork.figure.FunctionFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.SplitFigures;
import org.notchwork.figure.Summary;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonBoolean;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;

/**
 * Reads {@code summary.json} back to the figures, which then have the six places that were written.
 *
 * <p>The cells and ratios must be those of the study, in its order. Whether the numbers are right is for others to ask.
 */
public final class SummaryReader {

    private static final Pattern DECIMAL = Pattern.compile("-?(0|[1-9][0-9]{0,39})\\.[0-9]{6}");
    private static final String MEND = "a decimal with six places, as a string, is wanted";
    private static final int LONGEST = 200;
    private static final int MOST_PARTS = 8;
    private static final int MOST_CHECKS = 100_000;

    private final List<CellFigures> cells = new ArrayList<>();
    private final List<RatioFigures> ratios = new ArrayList<>();

    private SummaryReader() {}

    /**
     * Reads the file.
     *
     * @param value the file
     * @param study the study that it should be about
     * @param faults where faults are noted; what is returned must not be used if there are any
     */
    public static Summary read(JsonValue value, Study study, List<Fault> faults) {
        SummaryReader reader = new SummaryReader();
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.SUMMARY);
        fields.text("attention", 1, LONGEST);
        Fields tally = fields.object("cross-checks");
        for (String outcome : List.of("agree", "differ", "not-comparable")) {
            tally.integer(outcome, 0, MOST_CHECKS);
        }
        tally.end();
        reader.cells(fields, study);
        reader.ratios(fields, study);
        fields.end();
        return new Summary(reader.cells, reader.ratios);
    }

    private void cells(Fields fields, Study study) {
        List<Cell> wanted = study.cells();
        List<Fields.Item> items = fields.items("cells", wanted.size(), wanted.size());
        for (int i = 0; i < Math.min(items.size(), wanted.size()); i++) {
            Cell cell = wanted.get(i);
            StrategyChoice choice = study.experiment(cell.experiment())
                    .flatMap(e -> e.choice(cell.label()))
                    .orElseThrow();
            cells.add(cell(items.get(i).object(), cell, choice));
        }
    }

    private static CellFigures cell(Fields fields, Cell cell, StrategyChoice choice) {
        fields.require("cell", new JsonText(cell.id()));
        choice.engine().ifPresent(e -> fields.require("engine", new JsonText(e.name())));
        choice.sight().ifPresent(s -> fields.require("sight", new JsonText(s)));
        CellFigures figures = new CellFigures(
                cell,
                choice.engine().map(e -> e.name()),
                choice.sight(),
                count(fields, "trials"),
                count(fields, "solved"),
                count(fields, "wrong"),
                count(fields, "censored"),
                fields.optionalInteger("unanswered", 1, JsonInteger.MAX).orElse(0),
                queries(fields.object("queries")),
                count(fields, "confirming-calls"),
                decimal(fields, "success-rate"),
                interval(fields.object("success-interval")),
                functions(fields),
                sides(fields),
                fields.optionalObject("control").map(SummaryReader::control));
        fields.end();
        return figures;
    }

    private static List<FunctionFigures> functions(Fields fields) {
        List<FunctionFigures> figures = new ArrayList<>();
        for (Fields.Item item :
                fields.optionalItems("by-function", 1, MOST_PARTS).orElse(List.of())) {
            Fields one = item.object();
            figures.add(new FunctionFigures(one.text("function", 1, LONGEST), decimal(one, "mean"), count(one, "max")));
            one.end();
        }
        return figures;
    }

    private static List<SplitFigures> sides(Fields fields) {
        List<SplitFigures> figures = new ArrayList<>();
        for (Fields.Item item : fields.optionalItems("by-hidden", 1, MOST_PARTS).orElse(List.of())) {
            Fields one = item.object();
            figures.add(new SplitFigures(
                    one.text("hidden", 1, LONGEST),
                    count(one, "trials"),
                    count(one, "solved"),
                    decimal(one, "success-rate"),
                    interval(one.object("success-interval"))));
            one.end();
        }
        return figures;
    }

    private static ControlFigures control(Fields fields) {
        ControlFigures figures = new ControlFigures(
                count(fields, "trials"),
                count(fields, "named-secret"),
                count(fields, "claimed"),
                count(fields, "failed"),
                decimal(fields, "chance"),
                decimal(fields, "p"));
        fields.require("flagged", new JsonBoolean(figures.isFlagged()));
        fields.end();
        return figures;
    }

    private static QueryFigures queries(Fields fields) {
        QueryFigures figures = new QueryFigures(
                decimal(fields, "mean"),
                fields.optionalText("standard-deviation", DECIMAL, MEND).map(SummaryReader::number),
                fields.optionalObject("mean-interval").map(SummaryReader::interval),
                count(fields, "min"),
                count(fields, "lower-quartile"),
                count(fields, "median"),
                count(fields, "upper-quartile"),
                count(fields, "max"));
        fields.end();
        return figures;
    }

    private void ratios(Fields fields, Study study) {
        List<RatioFigures> wanted = new ArrayList<>();
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                pairs(experiment, width, wanted);
            }
        }
        List<Fields.Item> items = fields.items("ratios", wanted.size(), wanted.size());
        for (int i = 0; i < Math.min(items.size(), wanted.size()); i++) {
            ratios.add(ratio(
                    items.get(i).object(), wanted.get(i).of(), wanted.get(i).to()));
        }
    }

    /** Adds the pairs of a width, the earlier strategy over the later, still without figures. */
    private static void pairs(Experiment experiment, int width, List<RatioFigures> wanted) {
        List<StrategyChoice> choices = experiment.strategies();
        for (int i = 0; i < choices.size(); i++) {
            for (int j = i + 1; j < choices.size(); j++) {
                Cell of = new Cell(experiment.id(), width, choices.get(i).label());
                Cell to = new Cell(experiment.id(), width, choices.get(j).label());
                wanted.add(new RatioFigures(of, to, 0, 0, BigDecimal.ZERO, Optional.empty()));
            }
        }
    }

    private static RatioFigures ratio(Fields fields, Cell of, Cell to) {
        fields.require("of", new JsonText(of.id()));
        fields.require("to", new JsonText(to.id()));
        RatioFigures figures = new RatioFigures(
                of,
                to,
                count(fields, "pairs"),
                count(fields, "censored-pairs"),
                decimal(fields, "ratio"),
                fields.optionalObject("interval").map(SummaryReader::interval));
        fields.end();
        return figures;
    }

    private static long count(Fields fields, String name) {
        return fields.integer(name, 0, JsonInteger.MAX);
    }

    /** Reads a figure with six places. */
    static BigDecimal decimal(Fields fields, String name) {
        return number(fields.text(name, DECIMAL, MEND));
    }

    /** Reads an interval; a reversed one is a fault. */
    static Interval interval(Fields fields) {
        BigDecimal low = decimal(fields, "low");
        BigDecimal high = decimal(fields, "high");
        fields.end();
        if (low.compareTo(high) > 0) {
            fields.fault("low", Decimals.text(low), "at most the upper end, " + Decimals.text(high) + ", is wanted");
            return new Interval(high, low);
        }
        return new Interval(low, high);
    }

    /** An empty text stands for a fault that was noted already. */
    private static BigDecimal number(String text) {
        return text.isEmpty() ? BigDecimal.ZERO.setScale(Decimals.PLACES) : new BigDecimal(text);
    }
}
