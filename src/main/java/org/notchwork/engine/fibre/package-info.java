/** The engine that measures the value register first and then transforms one fibre. Blind. */
package org.notchwork.engine.fibre;
