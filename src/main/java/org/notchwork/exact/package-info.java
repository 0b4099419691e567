/**
 * Exact numbers and the one rule by which they are rounded and written.
 *
 * <p>Figures are computed from integers in {@link java.math.BigDecimal} with 50 digits, whose operations (square
 * roots included) are specified to the last digit, so that every machine writes the same text. Uses nothing of this
 * project; used by whatever computes or prints a figure.
 */
package org.notchwork.exact;
