package org.notchwork.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.catalogue.Problems;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads one experiment. */
final class ExperimentReader {

    private static final int MOST_WIDTHS = 40;
    private static final int MOST_STRATEGIES = 20;
    private static final int MOST_TRIALS = 1_000_000;
    private static final int ANY_WIDTH = 4096;

    private ExperimentReader() {}

    /** Reads an experiment; {@code ids} has seen the ids before it. */
    static ExperimentReading read(Fields fields, Ids ids, Attachments files) {
        int before = fields.faults().size();
        String id = ids.read(fields);
        Optional<Problem> problem = problem(fields.object("problem"), files);
        List<Integer> widths = widths(fields, problem);
        List<StrategyChoice> strategies = strategies(fields, problem, widths);
        int trials = (int) fields.integer("trials", 1, MOST_TRIALS);
        long limit = fields.integer("query-limit", 1, JsonInteger.MAX);
        fields.end();
        boolean sound = fields.faults().size() == before && !fields.isStandIn();
        return new ExperimentReading(
                id, problem.filter(p -> sound).map(p -> new Experiment(id, p, widths, strategies, trials, limit)));
    }

    private static Optional<Problem> problem(Fields settings, Attachments files) {
        if (settings.isStandIn()) {
            return Optional.empty();
        }
        if (!settings.has("kind")) {
            settings.fault(
                    "kind", "this member is missing", "one of " + String.join(", ", Problems.kinds()) + " is wanted");
            return Optional.empty();
        }
        String kind = settings.text("kind", 1, 60);
        Optional<Family> family = Problems.family(kind);
        if (family.isEmpty()) {
            if (!kind.isEmpty()) {
                settings.fault("kind", "no problem " + Fields.quoted(kind), Spelling.mend(kind, Problems.kinds()));
            }
            return Optional.empty();
        }
        Optional<Problem> configured = family.get().configure(settings, files);
        settings.end();
        return configured;
    }

    private static List<Integer> widths(Fields fields, Optional<Problem> problem) {
        List<Integer> widths = new ArrayList<>();
        int least = problem.map(Problem::leastWidth).orElse(1);
        int greatest = problem.map(Problem::greatestWidth).orElse(ANY_WIDTH);
        for (Fields.Item item : fields.items("widths", 1, MOST_WIDTHS)) {
            if (!(item.value() instanceof JsonInteger number) || number.value() < least || number.value() > greatest) {
                String wrong = item.value() instanceof JsonInteger number
                        ? "width " + number.value()
                        : "this is " + item.value().kind();
                String reach = problem.map(
                                p -> p.settings().member("instances").isPresent() ? " for these instances" : "")
                        .orElse("");
                item.fault(wrong, "a width from " + least + " to " + greatest + " is wanted" + reach);
                continue;
            }
            int width = (int) number.value();
            if (!widths.isEmpty() && width <= widths.get(widths.size() - 1)) {
                item.fault(
                        "width " + width + " after " + widths.get(widths.size() - 1),
                        "different widths in ascending order are wanted");
                continue;
            }
            widths.add(width);
        }
        return widths;
    }

    private static List<StrategyChoice> strategies(Fields fields, Optional<Problem> problem, List<Integer> widths) {
        List<StrategyChoice> choices = new ArrayList<>();
        StrategyReader reader = new StrategyReader(problem, widths);
        for (Fields.Item item : fields.items("strategies", 1, MOST_STRATEGIES)) {
            reader.read(item).ifPresent(choice -> {
                if (choices.stream().anyMatch(c -> c.label().equals(choice.label()))) {
                    item.fault("a second " + choice.label(), "another strategy, or a \"label\" of its own, is wanted");
                }
                choices.add(choice);
            });
        }
        return choices;
    }
}
