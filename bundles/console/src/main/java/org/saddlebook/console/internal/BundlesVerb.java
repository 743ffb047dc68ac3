package org.saddlebook.console.internal;

import java.io.IOException;
import java.util.List;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.json.api.NearSpelling;

/** Lists, adds, removes and checks bundles. */
@Component(property = Verb.NAME_PROPERTY + "=bundles")
public final class BundlesVerb implements Verb {
    private static final List<String> WORDS = List.of("list", "add", "remove", "check");

    private final BundleContext context;

    /** Bundles are those that are there at the moment. */
    @Activate
    public BundlesVerb(BundleContext context) {
        this.context = context;
    }

    @Override
    public String name() {
        return "bundles";
    }

    @Override
    public String synopsis() {
        return "list [--json] | add FILE.jar | remove NAME | check";
    }

    @Override
    public String summary() {
        return "lists what is installed; adds, removes and checks bundles";
    }

    @Override
    public String help() {
        return """
                list           every bundle with version, state and SHA-256; with --json for programs
                add FILE.jar   checks a bundle and copies it into your own bundles; the next command has it
                remove NAME    removes one of your own bundles, by symbolic name
                check          compares the product's files with the hashes of its build and tries every bundle

                An added bundle runs with your rights and can do whatever you can: add only what you trust.
                Exit codes: 0 done; 1 refused; 2 arguments wrong; 4 a file of the product was changed.""";
    }

    @Override
    public int run(Invocation invocation) throws InputException, IOException {
        List<String> arguments = invocation.arguments();
        if (arguments.isEmpty()) {
            throw Options.wrong("missing-argument", "bundles", "nothing", synopsis(), "Say what to do.");
        }
        List<String> rest = arguments.subList(1, arguments.size());
        return switch (arguments.get(0)) {
            case "list" -> list(rest, invocation);
            case "add" -> {
                String file = Options.parse(rest, List.of(), List.of()).word("FILE.jar");
                yield new BundleAddition(context, new InstalledBundles(context))
                        .add(Paths.resolve(invocation, file, "FILE.jar"), invocation);
            }
            case "remove" -> {
                String bundle = Options.parse(rest, List.of(), List.of()).word("NAME");
                yield new AddedBundles(invocation.dataFolder()).remove(bundle, invocation);
            }
            case "check" -> {
                noWords(Options.parse(rest, List.of(), List.of()), "check");
                yield new BundleCheck(context, new InstalledBundles(context)).print(invocation.out(), invocation.err());
            }
            default ->
                throw Options.wrong(
                        "unknown-argument",
                        "bundles",
                        "\"" + arguments.get(0) + "\"",
                        "one of " + String.join(", ", WORDS),
                        NearSpelling.of(arguments.get(0), WORDS)
                                .map(near -> "Did you mean " + near + "?")
                                .orElse("Choose one of these."));
        };
    }

    private int list(List<String> arguments, Invocation invocation) throws InputException, IOException {
        Options options = Options.parse(arguments, List.of("--json"), List.of());
        noWords(options, "list");
        return new BundleListing(context, new InstalledBundles(context)).print(invocation.out(), options.has("--json"));
    }

    private static void noWords(Options options, String word) throws InputException {
        if (!options.words().isEmpty()) {
            throw Options.wrong(
                    "superfluous-argument", word, "\"" + options.words().get(0) + "\"", "nothing", "Leave it out.");
        }
    }
}
