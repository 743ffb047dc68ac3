package org.saddlebook.console.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.EvaluateOptions;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.OutputFolder;
import org.saddlebook.console.api.Verb;

/** Makes a campaign folder of a table. */
@Component(property = Verb.NAME_PROPERTY + "=import")
public final class ImportVerb implements Verb {
    private final Services services;

    /** Services are looked up when needed. */
    @Activate
    public ImportVerb(BundleContext context) {
        services = new Services(context);
    }

    @Override
    public String name() {
        return "import";
    }

    @Override
    public String synopsis() {
        return "INPUT --out DIR " + EvaluateOptions.SYNOPSIS;
    }

    @Override
    public String summary() {
        return "makes a campaign folder of a table, without evaluating it";
    }

    @Override
    public String help() {
        return "INPUT             a table of T and k\n"
                + "--out DIR         the campaign folder to make\n"
                + EvaluateOptions.HELP
                + "\n\nThe options are stored in the campaign as its choices.";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        EvaluateOptions options = EvaluateOptions.parse(invocation.arguments(), List.of(), List.of("--out"));
        Path input = Paths.resolve(invocation, options.others().word("INPUT"), "INPUT");
        Optional<String> out = options.others().value("--out");
        if (out.isEmpty()) {
            throw Options.wrong("missing-argument", "--out", "no --out", "a folder", "Add --out DIR.");
        }
        OutputFolder folder = OutputFolder.at(Paths.resolve(invocation, out.get(), "--out"));
        Intake.Opened opened = services.need(Intake.class, "base")
                .open(input, options.readingRule(), invocation.user(), invocation.progress());
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        OutputFolder.Content content = new OutputFolder.Content();
        content.add("campaign.json", format.campaign(options.foldInto(opened.campaign())));
        for (Intake.Part part : opened.parts()) {
            content.addSource(part.name(), part.bytes());
        }
        folder.write(content);
        for (String sentence : opened.understood()) {
            Lines.wrapped(invocation.out(), "", sentence);
        }
        invocation.out().println("Written: " + folder.path().resolve("campaign.json"));
        return ExitCode.DONE;
    }
}
