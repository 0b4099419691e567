/** Strategies that run circuits around the function, on whatever engine they are handed. */
package org.notchwork.strategy.quantum;
