package org.notchwork.bundle;

import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A manifest of RFC 8493, section 2.1.3: a digest and a path a line.
 *
 * <p>Written sorted by path, lower-case digits, two spaces, a line feed after every line, which {@code sha256sum -c}
 * reads as well. Read in that form alone.
 */
final class Manifest {

    private static final Pattern LINE = Pattern.compile("([0-9a-f]{64}) {2}((?:data/)?)([^/]+)");

    private Manifest() {}

    /** Returns the text of a manifest. */
    static String write(Map<String, String> digests) {
        StringBuilder text = new StringBuilder();
        new TreeMap<>(digests)
                .forEach((path, digest) ->
                        text.append(digest).append("  ").append(path).append('\n'));
        return text.toString();
    }

    /**
     * Reads a manifest.
     *
     * @param file its name, for messages
     * @param bytes its bytes
     * @param payload whether it lists the payload, whose paths begin with {@code data/}; if not, none may
     * @return path to digest
     */
    static Map<String, String> read(String file, byte[] bytes, boolean payload) throws BundleFault {
        Map<String, String> digests = new TreeMap<>();
        int number = 0;
        for (String line : TagText.lines(file, bytes)) {
            number++;
            String place = file + ", line " + number;
            Matcher matcher = LINE.matcher(line);
            if (!matcher.matches() || matcher.group(2).isEmpty() == payload) {
                throw new BundleFault(
                        BundleFault.Reason.MANIFEST_LINE,
                        place,
                        "64 digits 0-9a-f, two spaces and a plain path are wanted");
            }
            FileNames.require(matcher.group(3), place);
            if (digests.put(matcher.group(2) + matcher.group(3), matcher.group(1)) != null) {
                throw new BundleFault(BundleFault.Reason.LISTED_TWICE, place, "this file is listed already");
            }
        }
        return digests;
    }
}
