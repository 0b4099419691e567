package org.notchwork.bundle;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The size of the payload and the number of its files: {@code Payload-Oxum} of RFC 8493, section 2.2.2. */
final class PayloadOxum {

    private static final String LABEL = "payload-oxum:";

    private PayloadOxum() {}

    /** Returns the value: bytes, a point, files. */
    static String of(Map<String, Long> sizes) {
        long bytes = 0;
        long files = 0;
        for (Map.Entry<String, Long> file : sizes.entrySet()) {
            if (file.getKey().startsWith(Layout.DATA)) {
                bytes += file.getValue();
                files++;
            }
        }
        return bytes + "." + files;
    }

    /** Throws unless the metadata states the value once and right. */
    static void require(byte[] bagInfo, Map<String, Long> sizes) throws BundleFault {
        List<String> stated = new String(bagInfo, StandardCharsets.UTF_8)
                .lines()
                .filter(l -> l.toLowerCase(Locale.ROOT).startsWith(LABEL))
                .map(l -> l.substring(LABEL.length()).strip())
                .toList();
        String right = of(sizes);
        if (stated.size() != 1 || !stated.get(0).equals(right)) {
            throw new BundleFault(
                    BundleFault.Reason.OXUM,
                    Layout.BAG_INFO,
                    "Payload-Oxum is stated " + stated.size() + " times or wrong; " + right + " is right");
        }
    }
}
