package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.sql.SQLException;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.sqlite.SQLiteException;

/** What went wrong, as a sentence with what to do about it. */
final class Failures {
    private Failures() {}

    /** A failure of the database; the low byte of an extended result code is the plain one. */
    static RegisterException of(Path file, SQLException e) {
        int code = e instanceof SQLiteException sqlite ? sqlite.getResultCode().code & 0xff : -1;
        String register = "The register " + file;
        return switch (code) {
            case 5, 6 ->
                new RegisterException( // BUSY, LOCKED
                        register + " is locked by another process for longer than "
                                + SqliteStore.PATIENCE_SECONDS + " s. Try again; if it stays so, end the process that"
                                + " holds it.",
                        e);
            case 3, 8, 23 ->
                new RegisterException( // PERM, READONLY, AUTH
                        register + " is read-only for you, so nothing was recorded. Ask its owner for write permission"
                                + " to the file and its folder; a shared one lies in a set-group-ID folder that the"
                                + " group may write to.",
                        e);
            case 13 ->
                new RegisterException( // FULL
                        "There is no room left for the register " + file
                                + ", so nothing was recorded. Free some space and try again.",
                        e);
            case 10 ->
                new RegisterException( // IOERR
                        register + " could not be read or written (" + e.getMessage()
                                + "). Check the disk and the room left on it, then run \"register verify\".",
                        e);
            case 11 ->
                new RegisterDamagedException( // CORRUPT
                        register + " is damaged: " + e.getMessage() + ". Restore it from a backup; \"register verify\""
                                + " says what differs.",
                        e);
            case 14 ->
                new RegisterException( // CANTOPEN
                        register + " cannot be opened. Check that its folder exists and that you may write there.", e);
            case 26 ->
                new RegisterException( // NOTADB
                        file + " is not a register. Name a register with --register.", e);
            default -> new RegisterException(register + " failed: " + e.getMessage() + ".", e);
        };
    }

    /** A failure to open: a file that carries a register's marks and is no database any more is a damaged register. */
    static RegisterException opening(Path file, SQLException e) {
        boolean notADatabase = e instanceof SQLiteException sqlite && (sqlite.getResultCode().code & 0xff) == 26;
        if (notADatabase && hasMarks(file)) {
            return new RegisterDamagedException(
                    "The register " + file + " is damaged: its beginning was changed and it cannot be read as a"
                            + " database. Restore it from a backup.",
                    e);
        }
        return of(file, e);
    }

    private static boolean hasMarks(Path file) {
        try (InputStream in = Files.newInputStream(file)) {
            byte[] start = in.readNBytes(100);
            return start.length == 100
                    && (new String(start, 0, 16, StandardCharsets.ISO_8859_1).equals("SQLite format 3\0")
                            || ByteBuffer.wrap(start).getInt(68) == Schema.APPLICATION_ID);
        } catch (IOException unreadable) {
            return false;
        }
    }

    /** The platform's file exceptions carry hardly more than a path. */
    static String reason(IOException e) {
        if (e instanceof AccessDeniedException denied) {
            return "no permission for " + denied.getFile();
        }
        if (e instanceof NoSuchFileException missing) {
            return "there is no " + missing.getFile();
        }
        if (e instanceof FileSystemException system && system.getReason() != null) {
            return system.getFile() + ": " + system.getReason();
        }
        return String.valueOf(e.getMessage());
    }
}
