package org.notchwork.json;

import java.nio.charset.StandardCharsets;
import java.util.Iterator;
import java.util.Map;

/**
 * Writes the one canonical form of a value: RFC 8785, restricted to whole numbers.
 *
 * <p>No white space, members sorted, the short escapes where there is one and a six-character escape for the other control
 * characters, everything else raw UTF-8. Without fractions no number formatting of ECMAScript is needed.
 */
public final class CanonicalJson {

    private static final String HEX = "0123456789abcdef";

    private CanonicalJson() {}

    /** Returns the canonical text, without a final line feed. */
    public static String text(JsonValue value) {
        StringBuilder out = new StringBuilder();
        write(value, out);
        return out.toString();
    }

    /** Returns the canonical text as UTF-8. */
    public static byte[] bytes(JsonValue value) {
        return text(value).getBytes(StandardCharsets.UTF_8);
    }

    private static void write(JsonValue value, StringBuilder out) {
        if (value instanceof JsonObject object) {
            writeObject(object, out);
        } else if (value instanceof JsonArray array) {
            writeArray(array, out);
        } else if (value instanceof JsonText text) {
            writeText(text.value(), out);
        } else if (value instanceof JsonInteger integer) {
            out.append(integer.value());
        } else if (value instanceof JsonBoolean truth) {
            out.append(truth.value());
        }
    }

    private static void writeObject(JsonObject object, StringBuilder out) {
        out.append('{');
        Iterator<Map.Entry<String, JsonValue>> members =
                object.members().entrySet().iterator();
        while (members.hasNext()) {
            Map.Entry<String, JsonValue> member = members.next();
            writeText(member.getKey(), out);
            out.append(':');
            write(member.getValue(), out);
            if (members.hasNext()) {
                out.append(',');
            }
        }
        out.append('}');
    }

    private static void writeArray(JsonArray array, StringBuilder out) {
        out.append('[');
        Iterator<JsonValue> items = array.items().iterator();
        while (items.hasNext()) {
            write(items.next(), out);
            if (items.hasNext()) {
                out.append(',');
            }
        }
        out.append(']');
    }

    private static void writeText(String text, StringBuilder out) {
        out.append('"');
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\b' -> out.append("\\b");
                case '\t' -> out.append("\\t");
                case '\n' -> out.append("\\n");
                case '\f' -> out.append("\\f");
                case '\r' -> out.append("\\r");
                default -> {
                    if (c < 0x20) {
                        out.append("\\u00").append(HEX.charAt(c >> 4)).append(HEX.charAt(c & 15));
                    } else {
                        out.append(c);
                    }
                }
            }
        }
        out.append('"');
    }
}
