package org.notchwork.bundle;

import java.util.List;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.claim.ClaimResult;
import org.notchwork.figure.Summary;
import org.notchwork.study.Study;

/**
 * What a study came to, without the trial lines.
 *
 * @param study the study as run
 * @param summary the figures
 * @param checks the cross-checks
 * @param claims the claims with their verdicts
 */
public record Results(Study study, Summary summary, List<CrossCheck> checks, List<ClaimResult> claims) {

    /** Copies the lists. */
    public Results {
        checks = List.copyOf(checks);
        claims = List.copyOf(claims);
    }

    /** Returns how many cross-checks found a difference. */
    public long differing() {
        return checks.stream().filter(c -> c.outcome() == CheckOutcome.DIFFERS).count();
    }
}
