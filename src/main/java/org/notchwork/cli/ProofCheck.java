package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.notchwork.bundle.Seal;
import org.notchwork.bundle.TrialProof;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.Printable;

/** Holds the proof of one trial against a seal, without the rest of the bundle. */
final class ProofCheck {

    private static final int LARGEST = 4 << 20;

    private ProofCheck() {}

    /** Checks a proof and prints what it proves. */
    static Exit run(Path file, Optional<String> expected, Terminal terminal) throws Refusal {
        String seal = expected.orElseThrow(() -> new Refusal(
                Exit.USAGE, "--proof: --expect SEAL is wanted; a proof says nothing without a seal from elsewhere"));
        TrialProof proof = read(file);
        boolean isSeal =
                proof.seal().digest().startsWith(seal.replaceAll("\\s", "").toLowerCase(Locale.ROOT));
        terminal.out().println("trial   " + Printable.escape(CanonicalJson.text(proof.trial())));
        terminal.out()
                .println("place   line " + (proof.index() + 1) + " of "
                        + proof.seal().trials() + ", " + proof.path().size() + " hashes of the audit path");
        terminal.out().println("seal    " + Seal.groups(proof.seal().digest()));
        if (!isSeal) {
            terminal.out().println("NO: the proof is about another seal than the one you expect");
            return Exit.NO;
        }
        if (!proof.holds()) {
            terminal.out().println("NO: the path does not lead from the line to the tree head under the seal");
            return Exit.NO;
        }
        terminal.out().println("YES: this line stands under the seal that you expect; not: that the line is true");
        return Exit.GOOD;
    }

    private static TrialProof read(Path file) throws Refusal {
        try {
            if (!Files.isRegularFile(file)) {
                throw new Refusal(Exit.USAGE, file + ": no such file; name the proof of a trial");
            }
            if (Files.size(file) > LARGEST) {
                throw new Refusal(Exit.MALFORMED, file + ": more than " + LARGEST + " bytes; no proof is so long");
            }
            List<Fault> faults = new ArrayList<>();
            return TrialProof.read(new JsonReader(JsonLimits.FILE).read(Files.readAllBytes(file)), faults)
                    .orElseThrow(() -> new Refusal(
                            Exit.MALFORMED,
                            Printable.escape(file + ", " + faults.get(0).line())));
        } catch (JsonFault e) {
            throw new Refusal(Exit.MALFORMED, Printable.escape(file + ", " + e.place() + ": " + e.getMessage()));
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, IoText.of(e, file));
        }
    }
}
