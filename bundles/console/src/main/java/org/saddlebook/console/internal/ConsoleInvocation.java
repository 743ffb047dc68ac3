package org.saddlebook.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import org.saddlebook.api.service.Progress;
import org.saddlebook.console.api.Invocation;

/** One call from the command line. */
record ConsoleInvocation(
        List<String> arguments,
        PrintStream out,
        PrintStream err,
        Progress progress,
        Clock clock,
        String user,
        Path workingFolder,
        Path data)
        implements Invocation {
    @Override
    public Path dataFolder() {
        try {
            return Files.createDirectories(data);
        } catch (IOException e) {
            throw new UncheckedIOException("the folder for your data cannot be made: " + e.getMessage(), e);
        }
    }
}
