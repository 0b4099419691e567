package org.notchwork.bundle;

/** Says why something is no bundle, or none that is safe to read. The message is one line: what, and the mend. */
public final class BundleFault extends Exception {

    private static final long serialVersionUID = 1L;

    private final Reason reason;
    private final String place;

    /** Why, as a word that stays the same for ever. */
    public enum Reason {
        /** There is nothing at the path. */
        MISSING,
        /** What is there is no bundle at all. */
        NOT_A_BUNDLE,
        /** A link, a device or another thing that is no plain file. */
        SPECIAL_FILE,
        /** A name that a bundle may not use. */
        NAME,
        /** A name that begins with a point, which many tools do not show. */
        HIDDEN_FILE,
        /** Two names that some systems cannot tell apart. */
        NAME_CLASH,
        /** More files, bytes or depth than the reader's limits allow. */
        LIMIT,
        /** The bag declaration is not that of RFC 8493, version 1.0, in UTF-8. */
        DECLARATION,
        /** A file begins with a byte-order mark. */
        BYTE_ORDER_MARK,
        /** A file that should be UTF-8 is not. */
        ENCODING,
        /** A line does not end with one line feed and nothing else. */
        LINE_END,
        /** A line of the bag's metadata is not of the one form. */
        BAG_INFO,
        /** The bag leaves files to be fetched. */
        FETCH,
        /** A manifest of another algorithm, or none of SHA-256. */
        ALGORITHM,
        /** A line of a manifest is not of the one form. */
        MANIFEST_LINE,
        /** A manifest lists one file twice. */
        LISTED_TWICE,
        /** A manifest lists a file that is not there. */
        NOT_THERE,
        /** A file is there that no manifest lists. */
        NOT_LISTED,
        /** The payload's size or number of files is not what the bag says. */
        OXUM,
        /** A file has no bytes. */
        EMPTY_FILE,
        /** A file that every bundle has is missing, or one that none has is there. */
        LAYOUT,
        /** A file changed while it was read. */
        CHANGED
    }

    /**
     * Creates a fault.
     *
     * @param reason why
     * @param place the file, and the line where there is one
     * @param what what is wrong there and what would be right
     */
    public BundleFault(Reason reason, String place, String what) {
        super(what);
        this.reason = reason;
        this.place = place;
    }

    /** Returns why. */
    public Reason reason() {
        return reason;
    }

    /** Returns the file, and the line where there is one. */
    public String place() {
        return place;
    }
}
