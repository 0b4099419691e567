package org.notchwork.bundle;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * A directory that is a complete bag of RFC 8493 in this project's strict form: what is listed is there, what is there
 * is listed. Whether the digests are right is asked for by {@link #mismatches}.
 */
public final class Bag {

    /** The bag declaration, to the byte. */
    static final String DECLARATION = "BagIt-Version: 1.0\nTag-File-Character-Encoding: UTF-8\n";

    private static final int TAG_LIMIT = 1 << 20;
    private static final int BUFFER = 1 << 16;
    private static final List<String> TAGS =
            List.of(Layout.BAG_INFO, Layout.BAGIT, Layout.MANIFEST, Layout.TAG_MANIFEST);

    private final BundleFiles files;
    private final Map<String, String> listed;
    private final Map<String, String> found = new TreeMap<>();

    private Bag(BundleFiles files, Map<String, String> listed) {
        this.files = files;
        this.listed = listed;
    }

    /**
     * A file whose bytes do not have the digest that the manifest lists.
     *
     * @param path the file
     * @param listed the digest in the manifest
     * @param found the digest of the bytes
     */
    public record Mismatch(String path, String listed, String found) {

        /** Returns the manifest that lists the file. */
        public String manifest() {
            return path.startsWith(Layout.DATA) ? Layout.MANIFEST : Layout.TAG_MANIFEST;
        }
    }

    /** Opens a directory; throws unless it is a complete bag that is safe to read. */
    public static Bag open(Path directory, Limits limits) throws BundleFault, IOException {
        BundleFiles files = BundleFiles.list(directory, limits);
        requireDeclaration(files);
        requireTags(files);
        for (Map.Entry<String, Long> file : files.sizes().entrySet()) {
            if (file.getValue() == 0) {
                throw new BundleFault(BundleFault.Reason.EMPTY_FILE, file.getKey(), "the file is empty");
            }
        }
        Map<String, String> payload = Manifest.read(Layout.MANIFEST, files.read(Layout.MANIFEST, TAG_LIMIT), true);
        Map<String, String> tags =
                Manifest.read(Layout.TAG_MANIFEST, files.read(Layout.TAG_MANIFEST, TAG_LIMIT), false);
        requireComplete(files, payload, tags);
        BagInfo.require(files.read(Layout.BAG_INFO, TAG_LIMIT), PayloadOxum.of(files.sizes()));
        Map<String, String> listed = new TreeMap<>(payload);
        listed.putAll(tags);
        return new Bag(files, listed);
    }

    private static void requireDeclaration(BundleFiles files) throws BundleFault, IOException {
        if (files.has("fetch.txt")) {
            throw new BundleFault(
                    BundleFault.Reason.FETCH, "fetch.txt", "files to be fetched; a bundle holds all its files");
        }
        if (!files.has(Layout.BAGIT)) {
            throw new BundleFault(
                    BundleFault.Reason.NOT_A_BUNDLE, Layout.BAGIT, "missing, so this folder is not a bundle");
        }
        List<String> lines = TagText.lines(Layout.BAGIT, files.read(Layout.BAGIT, TAG_LIMIT));
        if (!lines.equals(DECLARATION.lines().toList())) {
            throw new BundleFault(
                    BundleFault.Reason.DECLARATION,
                    Layout.BAGIT,
                    "not the two lines that declare a bag of version 1.0 in UTF-8; other versions are not read");
        }
    }

    private static void requireTags(BundleFiles files) throws BundleFault {
        for (String path : files.sizes().keySet()) {
            boolean manifest = path.startsWith("manifest-") || path.startsWith("tagmanifest-");
            if (manifest && !TAGS.contains(path)) {
                throw new BundleFault(
                        BundleFault.Reason.ALGORITHM, path, "a manifest of another algorithm; only sha256 is used");
            }
            if (!path.startsWith(Layout.DATA) && !TAGS.contains(path)) {
                throw new BundleFault(BundleFault.Reason.NOT_LISTED, path, "no bundle has such a file");
            }
        }
        for (String tag : TAGS) {
            if (!files.has(tag)) {
                throw new BundleFault(
                        tag.equals(Layout.MANIFEST) ? BundleFault.Reason.ALGORITHM : BundleFault.Reason.LAYOUT,
                        tag,
                        "missing; every bundle has it");
            }
        }
    }

    private static void requireComplete(BundleFiles files, Map<String, String> payload, Map<String, String> tags)
            throws BundleFault {
        for (String path : payload.keySet()) {
            requireThere(files, path, Layout.MANIFEST);
        }
        for (String path : tags.keySet()) {
            requireThere(files, path, Layout.TAG_MANIFEST);
        }
        for (String path : files.sizes().keySet()) {
            boolean known = payload.containsKey(path) || tags.containsKey(path) || path.equals(Layout.TAG_MANIFEST);
            if (!known) {
                throw new BundleFault(BundleFault.Reason.NOT_LISTED, path, "no manifest lists this file");
            }
        }
        if (tags.containsKey(Layout.TAG_MANIFEST)) {
            throw new BundleFault(
                    BundleFault.Reason.MANIFEST_LINE, Layout.TAG_MANIFEST, "a tag manifest does not list itself");
        }
    }

    private static void requireThere(BundleFiles files, String path, String manifest) throws BundleFault {
        if (!files.has(path)) {
            throw new BundleFault(BundleFault.Reason.NOT_THERE, manifest, "lists " + path + ", which is not there");
        }
    }

    /** Returns the files and their sizes in bytes, by path. */
    public Map<String, Long> sizes() {
        return files.sizes();
    }

    /** Returns the digest that a manifest lists for a file. */
    public String listed(String path) {
        return listed.get(path);
    }

    /** Hashes all files and returns those whose bytes do not have the listed digest, in order of their paths. */
    public List<Mismatch> mismatches() throws IOException {
        List<Mismatch> mismatches = new ArrayList<>();
        for (Map.Entry<String, String> entry : listed.entrySet()) {
            String digest = digest(entry.getKey());
            found.put(entry.getKey(), digest);
            if (!digest.equals(entry.getValue())) {
                mismatches.add(new Mismatch(entry.getKey(), entry.getValue(), digest));
            }
        }
        return mismatches;
    }

    /** Returns the digest that {@link #mismatches} found a file to have. */
    public String found(String path) {
        String digest = found.get(path);
        if (digest == null) {
            throw new IllegalStateException(path + " was not hashed yet");
        }
        return digest;
    }

    /** Opens a file. */
    public InputStream open(String path) throws IOException {
        return files.open(path);
    }

    /**
     * Reads a small file, at most this many bytes.
     *
     * @throws BundleFault if there are more, or if they are not the bytes that {@link #mismatches} hashed before
     */
    public byte[] read(String path, int limit) throws BundleFault, IOException {
        byte[] bytes = files.read(path, limit);
        String hashed = found.get(path);
        if (hashed != null && !hashed.equals(Digests.hex(bytes))) {
            throw new BundleFault(
                    BundleFault.Reason.CHANGED, path, "changed while it was read; copy the bundle and check the copy");
        }
        return bytes;
    }

    private String digest(String path) throws IOException {
        MessageDigest digest = Digests.sha256();
        byte[] buffer = new byte[BUFFER];
        try (InputStream in = files.open(path)) {
            for (int n = in.read(buffer); n >= 0; n = in.read(buffer)) {
                digest.update(buffer, 0, n);
            }
        }
        return Digests.text(digest.digest());
    }
}
