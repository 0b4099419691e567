package org.notchwork.json;

import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * A JSON object, its members sorted by UTF-16 code units as RFC 8785, section 3.2.3, wants them.
 *
 * @param members name to value; {@link String#compareTo} is exactly the order of the RFC
 */
public record JsonObject(Map<String, JsonValue> members) implements JsonValue {

    /** Copies and sorts the members. */
    public JsonObject {
        members = Collections.unmodifiableMap(new TreeMap<>(members));
    }

    /** Returns an empty builder. */
    public static Builder builder() {
        return new Builder();
    }

    /** Returns the member of this name, empty if there is none. */
    public Optional<JsonValue> member(String name) {
        return Optional.ofNullable(members.get(name));
    }

    @Override
    public String kind() {
        return "an object";
    }

    /** Collects members; a name given twice is a fault of the caller. */
    public static final class Builder {

        private final TreeMap<String, JsonValue> members = new TreeMap<>();

        private Builder() {}

        /** Adds a member. */
        public Builder put(String name, JsonValue value) {
            if (members.put(name, value) != null) {
                throw new IllegalArgumentException("member \"" + name + "\" given twice");
            }
            return this;
        }

        /** Adds a string member. */
        public Builder put(String name, String text) {
            return put(name, new JsonText(text));
        }

        /** Adds a whole number, at most 2^53 − 1 in magnitude. */
        public Builder put(String name, long number) {
            return put(name, new JsonInteger(number));
        }

        /** Adds a truth value. */
        public Builder put(String name, boolean truth) {
            return put(name, new JsonBoolean(truth));
        }

        /** Adds a string member if there is a text. */
        public Builder put(String name, Optional<String> text) {
            text.ifPresent(present -> put(name, present));
            return this;
        }

        /** Returns the object. */
        public JsonObject build() {
            return new JsonObject(members);
        }
    }
}
