package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import org.notchwork.problem.Attachment;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;

/** Which files a bundle has and what they are called. */
public final class Layout {

    /** The payload folder. */
    public static final String DATA = "data/";

    /** The bag declaration of RFC 8493. */
    public static final String BAGIT = "bagit.txt";

    /** The bag's metadata. */
    public static final String BAG_INFO = "bag-info.txt";

    /** The digests of the payload. */
    public static final String MANIFEST = "manifest-sha256.txt";

    /** The digests of the three files above. */
    public static final String TAG_MANIFEST = "tagmanifest-sha256.txt";

    /** What this is and how to check it. */
    public static final String README = "README.txt";

    /** The study as run. */
    public static final String STUDY = "study.json";

    /** The figures. */
    public static final String SUMMARY = "summary.json";

    /** The cross-checks. */
    public static final String CROSS_CHECKS = "cross-checks.json";

    /** The claims. */
    public static final String CLAIMS = "claims.json";

    /** The seal. */
    public static final String SEAL = "seal.json";

    /** Where and when the study ran. */
    public static final String ENVIRONMENT = "environment.json";

    /** The report. */
    public static final String REPORT = "report.pdf";

    /** The schemas of all files. */
    public static final String SCHEMAS = "schemas.json";

    private Layout() {}

    /** Returns the name of the file of an experiment's trials. */
    public static String trials(String experiment) {
        return "trials-" + experiment + ".jsonl";
    }

    /** Returns the name of the file of an experiment's controls. */
    public static String controls(String experiment) {
        return "controls-" + experiment + ".jsonl";
    }

    /** Returns the name under which a file that the study names stands in the bundle. */
    public static String attachment(String name) {
        return "table-" + name;
    }

    /** Returns the files that a study names. */
    public static List<Attachment> attachments(Study study) {
        return study.experiments().stream()
                .flatMap(e -> e.problem().attachments().stream())
                .toList();
    }

    /** Returns the names of the files under the seal, in the order of the seal. */
    public static List<String> sealed(Study study) {
        List<String> names = new ArrayList<>(List.of(CLAIMS, CROSS_CHECKS, STUDY, SUMMARY));
        for (Experiment experiment : study.experiments()) {
            names.add(trials(experiment.id()));
            if (study.hasControls(experiment)) {
                names.add(controls(experiment.id()));
            }
        }
        attachments(study).forEach(a -> names.add(attachment(a.name())));
        return names.stream().distinct().sorted().toList();
    }

    /** Returns the names of all payload files, sorted. */
    public static List<String> payload(Study study) {
        List<String> names = new ArrayList<>(sealed(study));
        names.addAll(List.of(README, SEAL, ENVIRONMENT, REPORT, SCHEMAS));
        return names.stream().sorted().toList();
    }
}
