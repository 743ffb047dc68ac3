package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.time.Clock;

/**
 * The file where traces go, so that none reaches the user; made on the first line written. Also stands in for
 * {@code System.out} and {@code System.err}: whatever a library prints there must not end up between findings.
 */
final class FaultLog {
    private static final long ROTATE_AT = 1 << 20;

    private final Path file;
    private final Clock clock;
    private OutputStream target;

    FaultLog(Path cache, Clock clock) {
        this.file = cache.resolve("log").resolve("saddlebook.log");
        this.clock = clock;
    }

    /** Where the traces are. */
    Path file() {
        return file;
    }

    /** A stream into the log. */
    PrintStream stream() {
        return new PrintStream(
                new OutputStream() {
                    @Override
                    public void write(int b) {
                        append(new byte[] {(byte) b}, 0, 1);
                    }

                    @Override
                    public void write(byte[] bytes, int offset, int length) {
                        append(bytes, offset, length);
                    }
                },
                true,
                StandardCharsets.UTF_8);
    }

    /** Writes one message. */
    void write(String message) {
        byte[] bytes = (message + "\n").getBytes(StandardCharsets.UTF_8);
        append(bytes, 0, bytes.length);
    }

    /** Writes a message and where it came from. */
    void write(String message, Throwable cause) {
        write(message);
        cause.printStackTrace(stream());
    }

    private synchronized void append(byte[] bytes, int offset, int length) {
        try {
            if (target == null) {
                target = open();
            }
            target.write(bytes, offset, length);
        } catch (IOException e) {
            target = OutputStream.nullOutputStream(); // no place for a log: the message on standard error has to do
        }
    }

    private OutputStream open() throws IOException {
        Folders.create(file.getParent());
        if (Files.exists(file) && Files.size(file) > ROTATE_AT) {
            Files.move(file, file.resolveSibling("saddlebook.1.log"), StandardCopyOption.REPLACE_EXISTING);
        }
        OutputStream stream = Files.newOutputStream(file, StandardOpenOption.CREATE, StandardOpenOption.APPEND);
        String head = "---- " + clock.instant() + " process "
                + ProcessHandle.current().pid() + "\n";
        stream.write(head.getBytes(StandardCharsets.UTF_8));
        return stream;
    }
}
