package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/**
 * One trial line, its audit path in the tree (RFC 9162, section 2.1.3), and what the seal lists: enough to show that the
 * line stands under a seal, without the rest of the bundle.
 *
 * @param trial the line as JSON
 * @param index its place among all trial lines, from 0
 * @param path the hashes of the audit path, as digits, from the leaf's sibling upwards
 * @param seal what {@code seal.json} lists
 */
public record TrialProof(JsonObject trial, long index, List<String> path, Seal seal) {

    /** The name and version of the form. */
    public static final String FORMAT = "notchwork-proof/1";

    private static final int LONGEST_PATH = 64;
    private static final int MOST_FILES = 100;
    private static final String HEX_MEND = "64 digits 0-9a-f are wanted";

    /** Copies the path. */
    public TrialProof {
        path = List.copyOf(path);
    }

    /** Returns whether the path leads from the line to the tree head that the seal lists. */
    public boolean holds() {
        byte[] leaf = MerkleTree.leaf(CanonicalJson.bytes(trial));
        List<byte[]> siblings = path.stream().map(Digests::bytes).toList();
        return MerkleProof.proves(leaf, index, seal.trials(), siblings, Digests.bytes(seal.root()));
    }

    /** Returns the proof as JSON. */
    public JsonObject write() {
        return JsonObject.builder()
                .put("audit-path", JsonArray.ofTexts(path))
                .put("format", FORMAT)
                .put("index", index)
                .put("seal", seal.write())
                .put("trial", trial)
                .build();
    }

    /** Reads a proof; empty exactly if faults were noted. */
    public static Optional<TrialProof> read(JsonValue value, List<Fault> faults) {
        int before = faults.size();
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, FORMAT);
        long index = fields.integer("index", 0, JsonInteger.MAX);
        List<String> path = new ArrayList<>();
        for (Fields.Item item : fields.items("audit-path", 0, LONGEST_PATH)) {
            path.add(item.text(Digests.FORM, HEX_MEND));
        }
        Seal seal = seal(fields.object("seal"));
        Fields trial = fields.object("trial");
        fields.end();
        return faults.size() > before
                ? Optional.empty()
                : Optional.of(new TrialProof(trial.whole(), index, path, seal));
    }

    private static Seal seal(Fields fields) {
        Formats.require(fields, Formats.SEAL);
        String written = fields.text("seal", Digests.FORM, HEX_MEND);
        Map<String, String> files = new TreeMap<>();
        JsonObject listed = fields.object("files").whole();
        if (listed.members().size() > MOST_FILES) {
            fields.fault("files", listed.members().size() + " files", "at most " + MOST_FILES + " are wanted");
        }
        listed.members().forEach((name, digest) -> {
            if (digest instanceof JsonText text
                    && Digests.FORM.matcher(text.value()).matches()) {
                files.put(name, text.value());
            } else {
                fields.fault("files", "a digest of another form", HEX_MEND);
            }
        });
        Fields tree = fields.object("trials");
        long count = tree.integer("count", 1, JsonInteger.MAX);
        String root = tree.text("root", Digests.FORM, HEX_MEND);
        tree.end();
        fields.end();
        Seal seal = new Seal(files, count, root);
        if (!fields.isStandIn() && !written.isEmpty() && !seal.digest().equals(written)) {
            fields.fault("seal", Fields.quoted(written), "what is listed has the seal " + seal.digest());
        }
        return seal;
    }
}
