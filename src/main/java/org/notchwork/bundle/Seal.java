package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/**
 * The seal: what {@code seal.json} lists and the one digest over it.
 *
 * <p>The seal is SHA-256 over the canonical JSON of {@code seal.json} without its member {@code seal}.
 *
 * @param files the digest of each sealed file, by name
 * @param trials how many trial lines there are
 * @param root the RFC 9162 tree head over all trial lines, in the order of the study's experiments
 */
public record Seal(Map<String, String> files, long trials, String root) {

    private static final int GROUP = 8;
    private static final Pattern HEX = Digests.FORM;
    private static final String HEX_MEND = "64 digits 0-9a-f are wanted";

    /** Copies and sorts the files. */
    public Seal {
        files = Collections.unmodifiableMap(new TreeMap<>(files));
    }

    /** Returns the seal: 64 hexadecimal digits. */
    public String digest() {
        return Digests.hex(CanonicalJson.bytes(body().build()));
    }

    /** Returns {@code seal.json}. */
    public JsonObject write() {
        return body().put("seal", digest()).build();
    }

    /** Returns 64 digits in eight groups that can be read aloud. */
    public static String groups(String digest) {
        List<String> groups = new ArrayList<>();
        for (int i = 0; i < digest.length(); i += GROUP) {
            groups.add(digest.substring(i, Math.min(digest.length(), i + GROUP)));
        }
        return String.join(" ", groups);
    }

    /**
     * Reads {@code seal.json}.
     *
     * @param value the file
     * @param names the names of the files that the study calls for
     * @param faults where faults are noted; what is returned must not be used if there are any
     */
    public static Seal read(JsonValue value, List<String> names, List<Fault> faults) {
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.SEAL);
        fields.text("seal", HEX, HEX_MEND);
        Fields listed = fields.object("files");
        Map<String, String> files = new TreeMap<>();
        for (String name : names) {
            files.put(name, listed.text(name, HEX, HEX_MEND));
        }
        listed.end();
        Fields tree = fields.object("trials");
        long count = tree.integer("count", 1, JsonInteger.MAX);
        String root = tree.text("root", HEX, HEX_MEND);
        tree.end();
        fields.end();
        return new Seal(files, count, root);
    }

    private JsonObject.Builder body() {
        JsonObject.Builder listed = JsonObject.builder();
        files.forEach(listed::put);
        JsonObject tree =
                JsonObject.builder().put("count", trials).put("root", root).build();
        return JsonObject.builder()
                .put("files", listed.build())
                .put("format", Formats.SEAL)
                .put("trials", tree);
    }
}
