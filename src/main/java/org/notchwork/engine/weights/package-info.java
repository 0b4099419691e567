/** The engine that counts equal values for every shift and transforms the counts; exact for any function. Blind. */
package org.notchwork.engine.weights;
