/** Functions that an author gives as a file: the family {@code table}. */
package org.notchwork.problem.table;
