/** Functions that are constant or balanced: the family {@code constant-or-balanced}. */
package org.notchwork.problem.balance;
