package org.notchwork.study;

import java.util.HashSet;
import java.util.Set;
import java.util.regex.Pattern;
import org.notchwork.json.Fields;

/** Reads the ids of the items of one list; each may come once. */
final class Ids {

    /** What the id of an experiment or of a claim looks like; it becomes part of a file name. */
    private static final Pattern FORM = Pattern.compile("[a-z0-9](?:[a-z0-9-]{0,38}[a-z0-9])?");

    private static final String MEND = "1 to 40 lower-case letters, digits and inner hyphens are wanted";

    private final String kind;
    private final Set<String> seen = new HashSet<>();

    /**
     * Starts a list.
     *
     * @param kind what the items are, for example {@code "claim"}
     */
    Ids(String kind) {
        this.kind = kind;
    }

    /** Returns the id of the next item; empty if a fault was noted, but for an id that comes a second time. */
    String read(Fields item) {
        String id = item.text("id", FORM, MEND);
        if (!id.isEmpty() && !seen.add(id)) {
            item.fault("id", "a second " + kind + " " + Fields.quoted(id), "ids must differ");
        }
        return id;
    }
}
