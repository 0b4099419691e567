/**
 * Figures: what the trials of a cell amount to, with intervals, from exact counts.
 *
 * <p>Figures are gathered from records as they pass; memory does not grow with the number of trials but with the
 * number of different counts. Everything is computed from integers and rounded by the rule of {@code exact}. May use
 * {@code exact}, {@code study} and {@code trial}.
 */
package org.notchwork.figure;
