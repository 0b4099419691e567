package org.notchwork.json;

import java.util.Collection;
import java.util.List;

/**
 * A JSON array.
 *
 * @param items the items in order
 */
public record JsonArray(List<JsonValue> items) implements JsonValue {

    /** Copies the items. */
    public JsonArray {
        items = List.copyOf(items);
    }

    /** Returns the array of these texts, in the collection's order. */
    public static JsonArray ofTexts(Collection<String> texts) {
        return new JsonArray(texts.stream().<JsonValue>map(JsonText::new).toList());
    }

    @Override
    public String kind() {
        return "an array";
    }
}
