package org.notchwork.bundle;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.ControlFigures;
import org.notchwork.figure.FunctionFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.SplitFigures;
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
        JsonObject.Builder json = JsonObject.builder()
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
                .put("wrong", figures.wrong());
        if (figures.unanswered() > 0) {
            json.put("unanswered", figures.unanswered());
        }
        if (!figures.byFunction().isEmpty()) {
            json.put(
                    "by-function",
                    array(figures.byFunction().stream()
                            .map(SummaryFile::function)
                            .toList()));
        }
        if (!figures.split().isEmpty()) {
            json.put(
                    "by-hidden",
                    array(figures.split().stream().map(SummaryFile::side).toList()));
        }
        figures.control().ifPresent(c -> json.put("control", control(c)));
        return json.build();
    }

    private static JsonObject function(FunctionFigures figures) {
        return JsonObject.builder()
                .put("function", figures.function())
                .put("max", figures.max())
                .put("mean", Decimals.text(figures.mean()))
                .build();
    }

    private static JsonObject side(SplitFigures figures) {
        return JsonObject.builder()
                .put("hidden", figures.hidden())
                .put("solved", figures.solved())
                .put("success-interval", interval(figures.interval()))
                .put("success-rate", Decimals.text(figures.success()))
                .put("trials", figures.trials())
                .build();
    }

    private static JsonObject control(ControlFigures figures) {
        return JsonObject.builder()
                .put("chance", Decimals.text(figures.chance()))
                .put("claimed", figures.claimed())
                .put("failed", figures.failed())
                .put("flagged", figures.isFlagged())
                .put("named-secret", figures.named())
                .put("p", Decimals.text(figures.p()))
                .put("trials", figures.trials())
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
