/**
 * Checks of certificates: whether an answer holds, by a few evaluations and plain linear algebra.
 *
 * <p>Shares nothing with the strategies that made the certificates, which a test enforces. May use {@code bits} and
 * {@code problem}.
 */
package org.notchwork.certificate;
