package org.notchwork.json;

/**
 * A JSON truth value.
 *
 * @param value true or false
 */
public record JsonBoolean(boolean value) implements JsonValue {

    @Override
    public String kind() {
        return "true or false";
    }
}
