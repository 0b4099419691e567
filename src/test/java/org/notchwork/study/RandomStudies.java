package org.notchwork.study;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.catalogue.Engines;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;
import org.notchwork.seed.RandomStream;

/** Draws study documents that keep all rules. */
final class RandomStudies {

    private static final List<String> CLASSICAL = List.of("sequential-scan", "random-draws", "difference-cover");

    private final RandomStream stream;

    RandomStudies(RandomStream stream) {
        this.stream = stream;
    }

    /** Returns the next document; defaults are left out now and then. */
    JsonObject next() {
        List<JsonValue> experiments = new ArrayList<>();
        List<List<String>> groups = new ArrayList<>();
        for (int i = 0; i <= stream.below(3); i++) {
            experiments.add(experiment("e" + i + "-" + letters(3), groups));
        }
        JsonObject.Builder study = JsonObject.builder()
                .put("format", "notchwork-study/1")
                .put("title", "t" + letters(12) + " é 漢 😀")
                .put("question", "q\n" + letters(20))
                .put("seed", letters(16 + (int) stream.below(185)))
                .put("experiments", new JsonArray(experiments));
        if (stream.below(2) == 0) {
            study.put("cross-check-width", stream.below(13));
        }
        if (stream.below(4) > 0) {
            study.put("claims", claims(groups));
        }
        return study.build();
    }

    private JsonObject experiment(String id, List<List<String>> groups) {
        boolean table = stream.below(2) == 0;
        List<String[]> choices = choices(stream.below(2) == 0);
        int greatest = reach(table ? 20 : 63, choices);
        List<JsonValue> widths = new ArrayList<>();
        for (int width = 2 + (int) stream.below(4);
                width <= greatest && widths.size() < 6;
                width += 1 + (int) stream.below(9)) {
            widths.add(new JsonInteger(width));
            String cell = id + "/" + width + "/";
            groups.add(choices.stream().map(c -> cell + String.join("@", c)).toList());
        }
        JsonObject.Builder problem = JsonObject.builder().put("kind", "xor-period");
        if (!table || stream.below(2) == 0) {
            problem.put("instances", table ? "table" : "permutation");
        }
        return JsonObject.builder()
                .put("id", id)
                .put("problem", problem.build())
                .put("widths", new JsonArray(widths))
                .put(
                        "strategies",
                        new JsonArray(
                                choices.stream().map(RandomStudies::choice).toList()))
                .put("trials", 1 + stream.below(1_000_000))
                .put("query-limit", 1 + stream.below(JsonInteger.MAX))
                .build();
    }

    /** Returns name, or name and engine, of one or more different strategies. */
    private List<String[]> choices(boolean withStateVector) {
        List<String[]> all = new ArrayList<>();
        CLASSICAL.forEach(name -> all.add(new String[] {name}));
        Engines.names().stream()
                .filter(engine -> !engine.equals("stabilizer"))
                .filter(engine -> withStateVector || !engine.equals("statevector"))
                .forEach(engine -> all.add(new String[] {"fourier-sampling", engine}));
        List<String[]> chosen = new ArrayList<>();
        for (int i : stream.distinct(1 + (int) stream.below(all.size()), all.size())) {
            chosen.add(all.get(i));
        }
        return chosen;
    }

    /** Returns the greatest width that all of them reach: 13 for a state vector, 26 for fibres. */
    private static int reach(int instances, List<String[]> choices) {
        int greatest = instances;
        for (String[] choice : choices) {
            String engine = choice[choice.length - 1];
            greatest = Math.min(
                    greatest,
                    engine.equals("statevector")
                            ? 13
                            : engine.equals("fibre") ? 26 : engine.equals("weights") ? 24 : 63);
        }
        return greatest;
    }

    private static JsonValue choice(String[] words) {
        JsonObject.Builder choice = JsonObject.builder().put("name", words[0]);
        return words.length == 2 ? choice.put("engine", words[1]).build() : choice.build();
    }

    private JsonArray claims(List<List<String>> groups) {
        List<JsonValue> claims = new ArrayList<>();
        for (int i = 0; i < stream.below(6); i++) {
            List<String> cells = groups.get((int) stream.below(groups.size()));
            int[] two = stream.distinct(Math.min(2, cells.size()), cells.size());
            JsonObject.Builder claim = JsonObject.builder().put("id", "c" + i).put("text", "x" + letters(9));
            if (two.length == 2 && stream.below(2) == 0) {
                claim.put(
                        "ratio",
                        JsonObject.builder()
                                .put("of", cells.get(two[0]))
                                .put("to", cells.get(two[1]))
                                .build());
            } else {
                claim.put("cell", cells.get(two[0]))
                        .put("figure", stream.below(2) == 0 ? "queries-mean" : "success-rate");
            }
            claims.add(bound(claim));
        }
        return new JsonArray(claims);
    }

    private JsonObject bound(JsonObject.Builder claim) {
        String fraction = stream.below(2) == 0 ? "" : "." + stream.below(1_000_000);
        long whole = stream.below(1_000_000_000);
        return switch ((int) stream.below(3)) {
            case 0 -> claim.put("at-most", whole + fraction).build();
            case 1 -> claim.put("at-least", "-" + (1 + whole) + fraction).build();
            default ->
                claim.put(
                                "between",
                                new JsonArray(List.of(
                                        new JsonText("-" + (1 + whole) + fraction), new JsonText(whole + fraction))))
                        .build();
        };
    }

    private String letters(int count) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < count; i++) {
            text.append((char) ('a' + stream.below(26)));
        }
        return text.toString();
    }
}
