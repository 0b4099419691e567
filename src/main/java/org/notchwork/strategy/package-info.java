/**
 * Strategies: how a question gets answered. Registered by one line in {@code catalogue.Strategies}.
 *
 * <p>A strategy gets an oracle, a private random stream and, if it is a quantum one, an opened engine. It never gets
 * an instance, a {@code Unitary} or the seed. A spent query limit is an outcome ({@code Censored}), never an
 * exception. May use {@code bits}, {@code engine} (only {@code Simulation}), {@code problem} and {@code seed}.
 */
package org.notchwork.strategy;
