package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermission;
import java.util.EnumSet;
import java.util.Locale;
import java.util.Set;
import org.saddlebook.register.api.RegisterException;

/** Where a register may lie, and how its file is made so that everyone who shares the folder can write to it. */
final class Place {
    private static final int SET_GROUP_ID = 02000;

    /** Types of file stores as Linux, macOS and Windows name them, whose locks cannot be relied on between machines. */
    private static final Set<String> NETWORK = Set.of(
            "nfs",
            "nfs3",
            "nfs4",
            "cifs",
            "smb",
            "smb2",
            "smb3",
            "smbfs",
            "9p",
            "afs",
            "afpfs",
            "ncpfs",
            "ncp",
            "webdav",
            "davfs",
            "davfs2",
            "ceph",
            "glusterfs",
            "lustre",
            "gpfs",
            "beegfs",
            "sshfs",
            "rclone",
            "s3fs",
            "vboxsf",
            "vmhgfs",
            "vmhgfs-fuse",
            "prl_fs");

    /** Names the type of the file store a folder is on. */
    @FunctionalInterface
    interface StoreType {
        String of(Path existing) throws IOException;
    }

    private final StoreType types;

    Place(StoreType types) {
        this.types = types;
    }

    static Place ofThisMachine() {
        return new Place(existing -> Files.getFileStore(existing).type());
    }

    /** Refuses network drives: SQLite's locks do not hold there, and two writers destroy the register. */
    void check(Path file) throws RegisterException {
        if (file.toString().startsWith("\\\\")) {
            throw network(file, "a Windows network share");
        }
        Path existing = file;
        while (existing != null && !Files.exists(existing)) {
            existing = existing.getParent();
        }
        if (existing == null) {
            throw new RegisterException("No part of the path " + file + " exists. Choose another with --register.");
        }
        String type;
        try {
            type = types.of(existing.toRealPath()).toLowerCase(Locale.ROOT);
        } catch (IOException e) {
            throw new RegisterException(
                    "Cannot tell what kind of drive " + existing + " is on: " + Failures.reason(e) + ".", e);
        }
        String plain = type.startsWith("fuse.") ? type.substring(5) : type;
        if (NETWORK.contains(plain)) {
            throw network(file, "a network drive (" + type + ")");
        }
    }

    private static RegisterException network(Path file, String what) {
        return new RegisterException("The register " + file + " would lie on " + what
                + ", where file locks do not protect it from two writers. Keep it on a local disk of one machine, or"
                + " in a PostgreSQL database when several machines share it.");
    }

    /**
     * Makes the folders and an empty file where there is none. In a folder that a group shares (group-writable with the
     * set-group-ID bit) the file is group-writable whatever the umask: SQLite gives its journal the file's mode, so the
     * mode of this one file decides whether the second user can write.
     */
    void make(Path file) throws IOException {
        Path folder = file.getParent();
        Files.createDirectories(folder);
        if (Files.isDirectory(file)) {
            throw new RegisterException("The register " + file + " is a folder; name a file.");
        }
        if (Files.exists(file)) {
            return;
        }
        try {
            Files.createFile(file);
        } catch (FileAlreadyExistsException e) {
            return; // another process was first, and gives it its mode
        }
        if (FileSystems.getDefault().supportedFileAttributeViews().contains("unix")) {
            share(file, folder);
        }
    }

    private static void share(Path file, Path folder) throws IOException {
        Set<PosixFilePermission> of = Files.getPosixFilePermissions(folder);
        int mode = (Integer) Files.getAttribute(folder, "unix:mode");
        if ((mode & SET_GROUP_ID) != 0 && of.contains(PosixFilePermission.GROUP_WRITE)) {
            Set<PosixFilePermission> shared = EnumSet.copyOf(Files.getPosixFilePermissions(file));
            shared.add(PosixFilePermission.GROUP_READ);
            shared.add(PosixFilePermission.GROUP_WRITE);
            Files.setPosixFilePermissions(file, shared);
        }
    }
}
