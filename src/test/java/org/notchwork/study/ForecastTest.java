package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Studies;

/** What a study will cost, against published means and against what is known of the memory. */
class ForecastTest {

    private static final String ONE = """
            { "format": "notchwork-study/1", "title": "One", "question": "Invented?", "seed": "a seed for forecasts",
              "cross-check-width": CHECK,
              "experiments": [ { "id": "one", "problem": { "kind": "xor-period", "instances": "permutation" },
                "widths": [WIDTH], "strategies": [STRATEGY], "trials": TRIALS, "query-limit": LIMIT } ] }
            """;

    private static final String SCAN = "{ \"name\": \"sequential-scan\" }";
    private static final String DRAWS = "{ \"name\": \"random-draws\" }";
    private static final String FIBRE = "{ \"name\": \"fourier-sampling\", \"engine\": \"fibre\" }";

    /** Means: (N + 4) / 3; 4^M / C(2M, M), M = N / 2; the sum of 1 / (1 - 2^-i). To six places; derived apart. */
    @ParameterizedTest
    @CsvSource({
        "16, scan, 21846.666667",
        "24, scan, 5592406.666667",
        "16, draws, 320.849643",
        "24, draws, 5133.574783",
        "16, fibre, 16.606665",
        "24, fibre, 24.606695"
    })
    void expectedQueriesAreTheExactMean(int width, String strategy, BigDecimal mean) {
        CellForecast cell = one(width, strategy, 10, 100_000_000).get(0);
        assertTrue(cell.queries().subtract(mean).abs().compareTo(new BigDecimal("0.0000005")) <= 0, cell.toString());
        assertEquals(Optional.empty(), cell.remark());
    }

    @Test
    void theLimitCutsTheExpectationAndIsRemarkedOn() {
        CellForecast cell = one(24, "scan", 10, 100_000).get(0);
        assertEquals(new BigDecimal(100_000), cell.queries());
        assertEquals(
                Optional.of("mean 5592407 is above the limit 100000: many trials will be censored"), cell.remark());
    }

    /** At width 3 a scan has the mean (8 + 4) / 3 = 4 exactly. */
    @Test
    void aLimitAtTheMeanIsEnough() {
        assertEquals(Optional.empty(), one(3, "scan", 10, 4).get(0).remark());
        assertEquals(
                Optional.of("mean 4 is above the limit 3: many trials will be censored"),
                one(3, "scan", 10, 3).get(0).remark());
    }

    /** The limit is on all calls: 16.6 rounds and two calls that confirm. */
    @Test
    void callsThatConfirmCountAgainstTheLimit() {
        assertEquals(Optional.empty(), one(16, "fibre", 10, 19).get(0).remark());
        assertEquals(
                Optional.of("mean 16.6 and 2 confirming calls are above the limit 18: many trials will be censored"),
                one(16, "fibre", 10, 18).get(0).remark());
    }

    @Test
    void everyCellOfTheStudyHasAForecastInItsOrder() {
        Study study = Studies.small();
        List<CellForecast> forecasts = Forecast.of(study);
        assertEquals(study.cells(), forecasts.stream().map(CellForecast::cell).toList());
        forecasts.forEach(f -> {
            assertTrue(f.nanosPerTrial() > 0 && f.memoryBytes() > 0, f.toString());
            assertEquals(f.trials() * f.nanosPerTrial(), f.nanos());
        });
    }

    /** 2^26 amplitudes at the greatest width, each an exact integer of 4 bytes, and little besides. */
    @Test
    void aStateVectorNeedsRoomForItsAmplitudes() {
        CellForecast cell = Forecast.of(
                        study(13, "{ \"name\": \"fourier-sampling\", \"engine\": \"statevector\" }", 1, 100, 0))
                .get(0);
        assertTrue(cell.memoryBytes() >= 4L << 26, cell.toString());
        assertTrue(cell.memoryBytes() < 8L << 26, cell.toString());
    }

    @Test
    void twiceTheTrialsTakeTwiceTheTime() {
        for (int check : new int[] {0, 8}) {
            double once = Forecast.totalNanos(study(8, FIBRE, 1000, 1000, check));
            double twice = Forecast.totalNanos(study(8, FIBRE, 2000, 1000, check));
            assertEquals(2, twice / once, 1e-9);
        }
    }

    @Test
    void crossChecksCostAndOnlyUpToTheirWidth() {
        Study without = study(8, SCAN, 100, 1000, 7);
        Study with = study(8, SCAN, 100, 1000, 8);
        double each = Forecast.examinationNanos(with, with.experiments().get(0), 8, 0);
        assertEquals(0, Forecast.examinationNanos(without, without.experiments().get(0), 8, 0));
        assertTrue(each > 0);
        assertEquals(
                100 * each, Forecast.totalNanos(with) - Forecast.totalNanos(without), 1e-6 * Forecast.totalNanos(with));
    }

    /** The engines are compared on every instance to width 10 and on the first sixteen beyond. */
    @Test
    void beyondWidthTenTheEnginesAreComparedOnTheFirstInstancesOnly() {
        Study study = study(11, FIBRE, 100, 1000, 11);
        Experiment experiment = study.experiments().get(0);
        double compared = Forecast.examinationNanos(study, experiment, 11, 15);
        double enumerated = Forecast.examinationNanos(study, experiment, 11, 16);
        assertTrue(enumerated > 0 && compared > 10 * enumerated, compared + " against " + enumerated);
        Study narrow = study(10, FIBRE, 100, 1000, 11);
        assertEquals(
                Forecast.examinationNanos(narrow, narrow.experiments().get(0), 10, 15),
                Forecast.examinationNanos(narrow, narrow.experiments().get(0), 10, 16));
    }

    private static List<CellForecast> one(int width, String strategy, int trials, long limit) {
        String choice = switch (strategy) {
            case "scan" -> SCAN;
            case "draws" -> DRAWS;
            default -> FIBRE;
        };
        return Forecast.of(study(width, choice, trials, limit, 0));
    }

    private static Study study(int width, String choice, int trials, long limit, int check) {
        return Studies.of(ONE.replace("CHECK", Integer.toString(check))
                .replace("WIDTH", Integer.toString(width))
                .replace("STRATEGY", choice)
                .replace("TRIALS", Integer.toString(trials))
                .replace("LIMIT", Long.toString(limit)));
    }
}
