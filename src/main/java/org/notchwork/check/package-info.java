/**
 * Cross-checks: independent computations that must agree with what the trials found.
 *
 * <p>Exhaustive search and the checkers of certificates are written apart from the strategies that they check: this
 * package uses {@code problem}, {@code engine}, {@code law}, {@code study}, {@code trial} and {@code figure}, never
 * {@code strategy}'s implementations.
 */
package org.notchwork.check;
