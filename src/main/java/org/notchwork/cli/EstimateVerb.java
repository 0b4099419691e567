package org.notchwork.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Options;
import org.notchwork.exact.Decimals;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;
import org.notchwork.study.CellForecast;
import org.notchwork.study.Forecast;
import org.notchwork.study.Study;

/** Forecasts queries, time and memory of a study without running it. */
final class EstimateVerb implements Verb {

    @Override
    public String name() {
        return "estimate";
    }

    @Override
    public String operands() {
        return "STUDY";
    }

    @Override
    public String purpose() {
        return "forecasts queries, time and memory of a study";
    }

    @Override
    public String example() {
        return "estimate configs/first-light.json";
    }

    @Override
    public Options options() {
        return new Options()
                .addOption(Arguments.valued("threads", "N", "worker threads; one a processor if left out"))
                .addOption(Arguments.flag("json", "print the forecast as one JSON object"));
    }

    @Override
    public Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal {
        Path file = Arguments.onePath(this, operands);
        int threads = Arguments.threads(line);
        Study study = StudyFileReader.read(file);
        List<CellForecast> cells = Forecast.of(study);
        double nanos = Forecast.totalNanos(study) / threads;
        long memory = cells.stream()
                .max(Comparator.comparingLong(CellForecast::memoryBytes))
                .map(CellForecast::memoryBytes)
                .orElse(0L);
        if (line.hasOption("json")) {
            terminal.out().println(CanonicalJson.text(json(cells, nanos, memory, threads)));
        } else {
            print(cells, terminal);
            terminal.out()
                    .println("all: " + Progress.duration(nanos) + " on " + threads
                            + " threads (good to a factor of 3), about " + Sizes.text((double) memory * threads)
                            + " for trials; Java may use "
                            + Sizes.text((double) Runtime.getRuntime().maxMemory()));
        }
        return Exit.GOOD;
    }

    private static void print(List<CellForecast> cells, Terminal terminal) {
        Columns table =
                new Columns(1, List.of("cell", "trials", "queries a trial", "time (one core)", "memory a trial"));
        for (CellForecast cell : cells) {
            table.add(List.of(
                    cell.cell().id(),
                    Long.toString(cell.trials()),
                    Decimals.text(cell.queries(), 1),
                    Progress.duration(cell.nanos()),
                    Sizes.text((double) cell.memoryBytes())));
        }
        table.print(terminal.out());
        cells.forEach(c -> c.remark()
                .ifPresent(r -> terminal.out().println("note: " + c.cell().id() + ": " + r)));
    }

    /** Returns whole microseconds; what is beyond 2^53 − 1 is beyond a lifetime and stands as that. */
    private static long microseconds(double nanos) {
        return (long) Math.min(nanos / 1000, JsonInteger.MAX);
    }

    private static JsonObject json(List<CellForecast> cells, double nanos, long memory, int threads) {
        List<JsonValue> items = new ArrayList<>();
        for (CellForecast cell : cells) {
            items.add(JsonObject.builder()
                    .put("cell", cell.cell().id())
                    .put("memory-bytes", Math.min(cell.memoryBytes(), JsonInteger.MAX))
                    .put("microseconds", microseconds(cell.nanos()))
                    .put("queries", Decimals.text(cell.queries()))
                    .put("remark", cell.remark())
                    .put("trials", cell.trials())
                    .build());
        }
        return JsonObject.builder()
                .put("cells", new JsonArray(items))
                .put("format", "notchwork-estimate/1")
                .put("memory-bytes", (long) Math.min((double) memory * threads, JsonInteger.MAX))
                .put("microseconds", microseconds(nanos))
                .put("threads", threads)
                .build();
    }
}
