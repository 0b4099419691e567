package org.notchwork.catalogue;

import java.util.List;
import java.util.Optional;
import org.notchwork.problem.Family;
import org.notchwork.problem.affine.AffinePeriodFamily;
import org.notchwork.problem.balance.ConstantOrBalancedFamily;
import org.notchwork.problem.cipher.EvenMansourFamily;
import org.notchwork.problem.cipher.FeistelThreeFamily;
import org.notchwork.problem.mask.InnerProductFamily;
import org.notchwork.problem.period.PeriodOrNoneFamily;
import org.notchwork.problem.period.XorPeriodFamily;
import org.notchwork.problem.subspace.HiddenSubspaceFamily;
import org.notchwork.problem.table.TableFamily;

/** The families of problems there are. */
public final class Problems {

    private static final List<Family> ALL = List.of(
            new XorPeriodFamily(),
            new PeriodOrNoneFamily(),
            new HiddenSubspaceFamily(),
            new InnerProductFamily(),
            new ConstantOrBalancedFamily(),
            new AffinePeriodFamily(),
            new EvenMansourFamily(),
            new FeistelThreeFamily(),
            new TableFamily());

    private Problems() {}

    /** Returns the kinds, in the order of the documentation. */
    public static List<String> kinds() {
        return ALL.stream().map(Family::kind).toList();
    }

    /** Returns the family of a kind. */
    public static Optional<Family> family(String kind) {
        return ALL.stream().filter(f -> f.kind().equals(kind)).findFirst();
    }
}
