package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads the bag's metadata, {@code bag-info.txt} of RFC 8493, section 2.2.2, as far as a reader relies on it.
 *
 * <p>A line is a label, a colon, a space and a value. Continuation lines, which the RFC allows, are refused: a reader
 * that joins them and one that does not would see different values.
 */
final class BagInfo {

    private static final Pattern LINE = Pattern.compile("([A-Za-z][A-Za-z-]{0,59}): (\\S|\\S.{0,4000}\\S)");
    private static final String OXUM = "payload-oxum";

    private BagInfo() {}

    /** Throws unless every line has the form and {@code Payload-Oxum} is stated once and is right. */
    static void require(byte[] bytes, String rightOxum) throws BundleFault {
        List<String> stated = new ArrayList<>();
        int number = 0;
        for (String line : TagText.lines(Layout.BAG_INFO, bytes)) {
            number++;
            Matcher matcher = LINE.matcher(line);
            if (!matcher.matches()) {
                throw new BundleFault(
                        BundleFault.Reason.BAG_INFO,
                        Layout.BAG_INFO + ", line " + number,
                        "a label, a colon, one space and a value on one line are wanted");
            }
            if (matcher.group(1).toLowerCase(Locale.ROOT).equals(OXUM)) {
                stated.add(matcher.group(2));
            }
        }
        if (!stated.equals(List.of(rightOxum))) {
            throw new BundleFault(
                    BundleFault.Reason.OXUM,
                    Layout.BAG_INFO,
                    "Payload-Oxum is stated " + stated.size() + " times or wrong; once " + rightOxum + " is right");
        }
    }
}
