package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.stream.Stream;

/**
 * A folder for the framework's cache that belongs to one process at a time and to one set of bundles.
 *
 * <p>A user has a fixed number of slots, each with a lock file that is never deleted (deleting a lock file while another
 * process waits for it would let two in). A slot remembers the set of bundles it was filled for; one that holds another
 * set is emptied under its lock before it is used, so that stale caches never pile up. When every slot is busy or locks
 * do not work on the drive, a temporary folder serves this one run.
 */
final class CacheSlot implements AutoCloseable {
    private static final int SLOTS = 8;

    private final Path folder;
    private final String key;
    private final FileChannel channel; // null for a temporary folder
    private final boolean filled;

    private CacheSlot(Path folder, String key, FileChannel channel, boolean filled) {
        this.folder = folder;
        this.key = key;
        this.channel = channel;
        this.filled = filled;
    }

    /**
     * Takes a slot.
     *
     * @param parent the folder of all slots; created when needed
     * @param key names the set of bundles
     */
    static CacheSlot take(Path parent, String key) throws IOException {
        try {
            Folders.create(parent);
            // Where to look first depends on the set, so that two products of one user do not push each other out.
            int first = Math.floorMod(key.hashCode(), SLOTS);
            for (int i = 0; i < SLOTS; i++) {
                CacheSlot slot = tryTake(parent, (first + i) % SLOTS, key, true);
                if (slot != null) {
                    return slot;
                }
            }
            for (int i = 0; i < SLOTS; i++) {
                CacheSlot slot = tryTake(parent, (first + i) % SLOTS, key, false);
                if (slot != null) {
                    return slot;
                }
            }
        } catch (IOException | OverlappingFileLockException e) {
            // A read-only or full home, a drive without locks: the run goes on, only more slowly.
        }
        return temporary(key);
    }

    /** A slot of this one run; deleted when it is closed. */
    static CacheSlot temporary(String key) throws IOException {
        return new CacheSlot(Files.createTempDirectory("saddlebook-"), key, null, false);
    }

    /**
     * Takes one slot when it is free and, with {@code onlyMatching}, filled for this key or not filled at all.
     *
     * @return null when not
     */
    private static CacheSlot tryTake(Path parent, int number, String key, boolean onlyMatching) throws IOException {
        Path folder = parent.resolve(Integer.toString(number));
        FileChannel channel =
                FileChannel.open(parent.resolve(number + ".lock"), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        boolean taken = false;
        try {
            FileLock lock = channel.tryLock();
            if (lock == null) {
                return null;
            }
            Path keyFile = folder.resolve("key");
            String present = Files.exists(keyFile) ? Files.readString(keyFile) : "";
            boolean matches = present.equals(key);
            if (onlyMatching && !matches && !present.isEmpty()) {
                return null;
            }
            if (!matches) {
                delete(folder);
                Folders.create(folder);
            }
            taken = true;
            return new CacheSlot(folder, key, channel, matches);
        } finally {
            if (!taken) {
                channel.close();
            }
        }
    }

    /** The framework's storage. */
    Path storage() {
        return folder.resolve("framework");
    }

    /** A file of the launcher's own beside the storage. */
    Path file(String name) {
        return folder.resolve(name);
    }

    /** Whether an earlier run filled it completely for this set of bundles. */
    boolean filled() {
        return filled;
    }

    /** Notes that it is completely filled; until then a run that was killed leaves nothing anybody would trust. */
    void markFilled() throws IOException {
        if (channel != null && !filled) {
            Files.writeString(folder.resolve("key"), key);
        }
    }

    /** Forgets the content: the next run fills it anew. */
    void spoil() throws IOException {
        Files.deleteIfExists(folder.resolve("key"));
    }

    @Override
    public void close() throws IOException {
        if (channel == null) {
            delete(folder);
        } else {
            channel.close();
        }
    }

    /** Deletes a folder with everything in it; nothing happens when it is not there. */
    static void delete(Path folder) throws IOException {
        if (!Files.exists(folder)) {
            return;
        }
        try (Stream<Path> walk = Files.walk(folder)) {
            walk.sorted((a, b) -> b.compareTo(a)).forEach(path -> {
                try {
                    Files.delete(path);
                } catch (IOException e) {
                    throw new UncheckedIOException(e);
                }
            });
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
    }
}
