package org.notchwork.strategy;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;

/** Brings a span into the one form that an answer has. */
public final class ReducedBasis {

    private ReducedBasis() {}

    /** Returns the span of a basis as an answer: reduced echelon form, leading bits descending. */
    public static Answer.Subspace subspace(EchelonBasis basis, int width) {
        List<Word> rows = new ArrayList<>();
        for (int lead = width - 1; lead >= 0; lead--) {
            if (basis.row(lead) != 0) {
                rows.add(Word.of(width, basis.row(lead)));
            }
        }
        return new Answer.Subspace(rows);
    }

    /** Returns the span of some words of at most 63 bits as an answer. */
    public static Answer.Subspace subspace(List<Word> words, int width) {
        EchelonBasis basis = new EchelonBasis(width);
        words.forEach(word -> basis.add(word.bits()));
        return subspace(basis, width);
    }
}
