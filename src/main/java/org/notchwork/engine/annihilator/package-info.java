/** The engine that is told the secret and samples from the distribution that theory gives. Sighted. */
package org.notchwork.engine.annihilator;
