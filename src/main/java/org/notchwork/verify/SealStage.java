package org.notchwork.verify;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.Seal;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/** Computes the seal again from the bytes and compares it with the file and with what the referee expects. */
final class SealStage {

    private static final String FILE = Layout.DATA + Layout.SEAL;

    private SealStage() {}

    /**
     * Returns the report.
     *
     * @param files the opened files
     * @param bag the bag; its files were hashed already, whether or not as listed
     * @param pass the pass over the lines
     * @param expect the seal that the referee has from elsewhere
     */
    static StageReport report(OpenedFiles files, Bag bag, LinePass pass, Optional<String> expect) {
        Findings findings = new Findings();
        Seal seal = files.seal();
        for (Map.Entry<String, String> sealed : seal.files().entrySet()) {
            String found = bag.found(Layout.DATA + sealed.getKey());
            compare(findings, "/files/" + sealed.getKey(), sealed.getValue(), found);
            Optional.ofNullable(pass.digests().get(sealed.getKey()))
                    .filter(d -> !d.equals(found))
                    .ifPresent(d -> findings.add(Finding.of(
                            Layout.DATA + sealed.getKey(), "bytes that changed while they were read", found)));
        }
        compare(
                findings,
                "/trials/count",
                Long.toString(seal.trials()),
                Long.toString(pass.tree().size()));
        compare(findings, "/trials/root", seal.root(), Digests.text(pass.tree().root()));
        compare(findings, "/seal", written(files), seal.digest());
        expect.filter(e -> !seal.digest().startsWith(e))
                .ifPresent(e -> findings.add(Finding.of(FILE, seal.digest(), e + " (the seal that you expect)")));
        String good = expect.isPresent()
                ? "intact: the bytes fit the seal, and it is the one that you expect"
                : "intact: the bytes fit the seal that came along; --expect compares it with one from elsewhere";
        return StageReport.of(Stage.SEAL, findings, good, "the bytes do not fit the seal");
    }

    private static String written(OpenedFiles files) {
        JsonValue seal =
                ((JsonObject) files.values().get(Layout.SEAL)).member("seal").orElseThrow();
        return ((JsonText) seal).value();
    }

    private static void compare(Findings findings, String pointer, String written, String right) {
        if (!written.equals(right)) {
            findings.add(new Finding(FILE, OptionalLong.empty(), pointer, written, right));
        }
    }
}
