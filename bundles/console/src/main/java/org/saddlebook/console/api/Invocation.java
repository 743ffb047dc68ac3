package org.saddlebook.console.api;

import java.io.PrintStream;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.service.Progress;

/** One call of a verb: its arguments and everything it may touch of the outside. */
@ProviderType
public interface Invocation {
    /** What stood after the verb. */
    List<String> arguments();

    /** Results, UTF-8. */
    PrintStream out();

    /** Progress and messages, UTF-8. */
    PrintStream err();

    /** Progress to standard error, cancel by interrupt. */
    Progress progress();

    /** The clock. */
    Clock clock();

    /** Who is acting: the account's name unless {@code --as} says otherwise. */
    String user();

    /** The folder relative paths start from. */
    Path workingFolder();

    /** The user's data folder (register, add-ons), created when needed. */
    Path dataFolder();
}
