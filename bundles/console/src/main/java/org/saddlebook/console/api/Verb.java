package org.saddlebook.console.api;

import java.io.IOException;
import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;

/** A command of the console. Register an implementation as an OSGi service; it then appears in {@code help}. */
@ConsumerType
public interface Verb {
    /**
     * Service property that repeats {@link #name()}. Not required, but a verb that has it is only loaded when it is
     * called: {@code @Component(property = Verb.NAME_PROPERTY + "=enter")}.
     */
    String NAME_PROPERTY = "saddlebook.verb";

    /** The word typed after {@code saddlebook}, lower case. */
    String name();

    /** The rest of the command line, for example {@code INPUT [--out DIR] [--json]}. */
    String synopsis();

    /** What it does, one line. */
    String summary();

    /** Every option and what it means, as lines of plain text. */
    String help();

    /**
     * Does the work.
     *
     * @return an exit code of {@link ExitCode}
     * @throws InputException input or arguments are wrong (exit code 2)
     * @throws Cancelled the user cancelled (exit code 130)
     * @throws IOException a file could not be read or written; the message is a sentence for the user (exit code 2)
     */
    int run(Invocation invocation) throws InputException, Cancelled, IOException;
}
