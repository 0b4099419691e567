package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

class IntervalsTest {

    /**
     * NIST/SEMATECH e-Handbook of Statistical Methods, section 1.3.5.2, ZARR13.DAT. Mean and deviation are printed with
     * six places, so the ends are met to within one unit of the last.
     */
    @Test
    void theMeanOfZarr13HasItsPublishedInterval() {
        Interval interval = MeanInterval.of(new BigDecimal("9.261460"), new BigDecimal("0.022789"), 195);
        assertEquals(9.258242, interval.low().doubleValue(), 1e-6);
        assertEquals(9.264679, interval.high().doubleValue(), 1e-6);
    }

    @Test
    void theIntervalsOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("L").required("mean_ci");
        assertInterval(rows.required("ZARR13"), 195);
        assertInterval(rows.required("sleep"), 10);
    }

    /** The quantile has six places and the printed deviation ten digits, so the ends are right to 10^−6 s. */
    private static void assertInterval(JsonNode row, int size) {
        BigDecimal deviation = new BigDecimal(row.required("sd").asString());
        Interval interval = MeanInterval.of(new BigDecimal(row.required("mean").asString()), deviation, size);
        double tolerance = 1e-6 * deviation.doubleValue();
        assertEquals(
                Double.parseDouble(row.required("lo").asString()),
                interval.low().doubleValue(),
                tolerance);
        assertEquals(
                Double.parseDouble(row.required("hi").asString()),
                interval.high().doubleValue(),
                tolerance);
    }

    private static final class Sample {

        private final BigDecimal[] x;
        private final BigDecimal[] y;

        private Sample(BigDecimal[] x, BigDecimal[] y) {
            this.x = x;
            this.y = y;
        }

        static Sample draw(int size, long number) {
            RandomStream stream = Streams.numbered("fieller " + size, number);
            BigDecimal[] x = new BigDecimal[size];
            BigDecimal[] y = new BigDecimal[size];
            for (int i = 0; i < size; i++) {
                long common = stream.below(20);
                x[i] = BigDecimal.valueOf(40 + 2 * common + stream.below(30));
                y[i] = BigDecimal.valueOf(20 + common + stream.below(10));
            }
            return new Sample(x, y);
        }

        Optional<Interval> interval() {
            return FiellerInterval.of(mean(x), mean(y), covariance(x, x), covariance(x, y), covariance(y, y), x.length);
        }

        /** The t statistic of the mean of x − ρ y against 0, from the differences themselves. */
        BigDecimal statistic(BigDecimal ratio) {
            BigDecimal[] differences = new BigDecimal[x.length];
            for (int i = 0; i < x.length; i++) {
                differences[i] = x[i].subtract(ratio.multiply(y[i]));
            }
            BigDecimal error = Decimals.root(
                    covariance(differences, differences).divide(BigDecimal.valueOf(x.length), Decimals.CONTEXT));
            return mean(differences).divide(error, Decimals.CONTEXT);
        }

        private static BigDecimal mean(BigDecimal[] a) {
            return Arrays.stream(a)
                    .reduce(BigDecimal.ZERO, BigDecimal::add)
                    .divide(BigDecimal.valueOf(a.length), Decimals.CONTEXT);
        }

        private static BigDecimal covariance(BigDecimal[] a, BigDecimal[] b) {
            BigDecimal sum = BigDecimal.ZERO;
            for (int i = 0; i < a.length; i++) {
                sum = sum.add(a[i].subtract(mean(a)).multiply(b[i].subtract(mean(b))));
            }
            return sum.divide(BigDecimal.valueOf(a.length - 1L), Decimals.CONTEXT);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {5, 12, 60})
    void fiellersIntervalIsTheSetOfRatiosThatTheTTestDoesNotReject(int size) {
        BigDecimal t = StudentT.quantile(size - 1L);
        for (int number = 0; number < 10; number++) {
            Sample sample = Sample.draw(size, number);
            Interval interval = sample.interval().orElseThrow();
            assertPrints(Decimals.text(t, 30), sample.statistic(interval.low()));
            assertPrints(Decimals.text(t.negate(), 30), sample.statistic(interval.high()));
            BigDecimal length = interval.high().subtract(interval.low());
            for (int step = -10; step <= 20; step++) {
                BigDecimal ratio =
                        interval.low().add(length.multiply(Decimals.quotient(2L * step + 1, 20), Decimals.CONTEXT));
                boolean inside = step >= 0 && step < 10;
                assertEquals(inside, sample.statistic(ratio).abs().compareTo(t) < 0);
            }
        }
    }

    /** The t test of the mean denominator against 0: √N ȳ / s beyond t. */
    @Test
    void thereIsAnIntervalExactlyIfTheDenominatorDiffersFromZero() {
        BigDecimal t = StudentT.quantile(2);
        int present = 0;
        for (int number = 0; number < 200; number++) {
            Sample sample = Sample.draw(3, number);
            BigDecimal square = Sample.mean(sample.y).pow(2).multiply(BigDecimal.valueOf(3));
            boolean differs = square.compareTo(t.pow(2).multiply(Sample.covariance(sample.y, sample.y))) > 0;
            assertEquals(differs, sample.interval().isPresent());
            present += differs ? 1 : 0;
        }
        assertNotEquals(0, present);
        assertNotEquals(200, present);
    }

    @Test
    void aDenominatorThatMayBeZeroHasNoBoundedInterval() {
        BigDecimal one = BigDecimal.ONE;
        assertEquals(Optional.empty(), FiellerInterval.of(one, new BigDecimal("0.1"), one, BigDecimal.ZERO, one, 10));
    }

    @Test
    void constantCountsHaveTheirRatioAsInterval() {
        BigDecimal zero = BigDecimal.ZERO;
        Interval interval = FiellerInterval.of(BigDecimal.valueOf(10), BigDecimal.valueOf(4), zero, zero, zero, 7)
                .orElseThrow();
        assertEquals(0, interval.low().compareTo(new BigDecimal("2.5")));
        assertEquals(0, interval.high().compareTo(new BigDecimal("2.5")));
    }

    @Test
    void anIntervalHasItsEndsInOrder() {
        assertThrows(IllegalArgumentException.class, () -> new Interval(BigDecimal.TEN, BigDecimal.ONE));
        Interval point = new Interval(BigDecimal.ONE, BigDecimal.ONE);
        assertEquals(point.low(), point.high());
    }
}
