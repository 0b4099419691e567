/**
 * Engines: how a quantum strategy's circuit is evaluated on this machine. One folder an engine, registered by one
 * line in {@code catalogue.Engines}.
 *
 * <p>A blind engine is handed a {@link org.notchwork.problem.Unitary} and works from evaluations of the function
 * alone. A sighted engine is told what the instance hides; only {@code .annihilator} may. Sampling is done in exact
 * integers: nothing that depends on floating point decides an outcome. May use {@code bits}, {@code problem} and
 * {@code seed}.
 */
package org.notchwork.engine;
