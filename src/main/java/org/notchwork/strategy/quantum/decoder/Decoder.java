package org.notchwork.strategy.quantum.decoder;

import java.util.Optional;
import org.notchwork.seed.RandomStream;

/** Names a period from measured words. Immutable and without state. */
public interface Decoder {

    /** Returns the name, as a study file gives it. */
    String name();

    /** Returns the largest width that the decoder takes. */
    int greatestWidth();

    /** Returns about how many bytes it takes at a width. */
    long memoryBytes(int width);

    /**
     * Names a period.
     *
     * @param width the number of bits of a word
     * @param words the measured words
     * @param stream for ties and draws
     * @return a non-zero word; empty if the words name none
     */
    Optional<Long> decode(int width, long[] words, RandomStream stream);
}
