package org.saddlebook.console.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.api.service.TableWriter;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.EvaluateOptions;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.OutputFolder;
import org.saddlebook.console.api.Verb;
import org.saddlebook.presentation.api.ProblemText;

/** Evaluates a campaign or a bare table. */
@Component(property = Verb.NAME_PROPERTY + "=evaluate")
public final class EvaluateVerb implements Verb {
    private final Services services;

    /** Services are looked up when needed: findings alone load neither report nor charts nor register. */
    @Activate
    public EvaluateVerb(BundleContext context) {
        services = new Services(context);
    }

    @Override
    public String name() {
        return "evaluate";
    }

    @Override
    public String synopsis() {
        return "INPUT [--out DIR] [--json] " + EvaluateOptions.SYNOPSIS;
    }

    @Override
    public String summary() {
        return "computes activation parameters, predictions and feasibility";
    }

    @Override
    public String help() {
        return "INPUT             a campaign folder, a campaign.json, or a table of T and k\n"
                + "--out DIR         write report, campaign, findings and tables (CSV) into this folder\n"
                + "--json            print the findings as JSON and nothing else\n"
                + EvaluateOptions.HELP
                + "\n\nExit codes: 0 done; 1 a model named by --model was refused, or nothing could be fitted; 2 input or"
                + " arguments wrong; 3 internal fault; 130 cancelled.";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        EvaluateOptions options = EvaluateOptions.parse(invocation.arguments(), List.of("--json"), List.of("--out"));
        Path input = Paths.resolve(invocation, options.others().word("INPUT"), "INPUT");
        Optional<String> out = options.others().value("--out");
        boolean json = options.others().has("--json");
        OutputFolder folder = out.isEmpty() ? null : OutputFolder.at(Paths.resolve(invocation, out.get(), "--out"));

        Intake intake = services.need(Intake.class, "base");
        Evaluation evaluation = services.need(Evaluation.class, "base");
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        Intake.Opened opened = intake.open(input, options.readingRule(), invocation.user(), invocation.progress());
        Campaign effective;
        try {
            effective = evaluation.effective(options.foldInto(opened.campaign()));
        } catch (InputException e) {
            if (onlyAbsentModels(e.problems())) {
                invocation.err().println(ProblemText.of(e.problems()));
                return ExitCode.REFUSED; // asked for by name and not there
            }
            throw e;
        }
        Findings findings = evaluation.evaluate(effective, invocation.progress());
        byte[] findingsJson = json || folder != null ? format.findings(findings) : new byte[0];
        String written = "";
        if (folder != null) {
            written = write(folder, opened, effective, findings, findingsJson, format, invocation);
        }
        Verdict verdict = Verdict.of(effective, findings, options.models());
        if (json) {
            invocation.out().write(findingsJson);
        } else {
            new Summary(invocation.out()).print(opened.understood(), findings);
            NotInstalled.notice(services).ifPresent(invocation.out()::println);
            if (!written.isEmpty()) {
                invocation.out().println(written);
            }
        }
        if (!verdict.sentence().isEmpty()) {
            invocation.err().println("saddlebook: " + verdict.sentence());
        }
        return verdict.exitCode();
    }

    private String write(
            OutputFolder folder,
            Intake.Opened opened,
            Campaign effective,
            Findings findings,
            byte[] findingsJson,
            CampaignFormat format,
            Invocation invocation)
            throws InputException, IOException {
        OutputFolder.Content content = new OutputFolder.Content();
        content.add("campaign.json", format.campaign(effective));
        content.add("findings.json", findingsJson);
        Optional<ReportWriter> report = services.find(ReportWriter.class);
        String first = "findings.json";
        if (report.isPresent()) {
            List<Intake.Part> parts = report.get().report(effective, findings);
            first = parts.isEmpty() ? first : parts.get(0).name();
            for (Intake.Part part : parts) {
                content.add(part.name(), part.bytes());
            }
        } else {
            invocation
                    .err()
                    .println("saddlebook: no report was written, because the feature report is not installed; campaign"
                            + " and findings are in the folder.");
        }
        Optional<TableWriter> tables = services.find(TableWriter.class);
        if (tables.isPresent()) {
            for (Intake.Part part : tables.get().tables(findings)) {
                content.add(part.name(), part.bytes());
            }
        }
        for (Intake.Part source : opened.parts()) {
            content.addSource(source.name(), source.bytes());
        }
        folder.write(content);
        return "Written: " + folder.path().resolve(first);
    }

    private static boolean onlyAbsentModels(List<Problem> problems) {
        for (Problem problem : problems) {
            if (!problem.code().equals("model-not-installed")) {
                return false;
            }
        }
        return true;
    }
}
