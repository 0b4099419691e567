/**
 * The bundle: what is handed over. File formats (writer and reader of each side by side), the bag of RFC 8493, the
 * tree hash of RFC 9162 over the trial lines, the seal, and the one reader that treats a bundle as hostile.
 *
 * <p>The formats are described in {@code schemas/FORMAT.md} well enough that a stranger can write a verifier. Any
 * change to sealed bytes is a new format version. May use everything up to {@code claim}.
 */
package org.notchwork.bundle;
