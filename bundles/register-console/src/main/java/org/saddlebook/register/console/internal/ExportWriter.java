package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.saddlebook.register.api.Export;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.RegisterException;

/** Writes an export into a new folder or zip file; it appears whole or not at all. */
final class ExportWriter {
    private ExportWriter() {}

    static void write(Export export, Path target) throws IOException {
        if (Files.exists(target) && !isEmptyFolder(target)) {
            throw new RegisterException(target + " exists already. Name a new folder or file with --out.");
        }
        Path folder = target.toAbsolutePath().getParent();
        if (folder == null) {
            throw new RegisterException(target + " cannot be written. Name a new folder or file with --out.");
        }
        Files.createDirectories(folder);
        boolean zip = target.getFileName().toString().toLowerCase(Locale.ROOT).endsWith(".zip");
        Path partial = folder.resolve(
                "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".partial");
        try {
            if (zip) {
                zip(export, partial);
            } else {
                folder(export, partial);
                Files.deleteIfExists(target); // an empty folder
            }
            Files.move(partial, target);
        } finally {
            delete(partial);
        }
    }

    private static boolean isEmptyFolder(Path target) throws IOException {
        if (!Files.isDirectory(target)) {
            return false;
        }
        try (Stream<Path> files = Files.list(target)) {
            return files.findAny().isEmpty();
        }
    }

    private static void folder(Export export, Path folder) throws IOException {
        for (PartFile file : export.files()) {
            Path path = folder.resolve(file.name()).normalize();
            if (!path.startsWith(folder)) {
                throw new RegisterException("A part would lie outside the folder: " + file.name());
            }
            Files.createDirectories(path.getParent());
            try (InputStream in = file.content().open()) {
                Files.copy(in, path);
            }
        }
    }

    private static void zip(Export export, Path file) throws IOException {
        // The time of the record, in UTC: two exports of one state of the register are equal, byte for byte.
        LocalDateTime time = LocalDateTime.ofInstant(export.entry().record().time(), ZoneOffset.UTC);
        try (OutputStream out = Files.newOutputStream(file);
                ZipOutputStream zip = new ZipOutputStream(out, StandardCharsets.UTF_8)) {
            for (PartFile part : export.files()) {
                ZipEntry entry = new ZipEntry(part.name());
                entry.setTimeLocal(time);
                zip.putNextEntry(entry);
                try (InputStream in = part.content().open()) {
                    in.transferTo(zip);
                }
                zip.closeEntry();
            }
        }
    }

    private static void delete(Path partial) throws IOException {
        if (Files.exists(partial)) {
            List<Path> paths;
            try (Stream<Path> walk = Files.walk(partial)) {
                paths = walk.sorted(Comparator.reverseOrder()).toList();
            }
            for (Path path : paths) {
                Files.delete(path);
            }
        }
    }
}
