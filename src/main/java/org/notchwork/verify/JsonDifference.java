package org.notchwork.verify;

import java.util.Set;
import java.util.TreeSet;
import java.util.function.BiConsumer;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/** Finds where two JSON values differ, field by field. */
final class JsonDifference {

    private static final String ABSENT = "(nothing)";

    private final Sink sink;

    /** Takes the differences. */
    @FunctionalInterface
    interface Sink {

        /** One field differs. */
        void differs(String pointer, String written, String recomputed);
    }

    JsonDifference(Sink sink) {
        this.sink = sink;
    }

    /** Compares two values and hands over each field that differs. */
    void compare(JsonValue written, JsonValue recomputed) {
        compare("", written, recomputed);
    }

    private void compare(String pointer, JsonValue written, JsonValue recomputed) {
        if (written.equals(recomputed)) {
            return;
        }
        if (written instanceof JsonObject a && recomputed instanceof JsonObject b) {
            Set<String> names = new TreeSet<>(a.members().keySet());
            names.addAll(b.members().keySet());
            for (String name : names) {
                pair(
                        Fault.step(pointer, name),
                        a.members().get(name),
                        b.members().get(name),
                        (x, y) -> compare(Fault.step(pointer, name), x, y));
            }
        } else if (written instanceof JsonArray a && recomputed instanceof JsonArray b) {
            int longer = Math.max(a.items().size(), b.items().size());
            for (int i = 0; i < longer; i++) {
                String step = Fault.step(pointer, Integer.toString(i));
                JsonValue x = i < a.items().size() ? a.items().get(i) : null;
                JsonValue y = i < b.items().size() ? b.items().get(i) : null;
                pair(step, x, y, (p, q) -> compare(step, p, q));
            }
        } else {
            sink.differs(pointer, CanonicalJson.text(written), CanonicalJson.text(recomputed));
        }
    }

    private void pair(String pointer, JsonValue a, JsonValue b, BiConsumer<JsonValue, JsonValue> both) {
        if (a == null || b == null) {
            sink.differs(
                    pointer, a == null ? ABSENT : CanonicalJson.text(a), b == null ? ABSENT : CanonicalJson.text(b));
        } else {
            both.accept(a, b);
        }
    }
}
