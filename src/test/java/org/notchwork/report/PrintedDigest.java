package org.notchwork.report;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import org.notchwork.Studies;

/** Prints the SHA-256 of a report, from a Java process of its own. */
final class PrintedDigest {

    private PrintedDigest() {}

    public static void main(String[] args) throws NoSuchAlgorithmException {
        System.out.println(digest());
    }

    /** Returns the digest of the report on the small study. */
    static String digest() throws NoSuchAlgorithmException {
        byte[] pdf = Report.pdf(Samples.results(Studies.small()), Samples.SEAL, Samples.ENVIRONMENT);
        return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(pdf));
    }
}
