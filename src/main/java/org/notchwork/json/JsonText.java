package org.notchwork.json;

import java.util.Objects;

/**
 * A JSON string.
 *
 * @param value the text; without lone surrogates, which no UTF-8 file can hold
 */
public record JsonText(String value) implements JsonValue {

    /** Checks that the text can be written as UTF-8. */
    public JsonText {
        Objects.requireNonNull(value);
        for (int i = 0; i < value.length(); i++) {
            char c = value.charAt(i);
            if (Character.isHighSurrogate(c)
                    && i + 1 < value.length()
                    && Character.isLowSurrogate(value.charAt(i + 1))) {
                i++;
            } else if (Character.isSurrogate(c)) {
                throw new IllegalArgumentException("lone surrogate at position " + i);
            }
        }
    }

    @Override
    public String kind() {
        return "a string";
    }
}
