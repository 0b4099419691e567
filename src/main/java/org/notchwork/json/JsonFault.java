package org.notchwork.json;

/**
 * Says that some bytes are not JSON as this project accepts it.
 *
 * <p>The message is one line: what is wrong and what would be right, with the place in front.
 */
public final class JsonFault extends Exception {

    private static final long serialVersionUID = 1L;

    private final String place;

    /**
     * Creates a fault.
     *
     * @param place where, for example {@code "line 3, column 9"} or {@code "byte 17"}
     * @param what what is wrong there and what would be right
     */
    public JsonFault(String place, String what) {
        super(what);
        this.place = place;
    }

    /** Returns where the fault is. */
    public String place() {
        return place;
    }
}
