package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import org.notchwork.claim.ClaimResult;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Printable;
import org.notchwork.study.Bound;
import org.notchwork.study.Claim;
import org.notchwork.study.Quantity;

/** Every claim with its evidence, its verdict and the reason for it. */
final class ClaimsSection {

    /** A claim up to this height is kept on one page. */
    private static final float KEPT = 200;

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
        for (ClaimResult claim : claims) {
            set(flow, claim);
        }
        flow.note(
                "A claim is supported if the whole 95 % interval lies where the claim says, refuted if the whole of it"
                        + " lies elsewhere, undecided otherwise. Where trials were censored, an end of the interval that"
                        + " bounds nothing decides nothing. One interval in twenty misses the truth by chance.");
    }

    private static void set(Flow flow, ClaimResult claim) throws IOException {
        String verdict = claim.claim().id() + ": " + claim.verdict().word().toUpperCase(Locale.ROOT);
        String text = Printable.escape(claim.claim().text());
        String said = "Claimed: " + quantity(claim.claim()) + " "
                + bound(claim.claim().bound()) + ".";
        String found = "Found: " + Decimals.text(claim.value()) + ". Reason: " + Printable.escape(claim.reason()) + ".";
        float height = flow.height(Style.SUBHEADING, verdict)
                + flow.height(Style.BODY, text)
                + flow.height(Style.SMALL, said)
                + flow.height(Style.SMALL, found);
        flow.require(Math.min(height, KEPT));
        flow.text(Style.SUBHEADING, claim.verdict() == ClaimVerdict.REFUTED ? Style.ALARM : Style.INK, verdict);
        flow.text(Style.BODY, Style.INK, text);
        flow.text(Style.SMALL, Style.INK, said);
        flow.text(Style.SMALL, Style.INK, found);
        flow.gap(7);
    }

    private static String quantity(Claim claim) {
        if (claim.quantity() instanceof Quantity.OfCell ofCell) {
            return ofCell.figure().word() + " of " + ofCell.cell().id();
        }
        Quantity.Ratio ratio = (Quantity.Ratio) claim.quantity();
        return "mean queries of " + ratio.of().id() + " over those of "
                + ratio.to().id();
    }

    private static String bound(Bound bound) {
        if (bound instanceof Bound.AtMost atMost) {
            return "at most " + atMost.high().toPlainString();
        }
        if (bound instanceof Bound.AtLeast atLeast) {
            return "at least " + atLeast.low().toPlainString();
        }
        Bound.Between between = (Bound.Between) bound;
        return "between " + between.low().toPlainString() + " and "
                + between.high().toPlainString();
    }
}
