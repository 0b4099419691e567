/**
 * Claims: whether the figures support what the author says, by the interval and never by the point. May use
 * {@code study} and {@code figure}.
 */
package org.notchwork.claim;
