/** Functions with a hidden XOR period: the family {@code xor-period} and its two kinds of instance. */
package org.notchwork.problem.period;
