package org.notchwork.verify;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.notchwork.Studies;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.Limits;
import org.notchwork.bundle.MerkleTree;
import org.notchwork.bundle.Seal;
import org.notchwork.json.CanonicalJson;
import org.notchwork.run.StudyRun;
import org.notchwork.seed.Seed;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;

/** Makes real bundles of small studies, and changes them as an accident or a careful forger would. */
public final class BundleFixture {

    private static final Environment ENVIRONMENT = new Environment(
            "notchwork test",
            "2026-01-02T03:04:05Z",
            "2026-01-02T03:04:06Z",
            1,
            1,
            "Java of a test",
            "System of a test");

    private BundleFixture() {}

    /** Runs the small study into a folder. */
    public static Path make(Path folder) throws IOException, InterruptedException {
        return make(Studies.small(), folder);
    }

    /** Runs a study into a folder. */
    public static Path make(Study study, Path folder) throws IOException, InterruptedException {
        new StudyRun(study, 2).seal(folder, false, (experiment, width) -> {}, () -> ENVIRONMENT);
        return folder;
    }

    /** Copies a bundle. */
    public static Path copy(Path bundle, Path to) throws IOException {
        Files.walkFileTree(bundle, new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes) throws IOException {
                Files.createDirectories(to.resolve(bundle.relativize(folder).toString()));
                return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
                Files.copy(file, to.resolve(bundle.relativize(file).toString()));
                return FileVisitResult.CONTINUE;
            }
        });
        return to;
    }

    /** Changes the text of a payload file. */
    public static void edit(Path bundle, String name, UnaryOperator<String> change) throws IOException {
        Path file = bundle.resolve("data").resolve(name);
        String before = Files.readString(file, StandardCharsets.UTF_8);
        String after = change.apply(before);
        if (before.equals(after)) {
            throw new IllegalStateException("the change to " + name + " changed nothing");
        }
        Files.writeString(file, after, StandardCharsets.UTF_8);
    }

    /** Changes the lines of a file of trials. */
    public static void editLines(Path bundle, String name, UnaryOperator<List<String>> change) throws IOException {
        edit(bundle, name, text -> {
            List<String> lines = new ArrayList<>(text.lines().toList());
            return String.join("\n", change.apply(lines)) + "\n";
        });
    }

    /** Makes seal and manifests anew over what is there now, as a forger would who knows the format. */
    public static String reseal(Path bundle, Study study) throws IOException {
        Path data = bundle.resolve("data");
        Map<String, String> files = new TreeMap<>();
        for (String name : Layout.sealed(study)) {
            files.put(name, Digests.hex(Files.readAllBytes(data.resolve(name))));
        }
        MerkleTree tree = new MerkleTree();
        for (Experiment experiment : study.experiments()) {
            for (String line :
                    Files.readAllLines(data.resolve(Layout.trials(experiment.id())), StandardCharsets.UTF_8)) {
                tree.add(line.getBytes(StandardCharsets.UTF_8));
            }
        }
        Seal seal = new Seal(files, tree.size(), Digests.text(tree.root()));
        Files.write(data.resolve(Layout.SEAL), CanonicalJson.bytes(seal.write()));
        manifests(bundle);
        return seal.digest();
    }

    /** Makes the manifests and the payload's size anew. */
    public static void manifests(Path bundle) throws IOException {
        long bytes = 0;
        StringBuilder payload = new StringBuilder();
        List<Path> files;
        try (Stream<Path> list = Files.list(bundle.resolve("data"))) {
            files = list.sorted().toList();
        }
        for (Path file : files) {
            bytes += Files.size(file);
            payload.append(Digests.hex(Files.readAllBytes(file)))
                    .append("  data/")
                    .append(file.getFileName())
                    .append('\n');
        }
        Files.writeString(bundle.resolve(Layout.MANIFEST), payload.toString());
        Path info = bundle.resolve(Layout.BAG_INFO);
        Files.writeString(
                info,
                Files.readString(info).replaceAll("Payload-Oxum: .*", "Payload-Oxum: " + bytes + "." + files.size()));
        StringBuilder tags = new StringBuilder();
        for (String name : List.of(Layout.BAG_INFO, Layout.BAGIT, Layout.MANIFEST)) {
            tags.append(Digests.hex(Files.readAllBytes(bundle.resolve(name))))
                    .append("  ")
                    .append(name)
                    .append('\n');
        }
        Files.writeString(bundle.resolve(Layout.TAG_MANIFEST), tags.toString());
    }

    /** Verifies without a re-run. */
    public static Verdict verify(Path bundle) throws IOException, InterruptedException {
        return verify(bundle, new Rerun.None());
    }

    /** Verifies with a re-run. */
    public static Verdict verify(Path bundle, Rerun rerun) throws IOException, InterruptedException {
        return verify(bundle, rerun, Optional.empty());
    }

    /** Verifies with a re-run and an expected seal. */
    public static Verdict verify(Path bundle, Rerun rerun, Optional<String> expect)
            throws IOException, InterruptedException {
        VerifyOptions options = new VerifyOptions(expect, rerun, new Seed("the seed of a referee"), 2, Limits.USUAL);
        return Verifier.verify(bundle, options, (stage, done, all) -> {});
    }
}
