/** Functions that are constant exactly on the cosets of a hidden subspace: the family {@code hidden-subspace}. */
package org.notchwork.problem.subspace;
