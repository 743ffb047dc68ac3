package org.saddlebook.reaction.series.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.EntryFindings;
import org.saddlebook.console.api.EvaluateOptions;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.FindingsText;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.OutputFolder;
import org.saddlebook.console.api.Verb;
import org.saddlebook.json.api.Sha256;

/** Compares reactions with each other and with the literature, and evaluates tables of ratios. */
@Component(property = Verb.NAME_PROPERTY + "=compare")
public final class CompareVerb implements Verb {
    private static final String LITERATURE = "--literature";
    private static final long LARGEST_RATIOS = 16L << 20;
    private static final List<String> VALUED = List.of("--out", LITERATURE, EntryFindings.OPTION);

    private final Services services;

    /** Where services come from. */
    interface Services {
        <S> Optional<S> find(Class<S> type);
    }

    /** Services are looked up when the verb runs. */
    @Activate
    public CompareVerb(BundleContext context) {
        this(new Services() {
            @Override
            public <S> Optional<S> find(Class<S> type) {
                ServiceReference<S> reference = context.getServiceReference(type);
                return reference == null ? Optional.empty() : Optional.ofNullable(context.getService(reference));
            }
        });
    }

    CompareVerb(Services services) {
        this.services = services;
    }

    @Override
    public String name() {
        return "compare";
    }

    @Override
    public String synopsis() {
        return "INPUT... [--at T]... [--literature EXPRESSION|FILE] [--level P] [--json] [--out DIR] [--register PATH]";
    }

    @Override
    public String summary() {
        return "compares reactions with each other and with the literature; evaluates ratios";
    }

    @Override
    public String help() {
        return """
                INPUT             a campaign folder, a campaign.json, a table of T and k, the number of an entry of the
                                  register, or a table of T and ratio, er, ee or KIE
                --at T            temperature of ratios, such as 298.15K; may be repeated. Without it the one where the
                                  ratio is determined best
                --literature X    an expression, such as "A = 2.45e-12 cm3/({molecule}.s), E/R = 1775 K, n = 0,
                                  f298 = 1.1, g = 100 K, from ...", or a table of T and k
                --level P         coverage probability of intervals, above 0.5 and below 1
                --json            print the findings as JSON and nothing else
                --out DIR         write report and findings into this folder
                --register PATH   the register's file, for the number of an entry

                Exit codes: 0 done; 1 nothing could be compared; 2 input or arguments wrong; 3 internal fault; 130
                cancelled.""";
    }

    /** What was read. */
    private record Inputs(List<Reaction> reactions, List<RatioTable> ratios, List<String> digests) {}

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        EvaluateOptions evaluate = EvaluateOptions.parse(invocation.arguments(), List.of("--json"), VALUED);
        Options options = evaluate.others();
        refuseOthers(options);
        OutputFolder folder = options.value("--out").isEmpty()
                ? null
                : OutputFolder.at(path(invocation, options.value("--out").get(), "--out"));
        var choices = evaluate.foldInto(Campaign.titled("")).choices();
        List<Double> targets = choices.targetsKelvin();
        double level = choices.level();
        Inputs inputs = read(invocation, options);
        Optional<String> literature = options.value(LITERATURE);
        check(inputs, literature.isPresent());

        List<Section> sections = new ArrayList<>();
        if (inputs.reactions().size() > 1) {
            sections.add(SeriesFindings.section(inputs.reactions(), targets, level));
        }
        if (literature.isPresent()) {
            sections.add(literature(invocation, literature.get(), inputs, level));
        }
        for (RatioTable table : inputs.ratios()) {
            Section section = RatioFindings.section(table, targets, level);
            sections.add(inputs.ratios().size() == 1 ? section : named(section, table, sections.size()));
        }
        Findings findings = findings(inputs, sections, options);
        CampaignFormat format = need(CampaignFormat.class);
        if (folder != null) {
            write(folder, findings, format, invocation);
        }
        if (options.has("--json")) {
            invocation.out().write(format.findings(findings));
        } else {
            FindingsText.print(invocation.out(), List.of(), findings);
            if (folder != null) {
                invocation.out().println("Written: " + folder.path());
            }
        }
        boolean any = sections.stream().anyMatch(section -> section.outcome() == Section.Outcome.DONE);
        return any ? ExitCode.DONE : ExitCode.REFUSED;
    }

    private static void refuseOthers(Options options) throws InputException {
        for (String name : List.of("--model", "--standard", "--seed", "--errors")) {
            if (!options.values(name).isEmpty()) {
                throw Options.wrong(
                        "unknown-option",
                        name,
                        name,
                        "--at, --literature, --level, --json, --out or --register",
                        "Leave it out: reactions are compared as straight lines of ln k against 1/T.");
            }
        }
    }

    private static void check(Inputs inputs, boolean literature) throws InputException {
        if (inputs.reactions().isEmpty() && inputs.ratios().isEmpty()) {
            throw Options.wrong("missing-argument", "INPUT", "nothing", "two inputs or more", "Name what to compare.");
        }
        if (literature && inputs.reactions().isEmpty()) {
            throw Options.wrong(
                    "missing-argument",
                    "INPUT",
                    "no table of rate constants",
                    "rate constants to compare with the literature",
                    "Name a campaign or a table of T and k.");
        }
        if (inputs.reactions().size() == 1 && !literature) {
            throw Options.wrong(
                    "missing-argument",
                    "INPUT",
                    "one table of rate constants",
                    "two or more, or --literature",
                    "Name another one to compare it with.");
        }
        for (Reaction reaction : inputs.reactions()) {
            Reaction first = inputs.reactions().get(0);
            if (reaction.order() != first.order()) {
                throw Options.wrong(
                        "different-orders",
                        reaction.name(),
                        "rate constants in " + reaction.unit().code(),
                        "the order of " + first.name() + ", in " + first.unit().code(),
                        "Compare rate constants of one order.");
            }
        }
    }

    private Inputs read(Invocation invocation, Options options) throws InputException, Cancelled, IOException {
        Inputs inputs = new Inputs(new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
        for (String word : options.words()) {
            if (isNumber(word)) {
                byte[] json = need(EntryFindings.class).campaign(Long.parseLong(word), invocation, options);
                add(inputs, need(CampaignFormat.class).readCampaign("entry " + word, json), "entry " + word);
                continue;
            }
            Path path = path(invocation, word, "INPUT");
            if (Files.isRegularFile(path) && Files.size(path) <= LARGEST_RATIOS) {
                byte[] bytes = Files.readAllBytes(path);
                if (RatioReader.recognises(bytes)) {
                    inputs.ratios().add(RatioReader.read(word, bytes));
                    inputs.digests().add(Sha256.of(bytes));
                    continue;
                }
            }
            Intake.Opened opened =
                    need(Intake.class).open(path, ReadingRule.AUTOMATIC, invocation.user(), invocation.progress());
            add(inputs, opened.campaign(), word);
        }
        return inputs;
    }

    private void add(Inputs inputs, Campaign campaign, String word) throws InputException {
        inputs.reactions().add(reaction(campaign, word, inputs.reactions()));
        inputs.digests().add(need(CampaignFormat.class).digest(campaign));
    }

    private static Reaction reaction(Campaign campaign, String word, List<Reaction> before) throws InputException {
        if (campaign.rateTable().isEmpty() || campaign.rateTable().get().used().isEmpty()) {
            throw new InputException(new Problem(
                    "no-rate-table",
                    Place.of(word),
                    campaign.rateTable().isEmpty() ? "no rate table" : "a rate table with every row excluded",
                    "rate constants at two temperatures or more",
                    "Name a campaign or a table of T and k."));
        }
        String name = campaign.title().isEmpty() ? word : campaign.title();
        String unique = name;
        for (int i = 2; taken(unique, before); i++) {
            unique = name + " (" + i + ")";
        }
        return Reaction.of(unique, campaign.rateTable().get());
    }

    private static boolean taken(String name, List<Reaction> before) {
        return before.stream().anyMatch(reaction -> reaction.name().equals(name));
    }

    private Section literature(Invocation invocation, String text, Inputs inputs, double level)
            throws InputException, Cancelled {
        Reaction first = inputs.reactions().get(0);
        if (text.indexOf('=') >= 0) {
            return LiteratureFindings.section(
                    inputs.reactions(), ReferenceRate.of(Literature.parse(text, first.order())), level);
        }
        Campaign campaign = need(Intake.class)
                .open(
                        path(invocation, text, LITERATURE),
                        ReadingRule.AUTOMATIC,
                        invocation.user(),
                        invocation.progress())
                .campaign();
        Reaction table = reaction(campaign, text, inputs.reactions());
        if (table.order() != first.order()) {
            throw Options.wrong(
                    "different-orders",
                    LITERATURE,
                    "rate constants in " + table.unit().code(),
                    "the order of " + first.name() + ", in " + first.unit().code(),
                    "Compare rate constants of one order.");
        }
        inputs.digests().add(need(CampaignFormat.class).digest(campaign));
        Optional<JointFit> fit = JointFit.of(List.of(table));
        if (fit.isEmpty()) {
            return Section.refused(
                    LiteratureFindings.SECTION,
                    LiteratureFindings.TITLE,
                    "The literature table needs points at two temperatures, and three of them, or stated uncertainties.");
        }
        return LiteratureFindings.section(
                inputs.reactions(),
                ReferenceRate.of(table, fit.get().lines().get(0), fit.get().scale()),
                level);
    }

    private static Section named(Section section, RatioTable table, int number) {
        String title = table.title().isEmpty() ? section.title() : section.title() + ": " + table.title();
        return new Section(
                section.id() + "." + (number + 1), title, section.outcome(), section.body(), section.cautions());
    }

    private static Findings findings(Inputs inputs, List<Section> sections, Options options) {
        List<String> names = new ArrayList<>();
        inputs.reactions().forEach(reaction -> names.add(reaction.name()));
        for (RatioTable table : inputs.ratios()) {
            names.add(table.title().isEmpty() ? "ratios" : table.title());
        }
        StringBuilder digest = new StringBuilder(String.join("\n", inputs.digests()));
        for (String name : List.of("--at", "--level", LITERATURE)) {
            digest.append('\n').append(name).append(' ').append(String.join("\n", options.values(name)));
        }
        Map<String, Section> byId = new LinkedHashMap<>();
        sections.forEach(section -> byId.put(section.id(), section));
        return new Findings(
                "Comparison: " + String.join(", ", names),
                Sha256.of(digest.toString().getBytes(StandardCharsets.UTF_8)),
                List.of(contributor()),
                byId);
    }

    /** This bundle; outside a framework, as in tests, its class. */
    private static Contributor contributor() {
        Bundle bundle = FrameworkUtil.getBundle(CompareVerb.class);
        return bundle == null
                ? new Contributor(CompareVerb.class.getName(), "0", "")
                : new Contributor(bundle.getSymbolicName(), bundle.getVersion().toString(), "");
    }

    private void write(OutputFolder folder, Findings findings, CampaignFormat format, Invocation invocation)
            throws InputException, IOException {
        OutputFolder.Content content = new OutputFolder.Content();
        content.add("findings.json", format.findings(findings));
        Optional<ReportWriter> report = services.find(ReportWriter.class);
        if (report.isPresent()) {
            for (Intake.Part part : report.get().report(Campaign.titled(findings.campaignTitle()), findings)) {
                content.add(part.name(), part.bytes());
            }
        } else {
            invocation
                    .err()
                    .println(
                            "saddlebook: no report was written, because the feature report is not installed; the findings"
                                    + " are in the folder.");
        }
        folder.write(content);
    }

    private <S> S need(Class<S> type) throws InputException {
        Optional<S> service = services.find(type);
        if (service.isEmpty()) {
            throw Options.wrong(
                    "not-installed",
                    "this installation",
                    "nothing that provides " + type.getSimpleName(),
                    "the feature that brings it: register for entries, base for the rest",
                    "Install it. `saddlebook bundles list` shows what is there.");
        }
        return service.get();
    }

    private static Path path(Invocation invocation, String typed, String argument) throws InputException {
        try {
            if (!typed.isBlank()) {
                return invocation.workingFolder().resolve(Path.of(typed));
            }
        } catch (InvalidPathException e) {
            // refused below, like an empty name
        }
        throw Options.wrong("no-file-name", argument, "\"" + typed + "\"", "a file name", "Name a file.");
    }

    private static boolean isNumber(String word) {
        for (int i = 0; i < word.length(); i++) {
            if (word.charAt(i) < '0' || word.charAt(i) > '9') {
                return false;
            }
        }
        return !word.isEmpty() && word.length() <= 15;
    }
}
