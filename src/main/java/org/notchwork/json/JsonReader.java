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

    private static final int LONGEST_NUMBER = 40;

    private final JsonLimits limits;
    private final JsonFactory factory;

    /** Creates a reader with these limits; it may be shared between threads. */
    public JsonReader(JsonLimits limits) {
        this.limits = limits;
        this.factory = JsonFactory.builder()
                .streamReadConstraints(StreamReadConstraints.builder()
                        .maxNestingDepth(limits.depth())
                        .maxStringLength(limits.text())
                        .maxNameLength(limits.text())
                        .maxNumberLength(LONGEST_NUMBER)
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
            throw new JsonFault("byte " + limits.bytes(), "longer than the limit of " + limits.bytes() + " bytes");
        }
        String text = Utf8.decode(document);
        if (text.isBlank()) {
            throw new JsonFault("line 1, column 1", "the document is empty");
        }
        try (JsonParser parser = factory.createParser(ObjectReadContext.empty(), text)) {
            parser.nextToken();
            JsonValue value = value(parser);
            if (parser.nextToken() != null) {
                throw fault(parser, "something follows the end of the document");
            }
            return value;
        } catch (JacksonException e) {
            throw new JsonFault(place(e.getLocation()), plain(e));
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
            throw new JsonFault("byte " + difference, "not in canonical form (RFC 8785) from here on");
        }
        return value;
    }

    private JsonValue value(JsonParser parser) throws JsonFault {
        JsonToken token = parser.currentToken();
        return switch (token) {
            case START_OBJECT -> object(parser);
            case START_ARRAY -> array(parser);
            case VALUE_STRING -> text(parser);
            case VALUE_NUMBER_INT -> integer(parser);
            case VALUE_NUMBER_FLOAT ->
                throw fault(parser, "a number with a fraction or an exponent; write it as a string");
            case VALUE_TRUE -> new JsonBoolean(true);
            case VALUE_FALSE -> new JsonBoolean(false);
            case VALUE_NULL -> throw fault(parser, "null is not used; leave the member out");
            case END_OBJECT, END_ARRAY, PROPERTY_NAME, NOT_AVAILABLE, VALUE_EMBEDDED_OBJECT ->
                throw fault(parser, "a value is missing");
        };
    }

    private JsonObject object(JsonParser parser) throws JsonFault {
        TreeMap<String, JsonValue> members = new TreeMap<>();
        while (parser.nextToken() == JsonToken.PROPERTY_NAME) {
            String name = checked(parser, parser.currentName());
            if (members.containsKey(name)) {
                throw fault(parser, "a second member " + Fields.quoted(name) + "; names must differ");
            }
            parser.nextToken();
            members.put(name, value(parser));
        }
        return new JsonObject(members);
    }

    private JsonArray array(JsonParser parser) throws JsonFault {
        List<JsonValue> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            items.add(value(parser));
        }
        return new JsonArray(items);
    }

    private JsonText text(JsonParser parser) throws JsonFault {
        return new JsonText(checked(parser, parser.getString()));
    }

    private static JsonInteger integer(JsonParser parser) throws JsonFault {
        String digits = parser.getString();
        if (digits.equals("-0")) {
            throw fault(parser, "-0 is not a whole number here; write 0");
        }
        if (digits.length() > 17 || Math.abs(Long.parseLong(digits)) > JsonInteger.MAX) {
            throw fault(parser, "a whole number beyond 2^53 - 1 in magnitude; write it as a string");
        }
        return new JsonInteger(Long.parseLong(digits));
    }

    private static String checked(JsonParser parser, String text) throws JsonFault {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isHighSurrogate(c) && i + 1 < text.length() && Character.isLowSurrogate(text.charAt(i + 1))) {
                i++;
            } else if (Character.isSurrogate(c)) {
                throw fault(parser, "a lone surrogate, which is not a character");
            }
        }
        return text;
    }

    private static JsonFault fault(JsonParser parser, String what) {
        return new JsonFault(place(parser.currentTokenLocation()), what);
    }

    /** Returns where a fault is; the tokenizer does not know where a limit was exceeded. */
    private static String place(TokenStreamLocation location) {
        return location == null
                ? "somewhere"
                : "line " + Math.max(1, location.getLineNr()) + ", column " + Math.max(1, location.getColumnNr());
    }

    /** Returns what the tokenizer found wrong, in this project's words. */
    private String plain(JacksonException fault) {
        if (fault instanceof StreamConstraintsException) {
            return "nested deeper than " + limits.depth() + " levels, a text longer than " + limits.text()
                    + " characters, or a number longer than " + LONGEST_NUMBER;
        }
        if (fault instanceof UnexpectedEndOfInputException) {
            return "the document ends too early";
        }
        return "this is not JSON; a comma, a bracket, a quotation mark or a value is wrong here";
    }
}
