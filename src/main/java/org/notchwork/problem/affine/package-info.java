/** Affine functions with a period, given as circuits: the family {@code affine-period}. */
package org.notchwork.problem.affine;
