/**
 * The command line: one short class a verb, the screens, the progress, the exit codes. May use everything.
 */
package org.notchwork.cli;
