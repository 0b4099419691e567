package org.notchwork.json;

/**
 * Says that some bytes are not JSON as this project accepts it.
 *
 * <p>The message is one line: what is wrong and what would be right. The place is told apart.
 */
public final class JsonFault extends Exception {

    private static final long serialVersionUID = 1L;

    private final String place;
    private final String wrong;
    private final String mend;

    /**
     * Creates a fault.
     *
     * @param place where, for example {@code "line 3, column 9"} or {@code "byte 17"}
     * @param wrong what is wrong there
     * @param mend what would be right
     */
    public JsonFault(String place, String wrong, String mend) {
        super(wrong + "; " + mend);
        this.place = place;
        this.wrong = wrong;
        this.mend = mend;
    }

    /** Returns where the fault is. */
    public String place() {
        return place;
    }

    /** Returns the fault as a reader of documents notes it, the place standing where a pointer would. */
    public Fault fault() {
        return new Fault(place, wrong, mend);
    }
}
