package org.saddlebook.reader.sheet.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipInputStream;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/**
 * Looks through the archive that a spreadsheet is before anybody unpacks it into memory: how large it grows, where its
 * names point, and whether its XML declares document types, through which entities could reach out or multiply.
 */
final class ArchiveGate {
    /** A rate table has some kilobytes; the largest spreadsheets that people handle stay below this. */
    static final long LARGEST = 256L << 20;

    /** Well-packed sheets of repeated numbers reach about 50. */
    static final long LARGEST_RATIO = 200;

    static final int MOST_ENTRIES = 10_000;

    private static final int PIECE = 1 << 16;
    private static final byte[] DOCTYPE = "<!DOCTYPE".getBytes(StandardCharsets.US_ASCII);

    private final String file;
    private final long packed;
    private long unpacked;

    private ArchiveGate(String file, long packed) {
        this.file = file;
        this.packed = packed;
    }

    /**
     * Lets an archive pass.
     *
     * @throws InputException with the reason why not
     */
    static void check(String file, byte[] bytes, Task task) throws InputException, Cancelled {
        try (ZipInputStream archive = new ZipInputStream(new ByteArrayInputStream(bytes))) {
            new ArchiveGate(file, bytes.length).entries(archive, task);
        } catch (IOException | IllegalArgumentException e) {
            throw damaged(file, e);
        }
    }

    /** What is said of a file that cannot be unpacked or understood. */
    static InputException damaged(String file, Exception cause) {
        String message = cause.getMessage() == null ? "" : " (" + cause.getMessage() + ")";
        return refusal(
                file,
                "damaged-spreadsheet",
                "a damaged file, or one that is no spreadsheet" + message,
                "a spreadsheet in the format xlsx or ods",
                "open it in the program it comes from and save it again");
    }

    private void entries(ZipInputStream archive, Task task) throws IOException, InputException, Cancelled {
        byte[] piece = new byte[PIECE];
        int count = 0;
        for (ZipEntry entry = archive.getNextEntry(); entry != null; entry = archive.getNextEntry()) {
            task.check();
            refuseName(entry.getName());
            if (++count > MOST_ENTRIES) {
                throw bomb("more than " + MOST_ENTRIES + " files in it");
            }
            String name = entry.getName().toLowerCase(Locale.ROOT);
            content(archive, piece, name.endsWith(".xml") || name.endsWith(".rels"), entry.getName(), task);
        }
        if (count == 0) {
            throw new ZipException("no files in the archive");
        }
    }

    private void content(ZipInputStream archive, byte[] piece, boolean xml, String name, Task task)
            throws IOException, InputException, Cancelled {
        int matched = 0;
        for (int read = archive.read(piece); read >= 0; read = archive.read(piece)) {
            task.check();
            unpacked += read;
            if (unpacked > LARGEST) {
                throw bomb("more than " + (LARGEST >> 20) + " MiB when unpacked");
            }
            if (unpacked > (1 << 20) && unpacked > LARGEST_RATIO * packed) {
                throw bomb("content that unpacks to more than " + LARGEST_RATIO + " times its size");
            }
            for (int i = 0; xml && i < read; i++) {
                int b = piece[i];
                matched =
                        b == DOCTYPE[matched] ? matched + 1 : b == DOCTYPE[0] ? 1 : matched > 0 && b == 0 ? matched : 0;
                if (matched == DOCTYPE.length) {
                    throw refusal(
                            file,
                            "document-type",
                            "a document type in “" + name
                                    + "”, through which a file can reach out or grow without limit",
                            "a spreadsheet as programs save it, without document types",
                            "save the table again from a program you trust, or as delimited text (.csv)");
                }
            }
        }
    }

    private void refuseName(String name) throws InputException {
        String path = name.replace('\\', '/');
        if (path.startsWith("/") || path.indexOf(':') >= 0 || ("/" + path + "/").contains("/../")) {
            throw refusal(
                    file,
                    "path-in-archive",
                    "the name “" + name + "” in the archive, which points out of it",
                    "names inside the archive",
                    "save the table again from a program you trust, or as delimited text (.csv)");
        }
    }

    private InputException bomb(String found) {
        return refusal(
                file,
                "archive-too-large",
                found,
                "a spreadsheet of ordinary size",
                "copy the table into a spreadsheet of its own, or save it as delimited text (.csv)");
    }

    static InputException refusal(String file, String code, String found, String expected, String remedy) {
        return new InputException(java.util.List.of(new Problem(code, Place.of(file), found, expected, remedy)));
    }
}
