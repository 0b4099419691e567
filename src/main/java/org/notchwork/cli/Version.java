package org.notchwork.cli;

import java.util.Optional;

/** The program's own name and version, from the jar it was started from. */
final class Version {

    private Version() {}

    /** Returns one line: name, version, Java. */
    static String line() {
        return program() + ", format 1, Java " + Runtime.version().feature();
    }

    /** Returns the name and the version; outside a jar the version is called {@code development}. */
    static String program() {
        String version = Optional.ofNullable(Version.class.getPackage().getImplementationVersion())
                .orElse("development");
        return "notchwork " + version;
    }
}
