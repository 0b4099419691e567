package org.notchwork.verify;

import java.util.List;
import java.util.OptionalLong;
import org.notchwork.bundle.CrossChecksFile;
import org.notchwork.bundle.Layout;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;

/** Compares written cross-checks with recomputed ones, in order; differences are named by their place in the file. */
final class CheckComparison {

    private static final String FILE = Layout.DATA + Layout.CROSS_CHECKS;

    private CheckComparison() {}

    /**
     * Compares some of a file's checks.
     *
     * @param findings where differences are noted
     * @param all all checks of the file
     * @param written those of them that were recomputed, in order
     * @param recomputed what they should be
     */
    static void compare(
            Findings findings, List<CrossCheck> all, List<CrossCheck> written, List<CrossCheck> recomputed) {
        if (written.size() != recomputed.size()) {
            findings.add(new Finding(
                    FILE,
                    OptionalLong.empty(),
                    "/checks",
                    written.size() + " checks of these kinds",
                    recomputed.size() + " checks"));
            return;
        }
        for (int i = 0; i < written.size(); i++) {
            String pointer = "/checks/" + all.indexOf(written.get(i));
            new JsonDifference((below, found, right) ->
                            findings.add(new Finding(FILE, OptionalLong.empty(), pointer + below, found, right)))
                    .compare(CrossChecksFile.write(written.get(i)), CrossChecksFile.write(recomputed.get(i)));
        }
    }

    /**
     * Compares which checks on instances are written with those that the study calls for; not what they found.
     *
     * @param findings where differences are noted
     * @param all all checks of the file
     * @param called those on instances that the study calls for, in order
     */
    static void names(Findings findings, List<CrossCheck> all, List<CrossChecker.Called> called) {
        List<CrossCheck> written =
                all.stream().filter(c -> c.kind().needsInstances()).toList();
        int longer = Math.max(written.size(), called.size());
        for (int i = 0; i < longer; i++) {
            String found = i < written.size()
                    ? name(new CrossChecker.Called(
                            written.get(i).kind(), written.get(i).subject()))
                    : "(nothing)";
            String right = i < called.size() ? name(called.get(i)) : "(nothing)";
            if (!found.equals(right)) {
                String pointer = i < written.size() ? "/checks/" + all.indexOf(written.get(i)) : "/checks";
                findings.add(new Finding(FILE, OptionalLong.empty(), pointer, found, right));
                return;
            }
        }
    }

    private static String name(CrossChecker.Called called) {
        return called.kind().word() + " of " + called.subject();
    }
}
