package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.Map;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Verb;
import org.saddlebook.json.api.NearSpelling;

/** Lists the commands, or explains one. */
@Component(property = Verb.NAME_PROPERTY + "=help")
public final class HelpVerb implements Verb {
    private final Verbs verbs;

    /** Verbs are those installed when help is asked for. */
    @Activate
    public HelpVerb(BundleContext context) {
        verbs = new Verbs(new Services(context));
    }

    @Override
    public String name() {
        return "help";
    }

    @Override
    public String synopsis() {
        return "[COMMAND]";
    }

    @Override
    public String summary() {
        return "lists the commands, or explains one";
    }

    @Override
    public String help() {
        return "COMMAND    the command to explain; without it all are listed";
    }

    @Override
    public int run(Invocation invocation) throws InputException {
        Map<String, Verb> all = verbs.all();
        PrintStream out = invocation.out();
        if (!invocation.arguments().isEmpty()) {
            String word = invocation.arguments().get(0);
            Verb verb = all.get(word);
            if (verb == null) {
                Optional<String> near = NearSpelling.of(word, all.keySet());
                throw new InputException(new Problem(
                        "unknown-command",
                        Place.of("help"),
                        word,
                        "one of " + String.join(", ", all.keySet()),
                        near.map(meant -> "Did you mean " + meant + "?").orElse("Choose one of these.")));
            }
            print(verb, out);
            return ExitCode.DONE;
        }
        out.println("Saddlebook: from measured temperature series to activation parameters, feasibility and a record");
        out.println("that can be computed again.");
        out.println();
        out.println("usage: saddlebook COMMAND ...");
        out.println();
        int width = 0;
        for (String name : all.keySet()) {
            width = Math.max(width, name.length());
        }
        for (Verb verb : all.values()) {
            out.println("  " + verb.name() + " ".repeat(width + 2 - verb.name().length()) + verb.summary());
        }
        out.println();
        out.println("`saddlebook help COMMAND` explains one; a first try: saddlebook evaluate rates.csv");
        return ExitCode.DONE;
    }

    /** Explains one verb. */
    static void print(Verb verb, PrintStream out) {
        out.println("usage: saddlebook " + verb.name() + (verb.synopsis().isEmpty() ? "" : " " + verb.synopsis()));
        out.println();
        out.println(verb.summary());
        if (!verb.help().isEmpty()) {
            out.println();
            out.println(verb.help());
        }
    }
}
