package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.Studies.allChoices;
import static org.notchwork.support.Studies.classical;
import static org.notchwork.support.Studies.experiment;
import static org.notchwork.support.Studies.study;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.json.JsonInteger;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.support.Streams;

/** The forecast of cost: every cell once, censoring foretold exactly, memory no less than what must be held. */
class ForecastTest {

    @Test
    void everyCellIsForecastOnceInTheOrderOfTheStudy() {
        Study study = Studies.small();
        assertEquals(
                study.cells(),
                Forecast.of(study).stream().map(CellForecast::cell).toList());
        Forecast.of(study).forEach(c -> {
            assertEquals(study.experiment(c.cell().experiment()).orElseThrow().trials(), c.trials());
            assertEquals(c.trials() * c.nanosPerTrial(), c.nanos());
        });
    }

    /** The mean is found by running the scan on every secret of width 6, not by the law that the forecast asks. */
    @Test
    void censoringIsForetoldExactlyWhenTheMeanIsAboveTheLimit() {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        StrategyChoice scan = classical("sequential-scan");
        long sum = 0;
        for (Answer hidden : problem.answers(6)) {
            Meter meter = new Meter(64);
            ((ClassicalStrategy) scan.strategy())
                    .attempt(
                            new Oracle(
                                    problem.drawHiding(hidden, 6, Streams.named("labels"))
                                            .function(),
                                    meter),
                            Streams.named("unused"));
            sum += meter.counts().queries();
        }
        long below = sum / 63;
        assertTrue(sum % 63 != 0, "the mean is no whole number, or the limits below do not tell");
        CellForecast cut = scanWithLimit(scan, below);
        assertEquals(
                Optional.of("mean " + Math.round(sum / 63.0) + " is above the limit " + below
                        + ": most trials will be censored"),
                cut.remark());
        assertEquals(BigDecimal.valueOf(below), cut.queries());
        CellForecast whole = scanWithLimit(scan, below + 1);
        assertEquals(Optional.empty(), whole.remark());
        assertEquals(sum / 63.0, whole.queries().doubleValue(), 1e-12);
    }

    @Test
    void aLimitOfOneCensorsEverythingAndTheLargestNothing() {
        Forecast.of(small(1)).forEach(c -> {
            assertEquals(BigDecimal.ONE, c.queries(), c.toString());
            assertTrue(c.remark().isPresent(), c.toString());
        });
        Forecast.of(small(JsonInteger.MAX)).forEach(c -> assertEquals(Optional.empty(), c.remark(), c.toString()));
    }

    /** Eight bytes an entry of a table, four (a float) an amplitude of 2n qubits: what the data alone take. */
    @Test
    void memoryIsAtLeastWhatMustBeHeld() {
        for (CellForecast c : Forecast.of(of(Labelling.TABLE, List.of(2, 3, 5, 8, 13)))) {
            long table = 8L << c.cell().width();
            long amplitudes = c.cell().label().endsWith("@statevector")
                    ? 4L << (2 * c.cell().width())
                    : 0;
            assertTrue(c.memoryBytes() >= table + amplitudes, c.toString());
        }
    }

    @Test
    void aPermutationHoldsNoTable() {
        Study wide = study(new Experiment(
                "main",
                new XorPeriod(Labelling.PERMUTATION),
                List.of(40, 63),
                List.of(allChoices().get(5)),
                1,
                1000));
        List<CellForecast> cells = Forecast.of(wide);
        assertEquals(2, cells.size());
        cells.forEach(c -> assertTrue(c.memoryBytes() > 0 && c.memoryBytes() < 1 << 20, c.toString()));
    }

    /** A limit of 2^53 - 1 at width 63 must not overflow into a small or negative number. */
    @Test
    void theLargestScanNeedsMoreMemoryThanAnyMachineHas() {
        Study wide = study(new Experiment(
                "main",
                new XorPeriod(Labelling.PERMUTATION),
                List.of(63),
                List.of(classical("random-draws")),
                1,
                JsonInteger.MAX));
        assertTrue(Forecast.of(wide).get(0).memoryBytes() > 1L << 50);
    }

    @Test
    void widerInstancesCostMore() {
        List<CellForecast> cells = Forecast.of(of(Labelling.TABLE, List.of(4, 8, 12)));
        for (int i = 6; i < cells.size(); i++) {
            CellForecast narrow = cells.get(i - 6);
            CellForecast wide = cells.get(i);
            assertEquals(narrow.cell().label(), wide.cell().label());
            assertTrue(wide.nanosPerTrial() > narrow.nanosPerTrial(), narrow + " " + wide);
            assertTrue(wide.memoryBytes() > narrow.memoryBytes(), narrow + " " + wide);
        }
    }

    @Test
    void withoutCrossChecksTheTotalIsTheSumOfTheCells() {
        Study checked = Studies.small();
        Study unchecked = Studies.of(Studies.SMALL.replace("\"cross-check-width\": 5", "\"cross-check-width\": 0"));
        double cells =
                Forecast.of(unchecked).stream().mapToDouble(CellForecast::nanos).sum();
        assertEquals(cells, Forecast.totalNanos(unchecked));
        assertTrue(Forecast.totalNanos(checked) > cells);
        assertEquals(0, Forecast.examinationNanos(checked, checked.experiments().get(1), 6, 0));
    }

    private static Study small(long limit) {
        return Studies.of(Studies.SMALL
                .replace("\"query-limit\": 1000", "\"query-limit\": " + limit)
                .replace("\"query-limit\": 9\n", "\"query-limit\": " + limit + "\n"));
    }

    private static Study of(Labelling labelling, List<Integer> widths) {
        return study(new Experiment("main", new XorPeriod(labelling), widths, allChoices(), 1, JsonInteger.MAX));
    }

    private static CellForecast scanWithLimit(StrategyChoice scan, long limit) {
        return Forecast.of(study(experiment(List.of(6), List.of(scan), 3, limit)))
                .get(0);
    }
}
