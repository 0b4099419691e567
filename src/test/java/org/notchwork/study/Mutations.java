package org.notchwork.study;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonBoolean;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/** Lists all documents that differ from one in one place, by a fixed list of slips. */
final class Mutations {

    private static final List<Long> NUMBERS = List.of(
            -1L, 0L, 1L, 2L, 3L, 12L, 13L, 14L, 20L, 21L, 26L, 27L, 63L, 64L, 1_000_000L, 1_000_001L, JsonInteger.MAX);

    private static final List<String> TEXTS = List.of(
            "",
            "x",
            "-",
            "A",
            "0",
            "-0",
            "1.",
            "07",
            "1e3",
            "0.5",
            "1.1234567890123",
            "table",
            "permutation",
            "random-draws",
            "fourier-sampling",
            "fibre",
            "queries-mean",
            "all/3/random-draws",
            "all/5/random-draws",
            "all/5/sequential-scan",
            "cut/6/sequential-scan",
            "all",
            "9".repeat(40),
            "9".repeat(41),
            "a".repeat(161),
            "a".repeat(201),
            "\ud83d\ude00".repeat(200),
            "\ud83d\ude00".repeat(201),
            "a".repeat(1001),
            "a".repeat(2001));

    private Mutations() {}

    /** Returns every document with one slip: in a value, in a member's name, in the number or order of items. */
    static List<JsonValue> of(JsonValue document) {
        List<JsonValue> changed = new ArrayList<>(replacements(document));
        if (document instanceof JsonObject object) {
            ofMembers(object, changed);
        } else if (document instanceof JsonArray array) {
            ofItems(array, changed);
        }
        return changed;
    }

    private static void ofMembers(JsonObject object, List<JsonValue> changed) {
        changed.add(with(object, "unheard-of", new JsonInteger(1)));
        object.members().forEach((name, member) -> {
            changed.add(without(object, name));
            changed.add(with(without(object, name), name + "s", member));
            for (JsonValue inner : of(member)) {
                changed.add(with(object, name, inner));
            }
        });
    }

    private static void ofItems(JsonArray array, List<JsonValue> changed) {
        List<JsonValue> items = array.items();
        if (items.isEmpty()) {
            return;
        }
        List<JsonValue> reversed = new ArrayList<>(items);
        Collections.reverse(reversed);
        changed.add(new JsonArray(reversed));
        changed.add(new JsonArray(items.subList(1, items.size())));
        for (int most : new int[] {items.size() + 1, 9, 13, 41, 101}) {
            List<JsonValue> longer = new ArrayList<>(items);
            while (longer.size() < most) {
                longer.add(items.get(items.size() - 1));
            }
            changed.add(new JsonArray(longer));
        }
        for (int i = 0; i < items.size(); i++) {
            for (JsonValue inner : of(items.get(i))) {
                List<JsonValue> others = new ArrayList<>(items);
                others.set(i, inner);
                changed.add(new JsonArray(others));
            }
        }
    }

    private static List<JsonValue> replacements(JsonValue value) {
        List<JsonValue> others = new ArrayList<>();
        others.add(new JsonBoolean(true));
        others.add(new JsonArray(List.of()));
        others.add(new JsonObject(Map.of()));
        if (value instanceof JsonInteger) {
            NUMBERS.forEach(number -> others.add(new JsonInteger(number)));
            others.add(new JsonText("8"));
        } else {
            others.add(new JsonInteger(8));
        }
        if (value instanceof JsonText) {
            TEXTS.forEach(text -> others.add(new JsonText(text)));
        }
        others.remove(value);
        return others;
    }

    /** Returns the object with a member set. */
    static JsonObject with(JsonObject object, String name, JsonValue member) {
        Map<String, JsonValue> members = new TreeMap<>(object.members());
        members.put(name, member);
        return new JsonObject(members);
    }

    private static JsonObject without(JsonObject object, String name) {
        Map<String, JsonValue> members = new TreeMap<>(object.members());
        members.remove(name);
        return new JsonObject(members);
    }
}
