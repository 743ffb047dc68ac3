package org.saddlebook.console.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Prediction;
import org.saddlebook.console.api.EntryFindings;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.presentation.api.CautionText;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Predicts rate constants from findings, of today or of an entry of the register. */
@Component(property = Verb.NAME_PROPERTY + "=predict")
public final class PredictVerb implements Verb {
    private static final long LARGEST_FILE = 256L << 20;

    private final Services services;

    /** Services are looked up when needed. */
    @Activate
    public PredictVerb(BundleContext context) {
        services = new Services(context);
    }

    @Override
    public String name() {
        return "predict";
    }

    @Override
    public String synopsis() {
        return "FINDINGS.json|N --at T... [--model ID]... [--json] [--register PATH]";
    }

    @Override
    public String summary() {
        return "predicts rate constants from findings or from an entry of the register";
    }

    @Override
    public String help() {
        return """
                FINDINGS.json  a file that evaluate wrote, or the folder it is in
                N              number of an entry of the register
                --at T         temperature, such as 298.15K, 25degC or 77degF; may be repeated
                --model ID     this fitted model only; may be repeated
                --json         print the predictions as JSON and nothing else
                --register PATH  the register's file, for N""";
    }

    @Override
    public int run(Invocation invocation) throws InputException, IOException {
        Options options = Options.parse(
                invocation.arguments(), List.of("--json"), List.of("--at", "--model", EntryFindings.OPTION));
        List<Double> kelvin = temperatures(options.values("--at"));
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        String word = options.word("FINDINGS.json|N");
        Findings findings = findings(word, invocation, options, format);
        List<String> models = options.values("--model");
        List<Node> rows = services.need(Prediction.class, "base").predict(findings, kelvin, models);
        if (options.has("--json")) {
            invocation.out().write(format.findings(onlyPredictions(findings, rows)));
        } else {
            invocation.out().println(findings.campaignTitle());
            CautionMarks marks = new CautionMarks();
            PredictionLines.print(invocation.out(), marks, rows);
            marks.print(invocation.out(), cautionTexts(findings, rows));
        }
        return ExitCode.DONE;
    }

    private static List<Double> temperatures(List<String> texts) throws InputException {
        if (texts.isEmpty()) {
            throw Options.wrong("missing-argument", "--at", "no --at", "a temperature", "Add for example --at 25degC.");
        }
        List<Double> kelvin = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        for (String text : texts) {
            try {
                kelvin.add(Units.kelvin(text));
            } catch (UnitException e) {
                problems.add(e.at(Place.of("--at")));
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return kelvin;
    }

    private Findings findings(String word, Invocation invocation, Options options, CampaignFormat format)
            throws InputException, IOException {
        if (isNumber(word)) {
            byte[] stored =
                    services.need(EntryFindings.class, "register").findings(Long.parseLong(word), invocation, options);
            return format.readFindings("entry " + word, stored);
        }
        Path path = Paths.resolve(invocation, word, "FINDINGS.json");
        Path file = Files.isDirectory(path) ? path.resolve("findings.json") : path;
        if (Files.exists(file) && Files.size(file) > LARGEST_FILE) {
            throw Options.wrong(
                    "too-large", file.toString(), Files.size(file) + " bytes", "findings", "Name a findings.json.");
        }
        return format.readFindings(file.toString(), Files.readAllBytes(file));
    }

    private static boolean isNumber(String word) {
        for (int i = 0; i < word.length(); i++) {
            if (word.charAt(i) < '0' || word.charAt(i) > '9') {
                return false;
            }
        }
        return !word.isEmpty() && word.length() <= 15;
    }

    private static Findings onlyPredictions(Findings findings, List<Node> rows) {
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("predictions", new Node.Items(rows));
        Section section = Section.done("barrier", "Predictions", new Node.Group(members), cautionTexts(findings, rows));
        return new Findings(
                findings.campaignTitle(),
                findings.campaignDigest(),
                findings.contributors(),
                Map.of("barrier", section));
    }

    /** Texts of the cautions of these rows: those of the findings, and the standard ones that a new temperature brings. */
    private static Map<String, String> cautionTexts(Findings findings, List<Node> rows) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (Node row : rows) {
            for (Node value : row instanceof Node.Group group ? group.members().values() : List.<Node>of()) {
                if (value instanceof Node.Quantity quantity) {
                    for (String id : quantity.cautions()) {
                        String known = findings.cautions().get(id);
                        texts.putIfAbsent(
                                id, known != null ? known : CautionText.ids().contains(id) ? CautionText.of(id) : id);
                    }
                }
            }
        }
        return texts;
    }
}
