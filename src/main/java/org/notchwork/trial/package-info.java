/**
 * Trials: one instance faced by one strategy, what came of it, and the pool that runs many.
 *
 * <p>The record of a trial is the same whichever thread runs it, and records leave the pool in the order of the
 * study. May use everything up to {@code study}.
 */
package org.notchwork.trial;
