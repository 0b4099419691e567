/** Ways to name a period from a fixed number of measured words, disturbed ones perhaps among them. */
package org.notchwork.strategy.quantum.decoder;
