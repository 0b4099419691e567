/**
 * The study file: its records, its strict reader, its cells and the forecast of its cost.
 *
 * <p>A {@link org.notchwork.study.Study} that exists is valid. May use everything up to {@code catalogue}.
 */
package org.notchwork.study;
