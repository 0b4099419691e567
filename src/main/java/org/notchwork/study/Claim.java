package org.notchwork.study;

/**
 * A statement about the figures that can be found true or false.
 *
 * @param id lower-case letters, digits and hyphens, at most 40; unique in the study
 * @param text the statement in the author's words
 * @param quantity what it is about
 * @param bound what it says
 */
public record Claim(String id, String text, Quantity quantity, Bound bound) {}
