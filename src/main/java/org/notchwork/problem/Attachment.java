package org.notchwork.problem;

/** A file that belongs to a problem and goes into the bundle with it. Immutable. */
public final class Attachment {

    private final String name;
    private final byte[] bytes;

    /** Keeps a copy of the bytes. */
    public Attachment(String name, byte[] bytes) {
        this.name = name;
        this.bytes = bytes.clone();
    }

    /** Returns the file name, without folders. */
    public String name() {
        return name;
    }

    /** Returns a copy of the bytes. */
    public byte[] bytes() {
        return bytes.clone();
    }
}
