/**
 * The report for people: {@code report.pdf}. Sections, tables and charts on pages of one simple layout; every number
 * comes from the results and none is computed here but the laws' curves. Not under the seal: it prints the seal. May
 * use everything up to {@code bundle}, and {@code law} through {@code catalogue}.
 */
package org.notchwork.report;
