package org.notchwork.json;

/**
 * Makes text from outside safe to print.
 *
 * <p>Control characters could move a terminal's cursor or colour its text, and direction marks could reorder a line,
 * so a file could print a verdict of its own making. Both kinds, and lone surrogates, are shown as escapes.
 */
public final class Printable {

    private Printable() {}

    /** Returns the text with every control, format, private-use and unassigned character shown as an escape. */
    public static String escape(String text) {
        StringBuilder out = new StringBuilder(text.length());
        text.codePoints().forEach(c -> {
            if (isPlain(c)) {
                out.appendCodePoint(c);
            } else {
                out.append("\\u{").append(Integer.toHexString(c)).append('}');
            }
        });
        return out.toString();
    }

    /** Returns the text, or if it is longer its first {@code most} characters (code points) and an ellipsis. */
    public static String cut(String text, int most) {
        return text.codePointCount(0, text.length()) <= most
                ? text
                : text.substring(0, text.offsetByCodePoints(0, most)) + "…";
    }

    private static boolean isPlain(int c) {
        return switch (Character.getType(c)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.PRIVATE_USE,
                    Character.SURROGATE,
                    Character.UNASSIGNED,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }
}
