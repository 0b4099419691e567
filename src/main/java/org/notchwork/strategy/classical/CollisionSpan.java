package org.notchwork.strategy.classical;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.ReducedBasis;
import org.notchwork.strategy.Usage;

/**
 * Queries uniformly random points, none twice, until the sums of colliding points span as many dimensions as are hidden.
 * A point is {@code bits(n)}, drawn again while it has been asked before.
 */
public final class CollisionSpan implements ClassicalStrategy {

    @Override
    public String name() {
        return "collision-span";
    }

    @Override
    public String description() {
        return "queries uniformly random points, none twice, until the sums of points with one value span the subspace";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.exactly(name(), problem, Set.of(Question.SUBSPACE));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 2 * SeenValues.bytes(Math.min(queryLimit, 1L << width));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        int width = oracle.width();
        SeenValues seen = new SeenValues();
        SeenValues asked = new SeenValues();
        EchelonBasis basis = new EchelonBasis(width);
        List<Pair> pairs = new ArrayList<>();
        while (oracle.remaining() > 0 && asked.size() < 1L << width) {
            long x = stream.bits(width);
            if (asked.noteOrFind(x, x) != SeenValues.NONE) {
                continue;
            }
            long value = oracle.query(x);
            long earlier = seen.noteOrFind(value, x);
            if (earlier != SeenValues.NONE && basis.add(earlier ^ x)) {
                Word shared = Word.of(oracle.valueWidth(), value);
                pairs.add(new Pair(Word.of(width, earlier), Word.of(width, x), shared, shared));
                if (basis.rank() == oracle.promise().dimension()) {
                    return new Attempt.Answered(
                            ReducedBasis.subspace(basis, width),
                            new Certificate.Collisions(pairs),
                            new Usage(0, seen.memoryWords()));
                }
            }
        }
        return new Attempt.Censored(new Usage(0, seen.memoryWords()));
    }
}
