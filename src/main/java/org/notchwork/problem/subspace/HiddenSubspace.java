package org.notchwork.problem.subspace;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;

/**
 * Find the subspace on whose cosets, and on nothing larger, f is constant (Z. Ye, Y. Huang, L. Li, Y. Wang, Query
 * complexity of generalized Simon's problem (2021)).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: {@code nonZeroBits(n)} again and
 * again, keeping the words that are independent of those kept before, until k are kept; every subspace is equally
 * likely. A coset is represented by its member in which the leading bits of the reduced echelon form are clear. Widths
 * to 16: {@code distinct(2^(n−k), 2^n)} labels the representatives in increasing order. Wider: a keyed permutation π is
 * drawn, and f(x) = π(r).
 *
 * @param dimension k, at least 1
 */
public record HiddenSubspace(int dimension) implements Problem {

    private static final int GREATEST = 63;

    @Override
    public String kind() {
        return HiddenSubspaceFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder()
                .put("dimension", dimension)
                .put("kind", kind())
                .build();
    }

    @Override
    public String description() {
        return "hidden-subspace: f is constant exactly on the cosets of a subspace of dimension " + dimension
                + "; find it";
    }

    @Override
    public Promise promise() {
        return new Promise(Question.SUBSPACE, dimension, Promise.Labels.RANDOM, false);
    }

    @Override
    public int leastWidth() {
        return dimension + 1;
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return width <= CosetFunction.TABLE_WIDTH ? 8L << width : 2048;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        requireWidth(width);
        EchelonBasis basis = new EchelonBasis(width);
        while (basis.rank() < dimension) {
            basis.add(stream.nonZeroBits(width));
        }
        return instance(basis, width, stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        requireWidth(width);
        if (!(hidden instanceof Answer.Subspace subspace)
                || subspace.basis().size() != dimension
                || subspace.basis().get(0).width() != width) {
            throw new IllegalArgumentException("not a subspace of dimension " + dimension + ": " + hidden);
        }
        EchelonBasis basis = new EchelonBasis(width);
        subspace.basis().forEach(word -> basis.add(word.bits()));
        return instance(basis, width, stream);
    }

    /** Nothing is listed: the subspaces are too many. */
    @Override
    public List<Answer> answers(int width) {
        return List.of();
    }

    private void requireWidth(int width) {
        if (width < leastWidth() || width > GREATEST) {
            throw new IllegalArgumentException("width " + width + " is not in " + leastWidth() + " to " + GREATEST);
        }
    }

    private static Instance instance(EchelonBasis basis, int width, RandomStream stream) {
        List<Word> rows = new ArrayList<>();
        for (int lead = width - 1; lead >= 0; lead--) {
            if (basis.row(lead) != 0) {
                rows.add(Word.of(width, basis.row(lead)));
            }
        }
        return new Instance(CosetFunction.draw(basis, width, stream), new Answer.Subspace(rows));
    }
}
