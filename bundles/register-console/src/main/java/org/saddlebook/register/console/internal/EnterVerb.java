package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.EvaluateOptions;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.presentation.api.ProblemText;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/** Evaluates and enters the result into the register. */
@Component(property = Verb.NAME_PROPERTY + "=enter")
public final class EnterVerb implements Verb {
    private final Services services;

    /** Services are looked up when the verb runs. */
    @Activate
    public EnterVerb(BundleContext context) {
        this(Services.of(context));
    }

    EnterVerb(Services services) {
        this.services = services;
    }

    @Override
    public String name() {
        return "enter";
    }

    @Override
    public String synopsis() {
        return "INPUT " + EvaluateOptions.SYNOPSIS
                + " [--meaning TEXT] [--reason TEXT] [--supersedes N] [--as NAME] [--register PATH]";
    }

    @Override
    public String summary() {
        return "evaluates and enters campaign, sources, findings and report into the register";
    }

    @Override
    public String help() {
        return "INPUT             a campaign folder, a campaign.json, or a table of T and k\n"
                + EvaluateOptions.HELP
                + "\n--meaning TEXT    what your name under the entry means, such as \"measured and evaluated by me\"\n"
                + "--reason TEXT     why it is entered\n"
                + "--supersedes N    the entry takes the place of entry N, which stays readable\n"
                + "--as NAME         who enters it; without it the name of your account\n"
                + Locations.HELP
                + "\n\nExit codes: 0 entered; 1 a model named by --model is not installed, or nothing could be evaluated;"
                + " 2 input, arguments or register wrong; 3 internal fault; 130 cancelled.";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        EvaluateOptions evaluate = EvaluateOptions.parse(
                invocation.arguments(),
                List.of(),
                List.of("--meaning", "--reason", "--supersedes", "--as", Locations.OPTION));
        Options options = evaluate.others();
        Path input = Locations.path(invocation, options.word("INPUT"), "INPUT");
        String actor = Locations.actor(invocation, options);
        Optional<String> supersedes = options.value("--supersedes");
        long target = supersedes.isPresent() ? Locations.number(supersedes.get()) : 0;

        Intake.Opened opened =
                services.need(Intake.class, "base").open(input, evaluate.readingRule(), actor, invocation.progress());
        Evaluation evaluation = services.need(Evaluation.class, "base");
        Campaign effective;
        try {
            effective = evaluation.effective(evaluate.foldInto(opened.campaign()));
        } catch (InputException e) {
            if (Recomputation.onlyAbsentModels(e)) {
                invocation.err().println(ProblemText.of(e.problems()));
                return ExitCode.REFUSED;
            }
            throw e;
        }
        Findings findings = evaluation.evaluate(effective, invocation.progress());
        if (!EntryParts.hasResult(findings)) {
            invocation
                    .err()
                    .println("saddlebook: nothing could be evaluated, so nothing was entered. `saddlebook evaluate`"
                            + " says why.");
            return ExitCode.REFUSED;
        }
        List<PartFile> parts = EntryParts.of(services, opened.parts(), effective, findings);
        invocation.progress().check(); // from here on it is entered, and no cancel can leave half of it
        Draft draft = supersedes.isPresent()
                ? Draft.superseding(actor, effective.title(), target)
                : Draft.entered(actor, effective.title());
        draft = draft.withMeaning(options.value("--meaning").orElse(""))
                .withReason(options.value("--reason").orElse(""));
        try (Register register = Locations.open(services, invocation, options, opening(supersedes))) {
            if (supersedes.isPresent()) {
                register.show(target); // refuses a number that is no entry before parts are stored
            }
            Receipt receipt = register.enter(draft, parts);
            print(invocation.out(), register, receipt, effective, parts);
            if (supersedes.isPresent()) {
                invocation.out().println("It supersedes entry " + target + ".");
            }
        }
        return ExitCode.DONE;
    }

    private static Opening opening(Optional<String> supersedes) {
        return supersedes.isPresent() ? Opening.EXISTING : Opening.CREATE;
    }

    private void print(PrintStream out, Register register, Receipt receipt, Campaign effective, List<PartFile> parts) {
        out.println("Entered as " + receipt.number() + ": " + Text.line(effective.title()));
        out.println("Register   " + register.location());
        out.println("Root hash  " + receipt.head().root() + " over "
                + Text.count(receipt.head().size(), "record"));
        out.println("Parts");
        for (PartFile part : parts) {
            out.println("  " + part.name());
        }
        if (services.find(ReportWriter.class).isEmpty()) {
            out.println("The entry has no report, because the feature report is not installed.");
        }
    }
}
