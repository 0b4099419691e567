package org.notchwork.json;

/**
 * Something wrong in a document, as its reader is told.
 *
 * @param pointer where: an RFC 6901 pointer, empty for the whole document
 * @param wrong what is wrong there
 * @param mend what would be right
 */
public record Fault(String pointer, String wrong, String mend) {

    private static final int SHOWN = 200;

    /** Returns the pointer with one more step, escaped as RFC 6901, section 3, wants it. */
    public static String step(String pointer, String name) {
        return pointer + '/' + name.replace("~", "~0").replace("/", "~1");
    }

    /** Returns one line: pointer (its first 200 characters), what is wrong, what would be right. */
    public String line() {
        return (pointer.isEmpty() ? "(top)" : Printable.cut(pointer, SHOWN)) + ": " + wrong + "; " + mend;
    }
}
