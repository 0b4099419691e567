package org.notchwork.problem;

import java.util.Optional;

/** The files that a study may name, beside the study file or inside a bundle. */
@FunctionalInterface
public interface Attachments {

    /** The largest file: 16 MiB. */
    int MOST_BYTES = 16 << 20;

    /** No files at all. */
    Attachments NONE = name -> Optional.empty();

    /**
     * Returns the bytes of a file.
     *
     * @param name a file name without folders
     * @return empty if there is no such file that can be read, or it is larger than is allowed
     */
    Optional<byte[]> read(String name);
}
