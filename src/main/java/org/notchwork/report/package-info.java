/**
 * The report for people: {@code report.pdf}. Sections, tables and charts on pages of one simple layout, tagged so that
 * they can be read aloud; every number comes from the results and none is computed here but the laws' curves. Not under
 * the seal: it prints the seal. A new part is a class with a method {@code set(Flow)}, called by {@link
 * org.notchwork.report.Report}. May use everything up to {@code bundle}, and {@code law} through {@code catalogue}.
 */
package org.notchwork.report;
