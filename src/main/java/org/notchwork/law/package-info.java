/**
 * What theory says about a cell, exactly. Rationals, no sampling, no strategies. One class a law, named after what it
 * predicts; its test enumerates the law at small widths. Used by {@code check}, {@code figure} and {@code report}.
 * May use {@code exact}.
 */
package org.notchwork.law;
