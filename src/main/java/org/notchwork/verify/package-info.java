/**
 * Verification: stage by stage, what a bundle proves and what not, and the verdict.
 *
 * <p>Reads the very types that a run wrote and computes them again; it has no second copy of any logic. May use
 * everything up to {@code bundle}.
 */
package org.notchwork.verify;
