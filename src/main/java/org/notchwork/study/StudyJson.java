package org.notchwork.study;

import java.math.BigDecimal;
import java.util.List;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/** Writes a study with every default explicit; {@link StudyReader} reads it back to an equal study. */
public final class StudyJson {

    private StudyJson() {}

    /** Returns the study as JSON. */
    public static JsonObject write(Study study) {
        return JsonObject.builder()
                .put(
                        "claims",
                        array(study.claims().stream().map(StudyJson::claim).toList()))
                .put("cross-check-width", study.crossCheckWidth())
                .put(
                        "experiments",
                        array(study.experiments().stream()
                                .map(StudyJson::experiment)
                                .toList()))
                .put("format", study.version() == 1 ? StudyReader.FORMAT : StudyReader.SECOND_FORMAT)
                .put("question", study.question())
                .put("seed", study.seed().text())
                .put("title", study.title())
                .build();
    }

    /** Returns a claim as JSON, as it stands in a study and in the file of claims. */
    public static JsonObject claim(Claim claim) {
        JsonObject.Builder json = JsonObject.builder().put("id", claim.id()).put("text", claim.text());
        if (claim.quantity() instanceof Quantity.OfCell ofCell) {
            json.put("figure", ofCell.figure().word()).put("cell", ofCell.cell().id());
        } else if (claim.quantity() instanceof Quantity.Ratio ratio) {
            json.put(
                    "ratio",
                    JsonObject.builder()
                            .put("of", ratio.of().id())
                            .put("to", ratio.to().id())
                            .build());
        }
        if (claim.bound() instanceof Bound.AtMost atMost) {
            json.put("at-most", text(atMost.high()));
        } else if (claim.bound() instanceof Bound.AtLeast atLeast) {
            json.put("at-least", text(atLeast.low()));
        } else if (claim.bound() instanceof Bound.Between between) {
            json.put("between", JsonArray.ofTexts(List.of(text(between.low()), text(between.high()))));
        }
        return json.build();
    }

    private static JsonObject experiment(Experiment experiment) {
        return JsonObject.builder()
                .put("id", experiment.id())
                .put("problem", experiment.problem().settings())
                .put("query-limit", experiment.queryLimit())
                .put(
                        "strategies",
                        array(experiment.strategies().stream()
                                .map(StudyJson::choice)
                                .toList()))
                .put("trials", experiment.trials())
                .put(
                        "widths",
                        new JsonArray(experiment.widths().stream()
                                .<JsonValue>map(w -> new JsonInteger(w))
                                .toList()))
                .build();
    }

    private static JsonObject choice(StrategyChoice choice) {
        JsonObject.Builder json =
                JsonObject.builder().put("name", choice.strategy().name()).put("label", choice.ownLabel());
        choice.strategy().settings().members().forEach(json::put);
        if (choice.asked() == StrategyChoice.Asked.BY_NAME) {
            json.put("engine", choice.engine().map(e -> e.name()));
        } else {
            json.put("engine", StrategyReader.AUTO);
        }
        if (choice.asked() == StrategyChoice.Asked.AUTO_OR_SIGHTED) {
            json.put("allow-sighted", true);
        }
        choice.control().ifPresent(control -> json.put("control", control));
        if (!choice.noise().isNone()) {
            json.put(
                    "noise",
                    JsonObject.builder()
                            .put("readout-flip", text(choice.noise().readoutFlip()))
                            .put("uniform-mix", text(choice.noise().uniformMix()))
                            .build());
        }
        return json.build();
    }

    private static String text(BigDecimal bound) {
        return bound.toPlainString();
    }

    private static JsonArray array(List<JsonObject> objects) {
        return new JsonArray(objects.stream().<JsonValue>map(o -> o).toList());
    }
}
