package org.saddlebook.desk.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
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

/** Opens the desk and stays until the user leaves it. */
@Component(property = Verb.NAME_PROPERTY + "=desk")
public final class DeskVerb implements Verb {
    private final BundleContext context;

    /** Nothing is loaded before the verb runs: the command line knows no window. */
    @Activate
    public DeskVerb(BundleContext context) {
        this.context = context;
    }

    @Override
    public String name() {
        return "desk";
    }

    @Override
    public String synopsis() {
        return "[INPUT]...";
    }

    @Override
    public String summary() {
        return "opens the desk: a window on campaigns, findings and register";
    }

    @Override
    public String help() {
        return """
                INPUT             campaign folders, campaign.json files or tables to open; without one the desk opens what was
                                  not saved last time, else a demo campaign

                Exit codes: 0 the desk was left; 2 there is no screen, or arguments are wrong; 3 internal fault.""";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        Options options = Options.parse(invocation.arguments(), List.of(), List.of());
        List<Path> inputs = new ArrayList<>();
        for (String word : options.words()) {
            inputs.add(invocation.workingFolder().resolve(word));
        }
        DeskStart.run(context, invocation, inputs);
        return ExitCode.DONE;
    }
}
