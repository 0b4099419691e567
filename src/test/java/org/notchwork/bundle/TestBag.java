package org.notchwork.bundle;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;

/** Files of a bag, made by hand and apart from the writer, to be spoiled one at a time. */
final class TestBag {

    private final Map<String, byte[]> files = new TreeMap<>();

    /** Makes a whole and right bag of two payload files. */
    TestBag() {
        put("data/one.txt", "one\n");
        put("data/two.txt", "two\n");
        put("bagit.txt", "BagIt-Version: 1.0\nTag-File-Character-Encoding: UTF-8\n");
        put("bag-info.txt", "Bagging-Date: 2026-03-01\nPayload-Oxum: 8.2\n");
        manifests();
    }

    TestBag put(String path, String text) {
        files.put(path, text.getBytes(StandardCharsets.UTF_8));
        return this;
    }

    TestBag put(String path, byte[] bytes) {
        files.put(path, bytes);
        return this;
    }

    TestBag remove(String path) {
        files.remove(path);
        return this;
    }

    String text(String path) {
        return new String(files.get(path), StandardCharsets.UTF_8);
    }

    /** Makes both manifests right again. */
    TestBag manifests() {
        put("manifest-sha256.txt", manifest(true));
        return tagManifest();
    }

    /** Makes the tag manifest right again. */
    TestBag tagManifest() {
        return put("tagmanifest-sha256.txt", manifest(false));
    }

    Path write(Path folder) throws IOException {
        for (Map.Entry<String, byte[]> file : files.entrySet()) {
            Path path = folder.resolve(file.getKey());
            Files.createDirectories(path.getParent());
            Files.write(path, file.getValue());
        }
        return folder;
    }

    private String manifest(boolean payload) {
        StringBuilder text = new StringBuilder();
        files.forEach((path, bytes) -> {
            if (path.startsWith("data/") == payload && !path.startsWith("tagmanifest-")) {
                text.append(sha256(bytes)).append("  ").append(path).append('\n');
            }
        });
        return text.toString();
    }

    static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
