package org.notchwork.problem;

/**
 * One of several functions that can be called on their own.
 *
 * @param name lower-case letters and hyphens
 * @param function the function
 */
public record Part(String name, BitFunction function) {}
