package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;

/** Lists the rate models that are installed. */
@Component(property = Verb.NAME_PROPERTY + "=models")
public final class ModelsVerb implements Verb {
    private final Services services;

    /** Models are those installed at the moment. */
    @Activate
    public ModelsVerb(BundleContext context) {
        services = new Services(context);
    }

    @Override
    public String name() {
        return "models";
    }

    @Override
    public String synopsis() {
        return "";
    }

    @Override
    public String summary() {
        return "lists the installed rate models with formula and source";
    }

    @Override
    public String help() {
        return "The first word of each entry is what --model takes.";
    }

    @Override
    public int run(Invocation invocation) throws InputException {
        Options.parse(invocation.arguments(), List.of(), List.of());
        PrintStream out = invocation.out();
        TreeMap<String, ServiceReference<RateModel>> byId = new TreeMap<>();
        for (ServiceReference<RateModel> reference : services.references(RateModel.class, null)) {
            services.get(reference).ifPresent(model -> byId.putIfAbsent(model.id(), reference));
        }
        if (byId.isEmpty()) {
            out.println("No rate model is installed. Install one of the features model-arrhenius, model-eyring,"
                    + " model-modified-arrhenius, or add a bundle: saddlebook bundles add FILE.jar");
            return ExitCode.DONE;
        }
        boolean first = true;
        for (ServiceReference<RateModel> reference : byId.values()) {
            Optional<RateModel> model = services.get(reference);
            if (model.isPresent()) {
                if (!first) {
                    out.println();
                }
                first = false;
                ModelDescription description = model.get().description();
                out.println(model.get().id() + "  " + description.title());
                out.println("  " + description.formula());
                out.println("  source: " + description.source());
                description.contains().ifPresent(id -> out.println("  contains: " + id));
                if (model.get().onRequest()) {
                    out.println("  fitted when asked for by name");
                } else if (!model.get().conditions().isEmpty()) {
                    out.println("  fitted where a table states: "
                            + String.join(", ", model.get().conditions()));
                }
                out.println("  bundle: " + reference.getBundle().getSymbolicName() + " "
                        + reference.getBundle().getVersion());
            }
        }
        return ExitCode.DONE;
    }
}
