package org.notchwork.strategy.quantum;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.WideBasis;
import org.notchwork.bits.Word;

/** The independent ones among measured words of any width, in the order in which they came. */
final class Independent {

    private static final int NARROW = 63;

    private final int width;
    private final EchelonBasis narrow;
    private final WideBasis wide;
    private final List<Word> words = new ArrayList<>();

    Independent(int width) {
        this.width = width;
        this.narrow = new EchelonBasis(Math.min(width, NARROW));
        this.wide = new WideBasis(width);
    }

    /** Takes a word; keeps it if it is independent of those before it. */
    boolean add(Word word) {
        boolean isNew = width <= NARROW ? narrow.add(word.bits()) : wide.add(word.value());
        if (isNew) {
            words.add(word);
        }
        return isNew;
    }

    int rank() {
        return words.size();
    }

    List<Word> words() {
        return words;
    }

    /** Returns a basis of the words orthogonal to all. */
    List<Word> complement() {
        return width <= NARROW
                ? Arrays.stream(narrow.complement())
                        .mapToObj(w -> Word.of(width, w))
                        .toList()
                : wide.complement().stream().map(w -> new Word(width, w)).toList();
    }
}
