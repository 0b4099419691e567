package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.exact.Decimals;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.support.Studies;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

class SummaryBuilderTest {

    private final Experiment experiment = Studies.experiment(List.of(3, 5), Studies.allChoices(), 40, 8);
    private final List<TrialGroup> groups = Studies.run(experiment);

    private Summary summary() {
        SummaryBuilder builder = new SummaryBuilder(Studies.study(experiment));
        groups.forEach(builder::add);
        return builder.summary();
    }

    private List<TrialRecord> records(Cell cell) {
        return groups.stream()
                .flatMap(g -> g.records().stream())
                .filter(r -> r.cell().equals(cell))
                .toList();
    }

    private static long count(List<TrialRecord> records, Outcome outcome) {
        return records.stream().filter(r -> r.outcome() == outcome).count();
    }

    @Test
    void figuresOfACellAreThoseOfItsRecords() {
        Summary summary = summary();
        assertEquals(
                experiment.cells(),
                summary.cells().stream().map(CellFigures::cell).toList());
        for (CellFigures figures : summary.cells()) {
            List<TrialRecord> records = records(figures.cell());
            assertEquals(40, figures.trials());
            assertEquals(count(records, Outcome.SOLVED), figures.solved());
            assertEquals(count(records, Outcome.WRONG), figures.wrong());
            assertEquals(count(records, Outcome.CENSORED), figures.censored());
            assertEquals(
                    records.stream().mapToLong(r -> r.counts().confirming()).sum(), figures.confirming());
            assertEquals(Decimals.quotient(figures.solved(), 40), figures.success());
            assertEquals(ClopperPearson.interval(figures.solved(), 40), figures.successInterval());
            assertEquals(
                    Decimals.quotient(
                            records.stream()
                                    .mapToLong(r -> r.counts().queries())
                                    .sum(),
                            40),
                    figures.queries().mean());
        }
        assertTrue(summary.cells().stream().anyMatch(f -> f.censored() > 0 && f.solved() > 0));
    }

    @Test
    void ratiosPairTheTrialsOfTwoCells() {
        Summary summary = summary();
        int choices = experiment.strategies().size();
        assertEquals(2 * choices * (choices - 1) / 2, summary.ratios().size());
        for (RatioFigures ratio : summary.ratios()) {
            List<TrialRecord> of = records(ratio.of());
            List<TrialRecord> to = records(ratio.to());
            long censored = 0;
            for (int i = 0; i < of.size(); i++) {
                assertEquals(of.get(i).hidden(), to.get(i).hidden());
                boolean cut =
                        of.get(i).outcome() == Outcome.CENSORED || to.get(i).outcome() == Outcome.CENSORED;
                censored += cut ? 1 : 0;
            }
            assertEquals(40, ratio.pairs());
            assertEquals(censored, ratio.censored());
            assertEquals(
                    Decimals.quotient(
                            of.stream().mapToLong(r -> r.counts().queries()).sum(),
                            to.stream().mapToLong(r -> r.counts().queries()).sum()),
                    ratio.ratio());
            Interval interval = ratio.interval().orElseThrow();
            assertTrue(interval.low().compareTo(ratio.ratio()) <= 0);
            assertTrue(interval.high().compareTo(ratio.ratio()) >= 0);
        }
    }

    @Test
    void theInverseRatioIsThatOfTheExchangedCells() {
        List<Experiment> orders = List.of(
                Studies.experiment(
                        List.of(5),
                        List.of(Studies.classical("sequential-scan"), Studies.classical("random-draws")),
                        30,
                        100),
                Studies.experiment(
                        List.of(5),
                        List.of(Studies.classical("random-draws"), Studies.classical("sequential-scan")),
                        30,
                        100));
        List<RatioFigures> ratios = orders.stream()
                .map(order -> {
                    SummaryBuilder builder = new SummaryBuilder(Studies.study(order));
                    Studies.run(order).forEach(builder::add);
                    return builder.summary().ratios().get(0);
                })
                .toList();
        RatioFigures inverse = ratios.get(0).inverse();
        RatioFigures exchanged = ratios.get(1);
        assertEquals(exchanged.of(), inverse.of());
        assertEquals(exchanged.to(), inverse.to());
        assertEquals(Decimals.text(exchanged.ratio(), 40), Decimals.text(inverse.ratio(), 40));
        assertEquals(written(exchanged.interval()), written(inverse.interval()));
    }

    private static Optional<String> written(Optional<Interval> interval) {
        return interval.map(i -> Decimals.text(i.low(), 40) + " to " + Decimals.text(i.high(), 40));
    }

    @Test
    void anIntervalThatReachesZeroHasNoInverse() {
        Cell a = new Cell("e", 2, "a");
        Cell b = new Cell("e", 2, "b");
        Interval reaching = new Interval(BigDecimal.ONE.negate(), BigDecimal.ONE);
        RatioFigures figures = new RatioFigures(a, b, 5, 1, BigDecimal.valueOf(4), Optional.of(reaching));
        RatioFigures inverse = figures.inverse();
        assertEquals(Optional.empty(), inverse.interval());
        assertEquals(new BigDecimal("0.25"), inverse.ratio());
        assertEquals(1, inverse.censored());
    }
}
