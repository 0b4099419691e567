package org.notchwork.report;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.OptionalInt;
import org.notchwork.bundle.Results;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.law.ReadoutNoise;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** Cells with disturbed samples, beside the rounds that theory says are needed. */
final class NoiseSection {

    private static final BigDecimal FAILURE = new BigDecimal("0.1");

    private final Results results;

    NoiseSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        boolean isNoisy = results.study().experiments().stream()
                .flatMap(e -> e.strategies().stream())
                .anyMatch(c -> !c.noise().isNone());
        if (!isNoisy) {
            return;
        }
        flow.heading("Disturbed samples");
        Table table = new Table(
                Table.Column.left("cell"),
                Table.Column.right("p"),
                Table.Column.right("q"),
                Table.Column.right("rounds"),
                Table.Column.right("success"),
                Table.Column.right("peak bound"),
                Table.Column.right("ML bound"),
                Table.Column.right("information"),
                Table.Column.right("pooled draws"));
        for (CellFigures cell : results.summary().cells()) {
            Experiment experiment =
                    results.study().experiment(cell.cell().experiment()).orElseThrow();
            StrategyChoice choice = experiment.choice(cell.cell().label()).orElseThrow();
            if (!choice.noise().isNone()) {
                row(table, cell, choice);
            }
        }
        table.set(flow);
        flow.note(
                "p: each measured bit is flipped; q: a sample is replaced by a uniform word. Peak and ML bound: rounds for"
                        + " at most 10 % failure of a period of weight n/2 (upper bounds); information: rounds below which nothing"
                        + " can succeed reliably; pooled draws: expected draws of n - 1 words until one is undisturbed and"
                        + " independent. They hold for q = 0.");
    }

    private static void row(Table table, CellFigures cell, StrategyChoice choice) {
        int width = cell.cell().width();
        int weight = Math.max(1, width / 2);
        OptionalInt samples =
                choice.strategy() instanceof QuantumStrategy quantum ? quantum.samples(width) : OptionalInt.empty();
        ReadoutNoise noise = new ReadoutNoise(choice.noise().readoutFlip());
        boolean isFlip = choice.noise().readoutFlip().signum() > 0
                && choice.noise().uniformMix().signum() == 0;
        table.add(
                cell.cell().id(),
                choice.noise().readoutFlip().toPlainString(),
                choice.noise().uniformMix().toPlainString(),
                samples.isPresent() ? Integer.toString(samples.getAsInt()) : "-",
                Decimals.text(cell.success(), 4),
                isFlip ? Integer.toString(noise.peakRounds(width, weight, FAILURE)) : "-",
                isFlip ? Integer.toString(noise.likelihoodRounds(width, weight, FAILURE)) : "-",
                isFlip ? Decimals.text(noise.informationBound(width, weight).value(), 1) : "-",
                isFlip ? Decimals.text(noise.pooledDraws(width, weight).value(), 1) : "-");
    }
}
