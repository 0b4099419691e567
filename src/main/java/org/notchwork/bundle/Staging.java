package org.notchwork.bundle;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.Arrays;

/**
 * A hidden folder beside a final place, and the step that gives it the final name.
 *
 * <p>A lock file beside it, held for as long as the folder is being filled, keeps a second run away; the lock ends
 * with the process, however that ends. What an earlier run left behind is removed when the next one begins.
 */
final class Staging implements AutoCloseable {

    /** Beyond what the file holds: some systems keep others from reading a locked byte. */
    private static final long LOCKED_BYTE = 1 << 20;

    private final Path target;
    private final boolean replace;
    private final Path folder;
    private final Path old;
    private final Path lockFile;
    private final FileChannel channel;
    private boolean complete;

    private Staging(Path target, boolean replace, Path lockFile, FileChannel channel) {
        this.target = target;
        this.replace = replace;
        this.lockFile = lockFile;
        this.channel = channel;
        this.folder = hidden(target, "partial");
        this.old = hidden(target, "replaced");
    }

    /** Begins to fill a folder for a target. */
    static Staging begin(Path target, boolean replace) throws IOException {
        Path place = target.toAbsolutePath().normalize();
        if (place.getFileName() == null) {
            throw new IOException(target + ": this is no place for a bundle; name a new folder");
        }
        requireFree(place, replace);
        Path lockFile = hidden(place, "lock");
        FileChannel channel;
        try {
            Files.createDirectories(place.getParent());
            channel = locked(lockFile, target);
        } catch (FileSystemException e) {
            throw new IOException(target + ": cannot be written; name a folder where you may write", e);
        }
        try {
            Staging staging = new Staging(place, replace, lockFile, channel);
            staging.recover();
            requireFree(place, replace);
            delete(staging.folder);
            Files.createDirectory(staging.folder);
            return staging;
        } catch (IOException | RuntimeException e) {
            Files.deleteIfExists(lockFile);
            channel.close();
            throw e;
        }
    }

    /** Takes the lock; the process keeps it until the channel is closed. */
    private static FileChannel locked(Path lockFile, Path target) throws IOException {
        FileChannel channel = FileChannel.open(
                lockFile, StandardOpenOption.CREATE, StandardOpenOption.WRITE, LinkOption.NOFOLLOW_LINKS);
        try {
            FileLock lock = channel.tryLock(LOCKED_BYTE, 1, false);
            if (lock == null || !isStillNamed(lockFile, channel)) {
                throw new IOException(target + ": another run is writing here; wait for it or name another folder");
            }
            return channel;
        } catch (OverlappingFileLockException e) {
            channel.close();
            throw new IOException(target + ": this run is writing here already", e);
        } catch (IOException e) {
            channel.close();
            throw e;
        }
    }

    /**
     * Returns whether the locked file is the one that the name leads to. A run that ends removes its lock file, so
     * another may hold the lock of a file without a name while a third creates a new one.
     */
    private static boolean isStillNamed(Path lockFile, FileChannel channel) throws IOException {
        String holder =
                ProcessHandle.current().pid() + "/" + Thread.currentThread().getId();
        byte[] token = holder.getBytes(StandardCharsets.US_ASCII);
        channel.truncate(0);
        channel.write(ByteBuffer.wrap(token), 0);
        return Files.isRegularFile(lockFile, LinkOption.NOFOLLOW_LINKS)
                && Arrays.equals(token, Files.readAllBytes(lockFile));
    }

    /** Brings back a bundle that a run moved aside before it died, or removes it if the new one has its name. */
    private void recover() throws IOException {
        if (Files.exists(old, LinkOption.NOFOLLOW_LINKS) && !Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            Files.move(old, target, StandardCopyOption.ATOMIC_MOVE);
        }
        delete(old);
    }

    /** Returns the folder to fill. */
    Path folder() {
        return folder;
    }

    /** Gives the folder its final name; what stood there before is moved aside first and removed last. */
    void complete() throws IOException {
        requireFree(target, replace);
        force(folder.resolve("data"));
        force(folder);
        if (Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            Files.move(target, old, StandardCopyOption.ATOMIC_MOVE);
        }
        try {
            Files.move(folder, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException e) {
            recover();
            throw e;
        }
        complete = true;
        force(target.getParent());
        delete(old);
    }

    /** Removes the folder unless it is complete, and lets others write here. */
    @Override
    public void close() throws IOException {
        try {
            if (!complete) {
                delete(folder);
            }
        } finally {
            Files.deleteIfExists(lockFile);
            channel.close();
        }
    }

    /** Makes sure that a file or folder is on the disk, where the system can tell. */
    static void force(Path path) throws IOException {
        try (FileChannel file = FileChannel.open(path, StandardOpenOption.READ)) {
            file.force(true);
        } catch (IOException e) {
            if (!Files.isDirectory(path)) {
                throw e;
            }
            // Some systems cannot open a folder; its entries are then as safe as that system makes them.
        }
    }

    private static void requireFree(Path target, boolean replace) throws IOException {
        if (!Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        if (!replace) {
            throw new IOException(target + ": already there; name another folder or say --replace");
        }
        if (!Files.isRegularFile(target.resolve(Layout.BAGIT), LinkOption.NOFOLLOW_LINKS)) {
            throw new IOException(target + ": not a bundle, so it is not replaced; name another folder");
        }
    }

    private static Path hidden(Path target, String what) {
        return target.resolveSibling("." + target.getFileName() + "." + what);
    }

    private static void delete(Path path) throws IOException {
        if (!Files.exists(path, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        Files.walkFileTree(path, new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
                Files.delete(file);
                return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult postVisitDirectory(Path directory, IOException fault) throws IOException {
                if (fault != null) {
                    throw fault;
                }
                Files.delete(directory);
                return FileVisitResult.CONTINUE;
            }
        });
    }
}
