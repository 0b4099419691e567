/**
 * Problems: families of functions with a promise and a question, their instances, and the oracle that counts.
 *
 * <p>One folder a family ({@code .period}, …), registered by one line in {@code catalogue.Problems}. What
 * a strategy may see is the {@link org.notchwork.problem.Oracle} alone; what a blind engine may see is the
 * {@link org.notchwork.problem.Unitary} alone; neither leads to the hidden answer. May use {@code bits},
 * {@code json} and {@code seed}.
 */
package org.notchwork.problem;
