package org.notchwork.bundle;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonValue;
import org.notchwork.json.Printable;
import org.notchwork.problem.Attachment;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.study.StudyJson;

/**
 * Writes a bundle into a hidden folder beside its final place; the folder gets the final name when it is complete, so
 * a bundle that exists is whole. Trial lines come first, in the order of the study. Not for use by several threads.
 */
public final class BundleWriter implements AutoCloseable {

    private static final int BUFFER = 1 << 16;

    private final Study study;
    private final Staging staging;
    private final Map<String, String> digests = new TreeMap<>();
    private final Map<String, Long> sizes = new TreeMap<>();
    private final MerkleTree tree = new MerkleTree();
    private LineFile open;
    private LineFile openControls;

    private BundleWriter(Study study, Staging staging) {
        this.study = study;
        this.staging = staging;
    }

    /** Makes the report, which prints the seal. */
    @FunctionalInterface
    public interface ReportMaker {

        /** Returns the bytes of the PDF. */
        byte[] report(String seal);
    }

    /**
     * Begins a bundle.
     *
     * @param study the study
     * @param target where the bundle will be
     * @param replace whether a bundle that is there already may be replaced
     * @throws IOException if the target is taken, is being written by another run, or cannot be written
     */
    public static BundleWriter begin(Study study, Path target, boolean replace) throws IOException {
        Staging staging = Staging.begin(target, replace);
        try {
            Files.createDirectory(staging.folder().resolve("data"));
            return new BundleWriter(study, staging);
        } catch (IOException e) {
            staging.close();
            throw e;
        }
    }

    /**
     * Adds one trial line.
     *
     * @param experiment the id of its experiment; experiments come one after another
     * @param line the canonical line, without a line feed
     * @param leafHash its leaf hash in the tree
     */
    public void add(String experiment, byte[] line, byte[] leafHash) throws IOException {
        if (open == null || !open.experiment.equals(experiment)) {
            open = next(open, experiment, Layout.trials(experiment));
        }
        open.add(line);
        tree.addLeaf(leafHash);
    }

    /**
     * Adds one line of controls.
     *
     * @param experiment the id of its experiment; experiments come one after another
     * @param line the canonical line, without a line feed
     */
    public void addControl(String experiment, byte[] line) throws IOException {
        if (openControls == null || !openControls.experiment.equals(experiment)) {
            openControls = next(openControls, experiment, Layout.controls(experiment));
        }
        openControls.add(line);
    }

    private LineFile next(LineFile last, String experiment, String name) throws IOException {
        close(last);
        return new LineFile(experiment, name, staging.folder());
    }

    /**
     * Writes everything else, seals, and gives the bundle its name.
     *
     * @return the seal
     */
    public String finish(Results results, Environment environment, ReportMaker report) throws IOException {
        close(open);
        open = null;
        close(openControls);
        openControls = null;
        for (Experiment experiment : study.experiments()) {
            if (!digests.containsKey(Layout.DATA + Layout.trials(experiment.id()))) {
                throw new IllegalStateException("no trials of experiment " + experiment.id());
            }
        }
        Set<String> attached = new TreeSet<>();
        for (Attachment attachment : Layout.attachments(study)) {
            if (attached.add(attachment.name())) {
                write(Layout.DATA + Layout.attachment(attachment.name()), attachment.bytes());
            }
        }
        write(Layout.STUDY, StudyJson.write(study));
        write(Layout.SUMMARY, SummaryFile.write(results.summary(), results.checks()));
        write(Layout.CROSS_CHECKS, CrossChecksFile.write(results.checks()));
        write(Layout.CLAIMS, ClaimsFile.write(results.claims()));
        Map<String, String> sealed = new TreeMap<>();
        Layout.sealed(study).forEach(name -> sealed.put(name, digests.get(Layout.DATA + name)));
        Seal seal = new Seal(sealed, tree.size(), Digests.text(tree.root()));
        write(Layout.SEAL, seal.write());
        write(Layout.ENVIRONMENT, EnvironmentFile.write(environment));
        write(Layout.SCHEMAS, Schemas.document());
        write(Layout.DATA + Layout.README, ReadMe.text(results).getBytes(StandardCharsets.UTF_8));
        write(Layout.DATA + Layout.REPORT, report.report(seal.digest()));
        tags(environment);
        staging.complete();
        return seal.digest();
    }

    /** Removes what was written, unless the bundle is finished. */
    @Override
    public void close() throws IOException {
        try (staging) {
            if (open != null) {
                open.out.close();
                open = null;
            }
            if (openControls != null) {
                openControls.out.close();
                openControls = null;
            }
        }
    }

    private void tags(Environment environment) throws IOException {
        Map<String, String> payload = new TreeMap<>(digests);
        write(Layout.BAGIT, Bag.DECLARATION.getBytes(StandardCharsets.UTF_8));
        String info = "Bag-Software-Agent: " + environment.program() + "\n"
                + "Bagging-Date: " + environment.finished().substring(0, 10) + "\n"
                + "External-Description: " + Printable.escape(study.title()) + "\n"
                + "Payload-Oxum: " + PayloadOxum.of(sizes) + "\n";
        write(Layout.BAG_INFO, info.getBytes(StandardCharsets.UTF_8));
        write(Layout.MANIFEST, Manifest.write(payload).getBytes(StandardCharsets.UTF_8));
        Map<String, String> tags = new TreeMap<>(digests);
        tags.keySet().removeIf(path -> path.startsWith(Layout.DATA));
        write(Layout.TAG_MANIFEST, Manifest.write(tags).getBytes(StandardCharsets.UTF_8));
    }

    private void write(String name, JsonValue json) throws IOException {
        write(Layout.DATA + name, CanonicalJson.bytes(json));
    }

    private void write(String path, byte[] bytes) throws IOException {
        Path file = staging.folder().resolve(path);
        Files.write(file, bytes, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
        Staging.force(file);
        digests.put(path, Digests.hex(bytes));
        sizes.put(path, (long) bytes.length);
    }

    private void close(LineFile done) throws IOException {
        if (done == null) {
            return;
        }
        done.out.close();
        Staging.force(done.file);
        digests.put(done.path, Digests.text(done.digest.digest()));
        sizes.put(done.path, done.size);
    }

    /** A file of lines that is being written. */
    private static final class LineFile {

        private final String experiment;
        private final String path;
        private final Path file;
        private final MessageDigest digest = Digests.sha256();
        private final OutputStream out;
        private long size;

        LineFile(String experiment, String name, Path folder) throws IOException {
            this.experiment = experiment;
            this.path = Layout.DATA + name;
            this.file = folder.resolve(path);
            if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
                throw new IllegalStateException("the lines of experiment " + experiment + " do not come together");
            }
            OutputStream plain = Files.newOutputStream(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
            this.out = new BufferedOutputStream(new DigestOutputStream(plain, digest), BUFFER);
        }

        void add(byte[] line) throws IOException {
            out.write(line);
            out.write('\n');
            size += line.length + 1L;
        }
    }
}
