package org.notchwork.bundle;

import java.util.Map;

/** The size of the payload and the number of its files: {@code Payload-Oxum} of RFC 8493, section 2.2.2. */
final class PayloadOxum {

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
}
