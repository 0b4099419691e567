/**
 * The open sets: which problems, engines and strategies there are, and which law belongs to a strategy. One
 * registration line each and nothing else. May use {@code problem}, {@code engine}, {@code strategy} and {@code law}.
 */
package org.notchwork.catalogue;
