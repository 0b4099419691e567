package org.notchwork.verify;

import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
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
            names.forEach(name -> pair(Fault.step(pointer, name), a.member(name), b.member(name)));
        } else if (written instanceof JsonArray a && recomputed instanceof JsonArray b) {
            int longer = Math.max(a.items().size(), b.items().size());
            for (int i = 0; i < longer; i++) {
                pair(Fault.step(pointer, Integer.toString(i)), item(a, i), item(b, i));
            }
        } else {
            sink.differs(pointer, CanonicalJson.text(written), CanonicalJson.text(recomputed));
        }
    }

    private void pair(String pointer, Optional<JsonValue> a, Optional<JsonValue> b) {
        if (a.isPresent() && b.isPresent()) {
            compare(pointer, a.get(), b.get());
        } else {
            sink.differs(
                    pointer,
                    a.map(CanonicalJson::text).orElse(ABSENT),
                    b.map(CanonicalJson::text).orElse(ABSENT));
        }
    }

    private static Optional<JsonValue> item(JsonArray array, int index) {
        return index < array.items().size() ? Optional.of(array.items().get(index)) : Optional.empty();
    }
}
