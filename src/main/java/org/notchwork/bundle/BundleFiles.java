package org.notchwork.bundle;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The files of a directory that may be a bundle, listed without believing anything: no links, no devices, plain
 * names, two levels, bounded sizes. Nothing is opened that was not listed so.
 */
final class BundleFiles {

    private final Path root;
    private final Map<String, Long> sizes;

    private BundleFiles(Path root, Map<String, Long> sizes) {
        this.root = root;
        this.sizes = sizes;
    }

    /** Lists a directory. */
    static BundleFiles list(Path root, Limits limits) throws BundleFault, IOException {
        if (!Files.exists(root, LinkOption.NOFOLLOW_LINKS)) {
            throw new BundleFault(BundleFault.Reason.MISSING, root.toString(), "there is nothing here");
        }
        if (!Files.isDirectory(root)) {
            throw new BundleFault(
                    BundleFault.Reason.NOT_A_BUNDLE, root.toString(), "this is not a bundle" + Likeness.of(root));
        }
        Map<String, Long> sizes = new TreeMap<>();
        list(root, "", sizes, limits);
        FileNames.requireDistinct(sizes.keySet());
        long total = sizes.values().stream().mapToLong(Long::longValue).sum();
        if (total > limits.totalBytes()) {
            throw new BundleFault(
                    BundleFault.Reason.LIMIT,
                    root.toString(),
                    total + " bytes, above the limit " + limits.totalBytes());
        }
        return new BundleFiles(root, sizes);
    }

    private static void list(Path folder, String prefix, Map<String, Long> sizes, Limits limits)
            throws BundleFault, IOException {
        for (Path entry : entries(folder, limits)) {
            String name = entry.getFileName().toString();
            BasicFileAttributes attributes =
                    Files.readAttributes(entry, BasicFileAttributes.class, LinkOption.NOFOLLOW_LINKS);
            if (attributes.isDirectory() && prefix.isEmpty() && name.equals("data")) {
                list(entry, Layout.DATA, sizes, limits);
                continue;
            }
            String path = prefix + name;
            FileNames.require(name, path);
            if (!attributes.isRegularFile()) {
                throw new BundleFault(
                        BundleFault.Reason.SPECIAL_FILE, path, "not a plain file; links and folders are not allowed");
            }
            if (attributes.size() > limits.fileBytes()) {
                throw new BundleFault(
                        BundleFault.Reason.LIMIT,
                        path,
                        attributes.size() + " bytes, above the limit " + limits.fileBytes());
            }
            sizes.put(path, attributes.size());
            if (sizes.size() > limits.files()) {
                throw new BundleFault(BundleFault.Reason.LIMIT, path, "more than " + limits.files() + " files");
            }
        }
    }

    /** Lists a folder sorted, so that the first fault is the same on every system; gives up above the limit. */
    private static List<Path> entries(Path folder, Limits limits) throws BundleFault, IOException {
        List<Path> entries = new ArrayList<>();
        try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder)) {
            for (Path entry : stream) {
                entries.add(entry);
                if (entries.size() > limits.files() + 1) {
                    throw new BundleFault(
                            BundleFault.Reason.LIMIT, folder.toString(), "more than " + limits.files() + " files");
                }
            }
        } catch (DirectoryIteratorException e) {
            throw e.getCause();
        }
        entries.sort(Comparator.comparing(entry -> entry.getFileName().toString()));
        return entries;
    }

    /** Returns each file's path below the bundle and its size in bytes, sorted. */
    Map<String, Long> sizes() {
        return sizes;
    }

    /** Returns whether the file is there. */
    boolean has(String path) {
        return sizes.containsKey(path);
    }

    /** Opens a listed file; a link that took its place since is not followed. */
    InputStream open(String path) throws IOException {
        if (!has(path)) {
            throw new IllegalArgumentException("not listed: " + path);
        }
        return Files.newInputStream(root.resolve(path), LinkOption.NOFOLLOW_LINKS);
    }

    /** Reads a listed small file. */
    byte[] read(String path, int limit) throws BundleFault, IOException {
        try (InputStream in = open(path)) {
            byte[] bytes = in.readNBytes(limit + 1);
            if (bytes.length > limit) {
                throw new BundleFault(BundleFault.Reason.LIMIT, path, "more than " + limit + " bytes");
            }
            return bytes;
        }
    }
}
