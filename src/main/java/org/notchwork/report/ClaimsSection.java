package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import org.notchwork.claim.ClaimResult;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Printable;
import org.notchwork.study.Bound;
import org.notchwork.study.Claim;
import org.notchwork.study.Quantity;

/** Every claim with its evidence and verdict. */
final class ClaimsSection {

    private final List<ClaimResult> claims;

    ClaimsSection(List<ClaimResult> claims) {
        this.claims = List.copyOf(claims);
    }

    void set(Flow flow) throws IOException {
        flow.heading("Claims and verdicts");
        if (claims.isEmpty()) {
            flow.body("The study makes no claims.");
            return;
        }
        Table table = new Table(List.of(
                Table.Column.left("claim", 34),
                Table.Column.left("in figures", 24),
                Table.Column.right("value", 11),
                Table.Column.left("95 % interval", 17),
                Table.Column.left("verdict", 14)));
        for (ClaimResult claim : claims) {
            table.add(List.of(
                    claim.claim().id() + ": " + Printable.escape(claim.claim().text()),
                    quantity(claim.claim()) + " " + bound(claim.claim().bound()),
                    Decimals.text(claim.value(), 4),
                    claim.interval()
                            .map(i -> Decimals.text(i.low(), 4) + " to " + Decimals.text(i.high(), 4))
                            .orElse("none"),
                    claim.verdict().word()));
        }
        table.set(flow);
        flow.note(
                "A claim is supported if the whole 95 % interval lies where the claim says, refuted if the whole of it"
                        + " lies elsewhere, undecided otherwise. One interval in twenty misses the truth by chance.");
    }

    private static String quantity(Claim claim) {
        if (claim.quantity() instanceof Quantity.OfCell ofCell) {
            return ofCell.figure().word() + " of " + ofCell.cell().id();
        }
        Quantity.Ratio ratio = (Quantity.Ratio) claim.quantity();
        return "mean queries of " + ratio.of().id() + " over " + ratio.to().id();
    }

    private static String bound(Bound bound) {
        if (bound instanceof Bound.AtMost atMost) {
            return "≤ " + atMost.high().toPlainString();
        }
        if (bound instanceof Bound.AtLeast atLeast) {
            return "≥ " + atLeast.low().toPlainString();
        }
        Bound.Between between = (Bound.Between) bound;
        return "from " + between.low().toPlainString() + " to " + between.high().toPlainString();
    }
}
