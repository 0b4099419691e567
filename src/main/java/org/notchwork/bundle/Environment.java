package org.notchwork.bundle;

/**
 * Where and when a study ran. Never under the seal; holds no user, host or path.
 *
 * @param program the program and its version
 * @param started when the run began, UTC, RFC 3339 to the second
 * @param finished when it ended, UTC
 * @param seconds how long it took, rounded up
 * @param threads how many worker threads
 * @param java the Java version and vendor
 * @param system the operating system and processor family
 */
public record Environment(
        String program, String started, String finished, long seconds, int threads, String java, String system) {}
