package org.saddlebook.console.internal;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;

/** File names as they are typed. */
final class Paths {
    private Paths() {}

    /**
     * The path of a typed name, seen from the working folder. A relative name stays relative, so that messages show what
     * was typed.
     *
     * @param argument the argument for messages
     */
    static Path resolve(Invocation invocation, String typed, String argument) throws InputException {
        try {
            Path path = Path.of(typed);
            boolean there = invocation.workingFolder().equals(Path.of("").toAbsolutePath());
            return there ? path : invocation.workingFolder().resolve(path);
        } catch (InvalidPathException e) {
            throw Options.wrong(
                    "no-file-name",
                    argument,
                    "\"" + typed + "\"",
                    "a file name",
                    "Remove the character that no file name can have.");
        }
    }
}
