/** Inner products with a hidden word: the family {@code inner-product}. */
package org.notchwork.problem.mask;
