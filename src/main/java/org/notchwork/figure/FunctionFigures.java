package org.notchwork.figure;

import java.math.BigDecimal;

/**
 * The queries of one function of a cell whose problem has several.
 *
 * @param function the name of the function
 * @param mean the mean number of queries of a trial, confirmation not included
 * @param max the greatest number
 */
public record FunctionFigures(String function, BigDecimal mean, long max) {}
