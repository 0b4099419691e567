package org.notchwork.report;

import java.io.IOException;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.Seal;
import org.notchwork.json.Printable;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** What a referee sees first: what this is, whether the checks agree, the seal, how to verify, which engines saw what. */
final class CoverSection {

    /** A question of more than this height goes below the seal, which would else leave the first page. */
    private static final float SHORT = 8 * Style.BODY.leading();

    private final Results results;
    private final String seal;
    private final Environment environment;

    CoverSection(Results results, String seal, Environment environment) {
        this.results = results;
        this.seal = seal;
        this.environment = environment;
    }

    void set(Flow flow) throws IOException {
        flow.title(Printable.escape(results.study().title()));
        String question = Printable.escape(results.study().question());
        boolean isShort = flow.height(Style.BODY, question) <= SHORT;
        if (isShort) {
            flow.body(question);
        }
        new VerdictStrip(results).set(flow);
        flow.heading("Seal");
        int half = seal.length() / 2;
        flow.text(Style.SEAL, Style.INK, Seal.groups(seal.substring(0, half)));
        flow.text(Style.SEAL, Style.INK, Seal.groups(seal.substring(half)));
        flow.note("64 hexadecimal digits in eight groups. A shorter form is for talking only.");
        flow.heading("How to verify");
        flow.text(Style.CODE, Style.INK, "java -jar notchwork.jar verify FOLDER --expect " + seal);
        flow.text(Style.CODE, Style.INK, "sha256sum -c --strict --quiet tagmanifest-sha256.txt manifest-sha256.txt");
        flow.text(Style.CODE, Style.INK, "jq -cjS 'del(.seal)' data/seal.json | sha256sum     # prints the seal");
        flow.gap(4);
        if (!isShort) {
            flow.heading("The question");
            flow.body(question);
        }
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
        Table table = new Table(Table.Column.left("engine"), Table.Column.left("sees"), Table.Column.left("how"));
        rows.forEach(r -> table.add(r.get(0), r.get(1), r.get(2)));
        table.set(flow);
        flow.note(
                "A blind engine works from evaluations of the function alone. A sighted engine is told the secret: its"
                        + " figures show what theory says and not that a circuit would find it.");
    }

    private void setUp(Flow flow) throws IOException {
        flow.heading("What was compared");
        Table table = new Table(
                Table.Column.left("experiment"),
                Table.Column.left("problem"),
                Table.Column.left("widths"),
                Table.Column.right("trials a cell"),
                Table.Column.right("query limit"));
        for (Experiment experiment : results.study().experiments()) {
            table.add(
                    experiment.id(),
                    experiment.problem().description(),
                    Widths.words(experiment.widths()),
                    Integer.toString(experiment.trials()),
                    Long.toString(experiment.queryLimit()));
        }
        table.set(flow);
        flow.note(Printable.escape("Run by " + environment.program() + " on " + environment.java() + ", "
                        + environment.system() + ", " + Numbers.count(environment.threads(), "thread") + ", from "
                        + environment.started() + " to " + environment.finished() + ".")
                + " These facts are not under the seal.");
    }
}
