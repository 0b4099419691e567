package org.notchwork.report;

import java.awt.Color;
import java.io.IOException;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.SummaryFile;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.json.Printable;

/** Says at the top of the first page whether the cross-checks agree, which do not, and what became of the claims. */
final class VerdictStrip {

    private static final float PADDING = 7;

    /** How many differing checks are named on the first page; all of them stand in their table. */
    private static final int NAMED = 4;

    /** The most characters of one of them here. */
    private static final int LONGEST = 220;

    private final Results results;

    VerdictStrip(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        boolean good = results.differing() == 0;
        flow.gap(4);
        strip(flow, SummaryFile.attention(results.checks()), good ? Style.TINT : Style.ALARM, good);
        flow.gap(3);
        if (!good) {
            differing(flow);
        }
        flow.note(Numbers.count(results.checks().size(), "cross-check") + ": " + count(CheckOutcome.AGREES)
                + " agree, " + results.differing() + " differ, " + count(CheckOutcome.NOT_COMPARABLE)
                + " had nothing to compare.");
        strip(flow, claims(), Style.TINT, true);
        flow.gap(3);
    }

    private void strip(Flow flow, String text, Color ground, boolean dark) throws IOException {
        Style style = Style.STRONG;
        List<String> lines = Wrap.lines(style.font(flow.fonts()), style.size(), text, Flow.MEASURE - 2 * PADDING);
        float height = lines.size() * style.leading() + 2 * PADDING;
        flow.require(height);
        flow.box(Flow.MARGIN, flow.y() - height, Flow.MEASURE, height, ground);
        var paragraph = flow.structure().add("P");
        float at = flow.y() - PADDING - style.size();
        for (String line : lines) {
            flow.draw(paragraph, style, dark ? Style.INK : Color.WHITE, line, Flow.MARGIN + PADDING, at);
            at -= style.leading();
        }
        flow.down(height);
    }

    private void differing(Flow flow) throws IOException {
        List<CrossCheck> differing = results.checks().stream()
                .filter(c -> c.outcome() == CheckOutcome.DIFFERS)
                .toList();
        for (CrossCheck check : differing.stream().limit(NAMED).toList()) {
            flow.text(
                    Style.SMALL_STRONG,
                    Style.ALARM,
                    Printable.cut(
                            "DIFFERS: " + check.kind().word() + " on " + check.subject() + ". Expected: "
                                    + check.expected() + ". Observed: " + check.observed() + ".",
                            LONGEST));
        }
        if (differing.size() > NAMED) {
            flow.text(
                    Style.SMALL_STRONG,
                    Style.ALARM,
                    "and " + (differing.size() - NAMED) + " more, all listed under Cross-checks.");
        }
    }

    private String claims() {
        if (results.claims().isEmpty()) {
            return "The study makes no claims.";
        }
        return "Claims: " + count(ClaimVerdict.SUPPORTED) + " supported, " + count(ClaimVerdict.REFUTED) + " refuted, "
                + count(ClaimVerdict.UNDECIDED) + " undecided.";
    }

    private long count(CheckOutcome outcome) {
        return results.checks().stream().filter(c -> c.outcome() == outcome).count();
    }

    private long count(ClaimVerdict verdict) {
        return results.claims().stream().filter(c -> c.verdict() == verdict).count();
    }
}
