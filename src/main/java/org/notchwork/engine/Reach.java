package org.notchwork.engine;

/** The widths up to which outcome distributions are listed word by word. */
public final class Reach {

    /** The largest width of {@link Simulation#outcomes}. */
    public static final int OUTCOMES = 12;

    private Reach() {}

    /** Throws if the outcomes of this width are too many to list. */
    public static void requireListable(int width) {
        if (width > OUTCOMES) {
            throw new IllegalArgumentException("width " + width + " is above " + OUTCOMES + ", too many words to list");
        }
    }
}
