package org.notchwork.json;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeMap;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.exc.StreamConstraintsException;
import tools.jackson.core.exc.UnexpectedEndOfInputException;
import tools.jackson.core.json.JsonFactory;

/**
 * Reads JSON and refuses what two readers could understand differently.
 *
 * <p>Refused, each with its place: bytes that are not UTF-8, a byte-order mark, an empty document, text after the
 * end, a member named twice, null, a number that is not a whole number of at most 2^53 − 1 in magnitude (so also
 * −0, NaN and 1e400), a lone surrogate, and whatever exceeds the limits. The bytes are decoded before they are
 * parsed because the parser by itself lets overlong UTF-8 pass and guesses at UTF-16.
 */
public final class JsonReader {

    private static final int LONGEST_NUMBER = "-9007199254740991".length();

    private final JsonLimits limits;
    private final JsonFactory factory;

    /**
     * Creates a reader with these limits; it may be shared between threads.
     *
     * <p>The tokenizer is allowed one level more than this reader and numbers of any length, which it does not convert,
     * so that this reader sees them first and can name their place.
     */
    public JsonReader(JsonLimits limits) {
        this.limits = limits;
        this.factory = JsonFactory.builder()
                .streamReadConstraints(StreamReadConstraints.builder()
                        .maxNestingDepth(limits.depth() + 1)
                        .maxStringLength(limits.text())
                        .maxNameLength(limits.text())
                        .maxNumberLength(limits.bytes())
                        .build())
                .build();
    }

    /**
     * Reads one document.
     *
     * @param document the bytes, at most {@link JsonLimits#bytes} of them
     * @return the value
     * @throws JsonFault if the document is not acceptable
     */
    public JsonValue read(byte[] document) throws JsonFault {
        if (document.length > limits.bytes()) {
            throw new JsonFault(
                    "byte " + limits.bytes(),
                    "the document goes on",
                    "at most " + limits.bytes() + " bytes are wanted");
        }
        String text = Utf8.decode(document);
        if (text.isBlank()) {
            throw new JsonFault("line 1, column 1", "the document is empty", "a JSON document is wanted");
        }
        try (JsonParser parser = factory.createParser(ObjectReadContext.empty(), text)) {
            return document(parser);
        }
    }

    /**
     * Reads one document and refuses it unless it is in canonical form already.
     *
     * @param document the bytes
     * @return the value
     * @throws JsonFault if it is not acceptable, or not canonical
     */
    public JsonValue readCanonical(byte[] document) throws JsonFault {
        JsonValue value = read(document);
        byte[] canonical = CanonicalJson.bytes(value);
        int difference = Arrays.mismatch(document, canonical);
        if (difference >= 0) {
            throw new JsonFault("byte " + difference, "not in canonical form", "RFC 8785 is wanted from here on");
        }
        return value;
    }

    private JsonValue document(JsonParser parser) throws JsonFault {
        try {
            parser.nextToken();
            JsonValue value = value(parser, 1);
            if (parser.nextToken() != null) {
                throw fault(parser, "something follows the end of the document", "one document a file is wanted");
            }
            return value;
        } catch (JacksonException e) {
            throw plain(parser, e);
        }
    }

    /** Reads the value at the current token; {@code level} is its level of nesting if it is an array or an object. */
    private JsonValue value(JsonParser parser, int level) throws JsonFault {
        JsonToken token = parser.currentToken();
        return switch (token) {
            case START_OBJECT -> object(parser, level);
            case START_ARRAY -> array(parser, level);
            case VALUE_STRING -> text(parser);
            case VALUE_NUMBER_INT -> integer(parser);
            case VALUE_NUMBER_FLOAT ->
                throw fault(parser, "a number with a fraction or an exponent", "write it as a string");
            case VALUE_TRUE -> new JsonBoolean(true);
            case VALUE_FALSE -> new JsonBoolean(false);
            case VALUE_NULL -> throw fault(parser, "null is not used", "leave the member out");
            case END_OBJECT, END_ARRAY, PROPERTY_NAME, NOT_AVAILABLE, VALUE_EMBEDDED_OBJECT ->
                throw fault(parser, "a value is missing", "a value is wanted");
        };
    }

    private JsonObject object(JsonParser parser, int level) throws JsonFault {
        checkLevel(parser, level);
        TreeMap<String, JsonValue> members = new TreeMap<>();
        while (parser.nextToken() == JsonToken.PROPERTY_NAME) {
            String name = checked(parser, parser.currentName());
            if (members.containsKey(name)) {
                throw fault(parser, "a second member " + Fields.quoted(name), "names must differ");
            }
            parser.nextToken();
            members.put(name, value(parser, level + 1));
        }
        return new JsonObject(members);
    }

    private JsonArray array(JsonParser parser, int level) throws JsonFault {
        checkLevel(parser, level);
        List<JsonValue> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            items.add(value(parser, level + 1));
        }
        return new JsonArray(items);
    }

    private JsonText text(JsonParser parser) throws JsonFault {
        return new JsonText(checked(parser, parser.getString()));
    }

    private static JsonInteger integer(JsonParser parser) throws JsonFault {
        String digits = parser.getString();
        if (digits.equals("-0")) {
            throw fault(parser, "-0 is not a whole number here", "write 0");
        }
        if (digits.length() > LONGEST_NUMBER || Math.abs(Long.parseLong(digits)) > JsonInteger.MAX) {
            throw fault(parser, "a whole number beyond 2^53 - 1 in magnitude", "write it as a string");
        }
        return new JsonInteger(Long.parseLong(digits));
    }

    private static String checked(JsonParser parser, String text) throws JsonFault {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isHighSurrogate(c) && i + 1 < text.length() && Character.isLowSurrogate(text.charAt(i + 1))) {
                i++;
            } else if (Character.isSurrogate(c)) {
                throw fault(parser, "a lone surrogate, which is not a character", "a whole character is wanted");
            }
        }
        return text;
    }

    private void checkLevel(JsonParser parser, int level) throws JsonFault {
        if (level > limits.depth()) {
            throw fault(parser, "nested too deep", "at most " + limits.depth() + " levels are wanted");
        }
    }

    private static JsonFault fault(JsonParser parser, String wrong, String mend) {
        return new JsonFault(place(parser.currentTokenLocation()), wrong, mend);
    }

    private static String place(TokenStreamLocation location) {
        return "line " + Math.max(1, location.getLineNr()) + ", column " + Math.max(1, location.getColumnNr());
    }

    /** Returns what the tokenizer found wrong, in this project's words. */
    private JsonFault plain(JsonParser parser, JacksonException found) {
        String place = place(found.getLocation() == null ? parser.currentLocation() : found.getLocation());
        if (found instanceof StreamConstraintsException) {
            return new JsonFault(
                    place,
                    "a string, a name or a number is too long",
                    "at most " + limits.text() + " characters are wanted");
        }
        if (found instanceof UnexpectedEndOfInputException) {
            return new JsonFault(place, "the document ends too early", "the rest of it is wanted");
        }
        return new JsonFault(
                place,
                "this is not JSON",
                "a comma, a bracket, a quotation mark, an escape or a value is wrong or missing here");
    }
}
