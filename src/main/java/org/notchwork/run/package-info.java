/**
 * The pipeline from a study to a bundle: trials on the pool, figures, cross-checks, claims, the sealed folder, the
 * report. May use everything but {@code cli}.
 */
package org.notchwork.run;
