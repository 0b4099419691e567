package org.notchwork.strategy;

/**
 * What a strategy used besides queries.
 *
 * @param equations linear equations collected, dependent ones included; 0 for a strategy without any
 * @param memoryWords the most words of memory held at once for points, values or equations
 */
public record Usage(long equations, long memoryWords) {}
