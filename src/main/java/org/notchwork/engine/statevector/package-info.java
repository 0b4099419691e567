/** The engine that keeps the amplitudes of both registers and applies the circuit gate by gate. Blind. */
package org.notchwork.engine.statevector;
