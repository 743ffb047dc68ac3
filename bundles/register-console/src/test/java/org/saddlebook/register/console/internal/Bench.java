package org.saddlebook.register.console.internal;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.campaign.json.internal.JsonCampaignFormat;
import org.saddlebook.console.api.EntryFindings;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Registers;
import org.saddlebook.register.internal.RegistersService;
import org.saddlebook.register.sqlite.internal.SqliteStoreFactory;

/**
 * A laboratory of two temperatures: real register, real store, real JSON, and a stand-in for reading and evaluating that
 * gives what a test sets.
 */
final class Bench implements Services, Intake, Evaluation, ReportWriter {
    static final byte[] SOURCE = "T (K);k (1/s)\n300;1e-5\n310;3e-5\n".getBytes(StandardCharsets.UTF_8);

    private final CampaignFormat format = new JsonCampaignFormat();
    private final Map<Class<?>, Object> services = new HashMap<>();
    final Map<String, String> settings = new HashMap<>();
    final Path folder;

    /** What the evaluation gives. */
    double barrier = 50_000.123456789;

    Contributor bundle = new Contributor("org.example.law", "1.0.0", "a".repeat(64));
    List<String> installed = List.of("arrhenius");
    boolean refused;

    private String out = "";
    private String err = "";

    Bench(Path folder) {
        this.folder = folder;
        services.put(Intake.class, this);
        services.put(Evaluation.class, this);
        services.put(ReportWriter.class, this);
        services.put(CampaignFormat.class, format);
        services.put(Registers.class, new RegistersService(List.of(new SqliteStoreFactory(Optional.empty()))));
    }

    void uninstall(Class<?> service) {
        services.remove(service);
    }

    int run(String verb, String... arguments) throws Exception {
        Verb called = switch (verb) {
            case "enter" -> new EnterVerb(this);
            case "review" -> new ReviewVerb(this);
            default -> new RegisterVerb(this);
        };
        ByteArrayOutputStream outBytes = new ByteArrayOutputStream();
        ByteArrayOutputStream errBytes = new ByteArrayOutputStream();
        try (PrintStream outStream = new PrintStream(outBytes, true, StandardCharsets.UTF_8);
                PrintStream errStream = new PrintStream(errBytes, true, StandardCharsets.UTF_8)) {
            return called.run(new Call(List.of(arguments), outStream, errStream, folder));
        } finally {
            out = outBytes.toString(StandardCharsets.UTF_8);
            err = errBytes.toString(StandardCharsets.UTF_8);
        }
    }

    /** The findings of an entry, as other verbs get them. */
    byte[] findings(long entry) throws Exception {
        Invocation call = new Call(List.of(), System.out, System.err, folder);
        return new EntryFindingsComponent(this)
                .findings(entry, call, Options.parse(List.of(), List.of(), List.of(EntryFindings.OPTION)));
    }

    String out() {
        return out;
    }

    String err() {
        return err;
    }

    private record Call(List<String> arguments, PrintStream out, PrintStream err, Path workingFolder)
            implements Invocation {
        @Override
        public Progress progress() {
            return Progress.NONE;
        }

        @Override
        public Clock clock() {
            return Clock.fixed(Instant.parse("2026-04-05T06:07:08Z"), ZoneOffset.UTC);
        }

        @Override
        public String user() {
            return "mira";
        }

        @Override
        public Path dataFolder() {
            return workingFolder.resolve("data");
        }
    }

    @Override
    public <S> Optional<S> find(Class<S> type) {
        return Optional.ofNullable(type.cast(services.get(type)));
    }

    @Override
    public Optional<String> setting(String name) {
        return Optional.ofNullable(settings.get(name));
    }

    @Override
    public Opened open(Path input, ReadingRule rule, String who, Progress progress) {
        Unit perSecond = new Unit("1/s", Dimension.rateConstant(1), 1, 0);
        Campaign campaign = Campaign.titled("Invented " + input.getFileName())
                .withSources(List.of(new SourcePart(
                        "sources/rates.csv", Digest.sha256(SOURCE).hex(), SOURCE.length, "delimited-text")))
                .withRateTable(new RateTable(perSecond, 1, List.of(RatePoint.of(300, 1e-5), RatePoint.of(310, 3e-5))));
        return new Opened(campaign, List.of(new Part("sources/rates.csv", SOURCE)), List.of());
    }

    @Override
    public Campaign effective(Campaign campaign) throws InputException {
        for (String model : campaign.choices().models()) {
            if (!installed.contains(model)) {
                throw new InputException(new Problem(
                        "model-not-installed", Place.of("--model"), model, "an installed one", "Install it."));
            }
        }
        return campaign.choices().models().isEmpty()
                ? campaign.withChoices(campaign.choices().withModels(installed))
                : campaign;
    }

    @Override
    public Findings evaluate(Campaign effective, Progress progress) {
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("Ea", Node.Quantity.of(barrier, "J/mol", 200));
        Section section = refused
                ? Section.refused("barrier", "Barrier", "too few points")
                : Section.done("barrier", "Barrier", new Node.Group(members), Map.of());
        return new Findings(effective.title(), format.digest(effective), List.of(bundle), Map.of("barrier", section));
    }

    @Override
    public List<Intake.Part> report(Campaign campaign, Findings findings) {
        return List.of(new Part("report.html", "<p>report</p>".getBytes(StandardCharsets.UTF_8)));
    }
}
