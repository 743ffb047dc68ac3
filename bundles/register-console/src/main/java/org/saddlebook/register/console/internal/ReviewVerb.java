package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.util.List;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/** Records a review of an entry. */
@Component(property = Verb.NAME_PROPERTY + "=review")
public final class ReviewVerb implements Verb {
    private final Services services;

    /** Services are looked up when the verb runs. */
    @Activate
    public ReviewVerb(BundleContext context) {
        this(Services.of(context));
    }

    ReviewVerb(Services services) {
        this.services = services;
    }

    @Override
    public String name() {
        return "review";
    }

    @Override
    public String synopsis() {
        return "N --meaning TEXT [--reason TEXT] [--as NAME] [--register PATH]";
    }

    @Override
    public String summary() {
        return "records that an entry was reviewed";
    }

    @Override
    public String help() {
        return "N                 the number of the entry\n"
                + "--meaning TEXT    what your name under it means, such as \"checked against the notebook\"\n"
                + "--reason TEXT     why it was reviewed\n"
                + "--as NAME         who reviewed it; without it the name of your account\n"
                + Locations.HELP;
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        Options options = Options.parse(
                invocation.arguments(), List.of(), List.of("--meaning", "--reason", "--as", Locations.OPTION));
        long number = Locations.number(options.word("N"));
        Draft draft = Draft.reviewed(
                        Locations.actor(invocation, options),
                        number,
                        options.value("--meaning").orElse(""))
                .withReason(options.value("--reason").orElse(""));
        try (Register register = Locations.open(services, invocation, options, Opening.EXISTING)) {
            Receipt receipt = register.append(draft);
            invocation.out().println("The review of entry " + number + " is record " + receipt.number() + ".");
            invocation
                    .out()
                    .println("Root hash  " + receipt.head().root() + " over "
                            + Text.count(receipt.head().size(), "record"));
        }
        return ExitCode.DONE;
    }
}
