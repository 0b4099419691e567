package org.notchwork.report;

import java.io.IOException;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.Seal;
import org.notchwork.bundle.SummaryFile;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.json.Printable;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** What a referee sees first: what this is, whether the checks agree, the seal, how to verify, which engines saw what. */
final class CoverSection {

    private final Results results;
    private final String seal;
    private final Environment environment;

    CoverSection(Results results, String seal, Environment environment) {
        this.results = results;
        this.seal = seal;
        this.environment = environment;
    }

    void set(Flow flow) throws IOException {
        flow.text(Style.TITLE, Style.INK, Printable.escape(results.study().title()));
        flow.gap(4);
        flow.body(Printable.escape(results.study().question()));
        boolean good = results.differing() == 0;
        flow.text(Style.STRONG, good ? Style.INK : Style.ALARM, SummaryFile.attention(results.checks()));
        flow.text(
                Style.STRONG,
                Style.INK,
                "Claims: " + count(ClaimVerdict.SUPPORTED) + " supported, " + count(ClaimVerdict.REFUTED) + " refuted, "
                        + count(ClaimVerdict.UNDECIDED) + " undecided.");
        flow.heading("Seal");
        int half = seal.length() / 2;
        flow.text(Style.SEAL, Style.INK, Seal.groups(seal.substring(0, half)));
        flow.text(Style.SEAL, Style.INK, Seal.groups(seal.substring(half)));
        flow.gap(3);
        flow.note("64 hexadecimal digits in eight groups. A shorter form is for talking only.");
        flow.heading("How to verify");
        flow.text(Style.CODE, Style.INK, "java -jar notchwork.jar verify FOLDER --expect " + seal);
        flow.text(Style.CODE, Style.INK, "sha256sum -c --strict --quiet tagmanifest-sha256.txt manifest-sha256.txt");
        flow.text(Style.CODE, Style.INK, "jq -cjS 'del(.seal)' data/seal.json | sha256sum     # prints the seal");
        flow.gap(4);
        engines(flow);
        setUp(flow);
    }

    private void engines(Flow flow) throws IOException {
        flow.heading("Engines");
        Set<List<String>> rows = new LinkedHashSet<>();
        for (Experiment experiment : results.study().experiments()) {
            for (StrategyChoice choice : experiment.strategies()) {
                choice.engine()
                        .ifPresent(e -> rows.add(List.of(e.name(), e.sight().word(), e.description())));
            }
        }
        if (rows.isEmpty()) {
            flow.body("None: all strategies are classical.");
            return;
        }
        Table table = new Table(
                List.of(Table.Column.left("engine", 14), Table.Column.left("sees", 10), Table.Column.left("how", 76)));
        rows.forEach(table::add);
        table.set(flow);
        flow.note(
                "A blind engine works from evaluations of the function alone. A sighted engine is told the secret: its"
                        + " figures show what theory says and not that a circuit would find it.");
    }

    private void setUp(Flow flow) throws IOException {
        flow.heading("What was compared");
        Table table = new Table(List.of(
                Table.Column.left("experiment", 14),
                Table.Column.left("problem", 42),
                Table.Column.left("widths", 20),
                Table.Column.right("trials", 9),
                Table.Column.right("query limit", 15)));
        for (Experiment experiment : results.study().experiments()) {
            table.add(List.of(
                    experiment.id(),
                    experiment.problem().description(),
                    String.join(
                            ", ",
                            experiment.widths().stream().map(String::valueOf).toList()),
                    Integer.toString(experiment.trials()),
                    Long.toString(experiment.queryLimit())));
        }
        table.set(flow);
        flow.note("Run by " + environment.program() + " on " + environment.java() + ", " + environment.system()
                + ", " + environment.threads() + " threads, from " + environment.started() + " to "
                + environment.finished() + ". These facts are not under the seal.");
    }

    private long count(ClaimVerdict verdict) {
        return results.claims().stream().filter(c -> c.verdict() == verdict).count();
    }
}
