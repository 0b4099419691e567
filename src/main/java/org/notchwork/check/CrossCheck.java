package org.notchwork.check;

import java.util.Optional;

/**
 * One cross-check and what it found.
 *
 * @param kind what is checked, one of {@link CheckKind}
 * @param subject what it is checked on: {@code EXPERIMENT/WIDTH} or a cell
 * @param compared how many instances, secrets, words or trials were compared
 * @param expected what should be, in one line
 * @param observed what is, in one line
 * @param standardErrors how many standard errors the observation lies from the expectation, for a statistical check
 * @param outcome what was found
 */
public record CrossCheck(
        CheckKind kind,
        String subject,
        long compared,
        String expected,
        String observed,
        Optional<String> standardErrors,
        CheckOutcome outcome) {}
