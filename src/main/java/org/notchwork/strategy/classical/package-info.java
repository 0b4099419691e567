/** Strategies that evaluate the function at one point after another. */
package org.notchwork.strategy.classical;
