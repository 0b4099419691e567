package org.notchwork.run;

import java.util.List;
import org.notchwork.bundle.MerkleTree;
import org.notchwork.bundle.TrialLine;
import org.notchwork.json.CanonicalJson;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.TrialRecord;

/** One trial line as bytes, with its leaf hash, both made in a worker. */
final class Line {

    private final byte[] bytes;
    private final byte[] leafHash;

    Line(TrialRecord record, StrategyChoice choice, List<String> functions) {
        this(CanonicalJson.bytes(TrialLine.write(record, choice, functions)));
    }

    /** Takes a line as it was written. */
    Line(byte[] bytes) {
        this.bytes = bytes.clone();
        this.leafHash = MerkleTree.leaf(bytes);
    }

    byte[] bytes() {
        return bytes;
    }

    byte[] leafHash() {
        return leafHash;
    }
}
