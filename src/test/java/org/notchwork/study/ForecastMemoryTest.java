package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.Studies.allChoices;
import static org.notchwork.support.Studies.classical;
import static org.notchwork.support.Studies.study;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.json.JsonInteger;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;

/** The forecast of memory is no less than what must be held, and it grows with the width; so does the time. */
class ForecastMemoryTest {

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

    private static Study small(long limit) {
        return Studies.of(Studies.SMALL
                .replace("\"query-limit\": 1000", "\"query-limit\": " + limit)
                .replace("\"query-limit\": 9\n", "\"query-limit\": " + limit + "\n"));
    }

    private static Study of(Labelling labelling, List<Integer> widths) {
        return study(new Experiment("main", new XorPeriod(labelling), widths, allChoices(), 1, JsonInteger.MAX));
    }
}
