/**
 * Keyed constructions of toy size whose structure hides a period: {@code even-mansour} and {@code feistel-three}.
 *
 * <p>They are toys: a few bits wide, with permutations drawn at random. Nothing here assesses a cipher in use; that
 * belongs to qualified cryptographers and current standards.
 */
package org.notchwork.problem.cipher;
