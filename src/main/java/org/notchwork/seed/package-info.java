/**
 * The seed tree: one seed, a stream of random numbers for every address, exact draws from a stream.
 *
 * <p>This is the only source of chance. A stream depends on its address alone, so a trial is the same whichever
 * thread, process or machine runs it. The rules stand in {@code FORMAT.md} with test vectors; changing a rule here
 * is a new format version. May use {@code json} and {@code bits}.
 */
package org.notchwork.seed;
