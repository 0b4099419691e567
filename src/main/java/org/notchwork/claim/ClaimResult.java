package org.notchwork.claim;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.figure.Interval;
import org.notchwork.study.Claim;

/**
 * A claim, its evidence and its verdict.
 *
 * @param claim the claim
 * @param value the figure, as computed
 * @param interval its 95 % interval, where there is one
 * @param verdict what the interval says
 * @param reason why, in one sentence
 */
public record ClaimResult(
        Claim claim, BigDecimal value, Optional<Interval> interval, ClaimVerdict verdict, String reason) {}
