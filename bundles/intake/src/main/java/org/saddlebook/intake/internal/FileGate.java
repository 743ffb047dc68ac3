package org.saddlebook.intake.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/** Reads whole files, and only files: of bounded size, present, readable, no device and no pipe. */
final class FileGate {
    /** The largest file that is read, 64 MiB. */
    static final long LIMIT = 64L << 20;

    private FileGate() {}

    /**
     * The bytes of a file.
     *
     * @param path where
     * @param name name for messages
     * @throws InputException with code {@code missing-file}, {@code not-a-file}, {@code too-large} or {@code
     *     unreadable-file}
     */
    static byte[] read(Path path, String name) throws InputException {
        try {
            BasicFileAttributes attributes = Files.readAttributes(path, BasicFileAttributes.class);
            if (!attributes.isRegularFile()) {
                throw notAFile(name, attributes);
            }
            if (attributes.size() > LIMIT) {
                throw tooLarge(name, attributes.size() + " bytes");
            }
            try (InputStream in = Files.newInputStream(path)) {
                // A file can grow between the two looks at it.
                byte[] bytes = in.readNBytes((int) LIMIT + 1);
                if (bytes.length > LIMIT) {
                    throw tooLarge(name, "more than " + LIMIT + " bytes");
                }
                return bytes;
            }
        } catch (IOException e) {
            throw unreadable(name, e);
        }
    }

    private static InputException notAFile(String name, BasicFileAttributes attributes) {
        return problem(
                "not-a-file",
                name,
                attributes.isDirectory() ? "a folder" : "a device, pipe or socket",
                "a file",
                "Copy the data into a file and name that.");
    }

    private static InputException tooLarge(String name, String found) {
        return problem(
                "too-large",
                name,
                found,
                "a file of at most " + LIMIT + " bytes (64 MiB)",
                "Check that this is the file you meant; cut it down to the table that is needed.");
    }

    /** Why a file could not be read, without the words of the machine. */
    static InputException unreadable(String name, IOException e) {
        if (e instanceof NoSuchFileException) {
            return problem("missing-file", name, "no such file", "a file or folder", "Check the name and the folder.");
        }
        return problem(
                "unreadable-file",
                name,
                "a file that cannot be read: " + reason(e),
                "a file you may read",
                e instanceof AccessDeniedException
                        ? "Ask for the right to read it, or take a copy you may read."
                        : "Check the disk or take another copy of the file.");
    }

    /** The reason of a failure in a few words. */
    static String reason(IOException e) {
        if (e instanceof AccessDeniedException) {
            return "access denied";
        }
        if (e instanceof FileSystemException system && system.getReason() != null) {
            return system.getReason();
        }
        return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
    }

    static InputException problem(String code, String file, String found, String expected, String remedy) {
        return new InputException(new Problem(code, Place.of(file), found, expected, remedy));
    }
}
