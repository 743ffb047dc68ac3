package org.saddlebook.console.internal;

import java.io.IOException;
import java.nio.channels.ClosedByInterruptException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.util.Optional;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Verb;
import org.saddlebook.json.api.NearSpelling;
import org.saddlebook.presentation.api.ProblemText;

/** Finds the verb and turns its exceptions into messages and exit codes. */
final class Dispatcher {
    private final Verbs verbs;

    Dispatcher(Verbs verbs) {
        this.verbs = verbs;
    }

    /**
     * Runs a verb.
     *
     * @param word what was typed first; empty for nothing
     * @return the exit code
     */
    int run(String word, Invocation invocation) {
        String name = switch (word) {
            case "", "-h", "--help" -> "help";
            case "--version" -> "version";
            default -> word;
        };
        Optional<Verb> verb = verbs.find(name);
        if (verb.isEmpty()) {
            return unknown(word, invocation);
        }
        if (invocation.arguments().contains("--help")) {
            HelpVerb.print(verb.get(), invocation.out());
            return ExitCode.DONE;
        }
        try {
            return verb.get().run(invocation);
        } catch (InputException e) {
            invocation.err().println(ProblemText.of(e.problems()));
            return ExitCode.BAD_INPUT;
        } catch (Cancelled | ClosedByInterruptException e) {
            invocation.err().println("saddlebook: cancelled");
            return ExitCode.CANCELLED;
        } catch (IOException e) {
            invocation.err().println("saddlebook: " + sentence(e));
            return ExitCode.BAD_INPUT;
        }
    }

    private int unknown(String word, Invocation invocation) {
        Optional<String> near = NearSpelling.of(word, verbs.all().keySet());
        invocation
                .err()
                .println("saddlebook: there is no command \"" + word + "\" here."
                        + near.map(meant -> " Did you mean \"" + meant + "\"?").orElse("")
                        + " `saddlebook help` lists the commands.");
        return ExitCode.BAD_INPUT;
    }

    /** The platform's file exceptions carry hardly more than a path; verbs' own already are sentences. */
    private static String sentence(IOException e) {
        if (e instanceof NoSuchFileException missing) {
            return "there is no file or folder " + missing.getFile() + ".";
        }
        if (e instanceof AccessDeniedException denied) {
            return "no permission for " + denied.getFile() + ".";
        }
        if (e instanceof FileSystemException problem && problem.getReason() != null) {
            return problem.getFile() + ": " + problem.getReason() + ".";
        }
        return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
    }
}
