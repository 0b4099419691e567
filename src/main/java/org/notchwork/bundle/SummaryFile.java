package org.notchwork.bundle;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/** The file of figures: {@code summary.json}. */
public final class SummaryFile {

    private SummaryFile() {}

    /** Returns the file as JSON: every figure rounded by the rule of {@code exact}. */
    public static JsonObject write(Summary summary, List<CrossCheck> checks) {
        return JsonObject.builder()
                .put("attention", attention(checks))
                .put(
                        "cells",
                        array(summary.cells().stream().map(SummaryFile::cell).toList()))
                .put("cross-checks", tally(checks))
                .put("format", Formats.SUMMARY)
                .put(
                        "ratios",
                        array(summary.ratios().stream().map(SummaryFile::ratio).toList()))
                .build();
    }

    /** Returns the sentence that says whether the cross-checks agree; it opens the summary and the read-me. */
    public static String attention(List<CrossCheck> checks) {
        long differ = count(checks, CheckOutcome.DIFFERS);
        return differ == 0
                ? "All cross-checks that could be made agree."
                : "CROSS-CHECKS FAILED: " + differ + " of " + checks.size()
                        + " differ. Do not rely on these figures; see cross-checks.json.";
    }

    /** Returns an interval as the members {@code low} and {@code high}. */
    static JsonObject interval(Interval interval) {
        return JsonObject.builder()
                .put("high", Decimals.text(interval.high()))
                .put("low", Decimals.text(interval.low()))
                .build();
    }

    private static JsonObject tally(List<CrossCheck> checks) {
        return JsonObject.builder()
                .put("agree", count(checks, CheckOutcome.AGREES))
                .put("differ", count(checks, CheckOutcome.DIFFERS))
                .put("not-comparable", count(checks, CheckOutcome.NOT_COMPARABLE))
                .build();
    }

    private static long count(List<CrossCheck> checks, CheckOutcome outcome) {
        return checks.stream().filter(c -> c.outcome() == outcome).count();
    }

    private static JsonObject cell(CellFigures figures) {
        return JsonObject.builder()
                .put("cell", figures.cell().id())
                .put("censored", figures.censored())
                .put("confirming-calls", figures.confirming())
                .put("engine", figures.engine())
                .put("queries", queries(figures.queries()))
                .put("sight", figures.sight())
                .put("solved", figures.solved())
                .put("success-interval", interval(figures.successInterval()))
                .put("success-rate", Decimals.text(figures.success()))
                .put("trials", figures.trials())
                .put("wrong", figures.wrong())
                .build();
    }

    private static JsonObject queries(QueryFigures queries) {
        JsonObject.Builder json = JsonObject.builder()
                .put("lower-quartile", queries.lowerQuartile())
                .put("max", queries.max())
                .put("mean", Decimals.text(queries.mean()))
                .put("median", queries.median())
                .put("min", queries.min())
                .put("standard-deviation", decimal(queries.deviation()))
                .put("upper-quartile", queries.upperQuartile());
        queries.interval().ifPresent(i -> json.put("mean-interval", interval(i)));
        return json.build();
    }

    private static JsonObject ratio(RatioFigures figures) {
        JsonObject.Builder json = JsonObject.builder()
                .put("censored-pairs", figures.censored())
                .put("of", figures.of().id())
                .put("pairs", figures.pairs())
                .put("ratio", Decimals.text(figures.ratio()))
                .put("to", figures.to().id());
        figures.interval().ifPresent(i -> json.put("interval", interval(i)));
        return json.build();
    }

    private static Optional<String> decimal(Optional<BigDecimal> value) {
        return value.map(Decimals::text);
    }

    private static JsonArray array(List<JsonObject> objects) {
        return new JsonArray(objects.stream().<JsonValue>map(o -> o).toList());
    }
}
