package org.notchwork.json;

/**
 * A JSON value that can be sealed: object, array, text, whole number or truth value.
 *
 * <p>There is no null and no fraction. A decimal is a {@link JsonText} with a stated number of digits, because
 * printing a double differs between Java versions.
 */
public sealed interface JsonValue permits JsonObject, JsonArray, JsonText, JsonInteger, JsonBoolean {

    /** Returns what kind of value this is, as an error message names it, for example {@code "an object"}. */
    String kind();
}
