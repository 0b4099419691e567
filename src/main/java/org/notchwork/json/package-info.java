/**
 * JSON as the sealed files use it: RFC 8785 canonical form, integers and strings only, no floating-point token.
 *
 * <p>Here live the value types, the strict reader, the canonical writer and typed access with located faults. It
 * uses nothing of this project. Nothing that knows what a study or a bundle is may live here.
 */
package org.notchwork.json;
