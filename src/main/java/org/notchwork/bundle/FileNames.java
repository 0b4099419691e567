package org.notchwork.bundle;

import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;

/** Which file names a bundle may use: those that every system takes and no tool reads in two ways. */
final class FileNames {

    private static final Pattern FORM = Pattern.compile("[A-Za-z0-9][A-Za-z0-9._-]{0,99}");
    private static final Pattern DEVICE = Pattern.compile("(?i)(con|prn|aux|nul|com[0-9]|lpt[0-9])(\\..*)?");

    private static final int LONGEST_SHOWN = 120;

    private FileNames() {}

    /** Throws unless a name, without folders, may be used. */
    static void require(String name, String place) throws BundleFault {
        if (name.startsWith(".") && !name.equals(".") && !name.equals("..")) {
            throw new BundleFault(
                    BundleFault.Reason.HIDDEN_FILE, shown(place), "a hidden file; a bundle has none, so remove it");
        }
        if (!FORM.matcher(name).matches()
                || name.endsWith(".")
                || DEVICE.matcher(name).matches()) {
            throw new BundleFault(
                    BundleFault.Reason.NAME,
                    shown(place),
                    "a name that a bundle may not use; letters, digits, '.', '_' and '-' are allowed, the first a"
                            + " letter or digit, and no device names");
        }
    }

    /** Returns a name as a message shows it: in printable ASCII, other characters by their code points. */
    private static String shown(String place) {
        StringBuilder text = new StringBuilder();
        place.codePoints().limit(LONGEST_SHOWN).forEach(c -> {
            if (c >= ' ' && c <= '~') {
                text.appendCodePoint(c);
            } else {
                text.append(String.format(Locale.ROOT, "\\u{%04x}", c));
            }
        });
        return text.toString();
    }

    /** Throws if two names are the same to a system that ignores case. */
    static void requireDistinct(Iterable<String> names) throws BundleFault {
        Set<String> folded = new TreeSet<>();
        for (String name : names) {
            if (!folded.add(name.toLowerCase(Locale.ROOT))) {
                throw new BundleFault(BundleFault.Reason.NAME_CLASH, name, "another name differs from it in case only");
            }
        }
    }
}
