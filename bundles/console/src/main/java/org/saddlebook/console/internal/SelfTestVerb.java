package org.saddlebook.console.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.presentation.api.Rounding;

/**
 * Evaluates a published table through the installed product and compares with known answers, for an installation record.
 *
 * <p>Data: G. Lente, I. Fábián, A. J. Poë, New J. Chem. 29 (2005) 759, supplementary information. Answers: ordinary least
 * squares of ln k (for the Eyring law the same as of ln(k/T)), computed once in Python with NumPy and once in R with
 * {@code lm}, equal to the digits stored; they round to the published 120.27 ± 0.15 kJ/mol and 11.33 ± 0.45 J/(mol K).
 */
@Component(property = Verb.NAME_PROPERTY + "=self-test")
public final class SelfTestVerb implements Verb {
    /** One known number: model, symbol, value and standard uncertainty in the unit of the findings. */
    private record Known(String model, String symbol, double value, double uncertainty) {}

    private static final List<Known> ANSWERS = List.of(
            new Known("arrhenius", "Ea", 123116.15, 143.286),
            new Known("eyring", "dH", 120269.37, 152.985),
            new Known("eyring", "dS", 11.332491, 0.446775),
            new Known("modified-arrhenius", "n", -4.041881, 2.8451));

    /** Half a unit of the last digit stored, relative: values have eight digits, uncertainties five. */
    private static final double VALUE_TOLERANCE = 2e-7;

    private static final double UNCERTAINTY_TOLERANCE = 2e-5;

    private final BundleContext context;
    private final Services services;

    /** Services are looked up when needed. */
    @Activate
    public SelfTestVerb(BundleContext context) {
        this.context = context;
        services = new Services(context);
    }

    @Override
    public String name() {
        return "self-test";
    }

    @Override
    public String synopsis() {
        return "";
    }

    @Override
    public String summary() {
        return "evaluates a published table, compares with known answers, and prints what is installed";
    }

    @Override
    public String help() {
        return "Prints versions and hashes for an installation record. Exit codes: 0 passed; 4 something differs.";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        Options.parse(invocation.arguments(), List.of(), List.of());
        PrintStream out = invocation.out();
        out.println("saddlebook " + VersionVerb.text(context.getBundle().getVersion()) + ", Java "
                + System.getProperty("java.version") + ", " + System.getProperty("os.name") + " "
                + System.getProperty("os.arch"));
        out.println(invocation.clock().instant().toString());
        out.println();
        InstalledBundles installed = new InstalledBundles(context);
        new BundleListing(context, installed).print(out, false);
        out.println();
        List<String> wrong = new ArrayList<>(new BundleCheck(context, installed).changed());
        out.println("Files of the product: "
                + (wrong.isEmpty() ? "as they were built" : wrong.size() + " differ from the build"));
        compare(evaluated(invocation), out, wrong);
        out.println();
        for (String sentence : wrong) {
            out.println("- " + sentence);
        }
        out.println(wrong.isEmpty() ? "passed" : "failed");
        return wrong.isEmpty() ? ExitCode.DONE : ExitCode.DIFFERENCE;
    }

    private Findings evaluated(Invocation invocation) throws InputException, Cancelled, IOException {
        Path folder = Files.createTempDirectory("saddlebook-self-test-");
        Path table = folder.resolve("dithionate.csv");
        try (InputStream bytes = SelfTestVerb.class.getResourceAsStream("dithionate.csv")) {
            Files.copy(bytes, table);
            Campaign campaign = services.need(Intake.class, "base")
                    .open(table, ReadingRule.AUTOMATIC, invocation.user(), invocation.progress())
                    .campaign();
            Evaluation evaluation = services.need(Evaluation.class, "base");
            Campaign effective = evaluation.effective(
                    campaign.withChoices(campaign.choices().withErrorModel(ErrorModel.CONSTANT_RELATIVE)));
            return evaluation.evaluate(effective, invocation.progress());
        } finally {
            Files.deleteIfExists(table);
            Files.deleteIfExists(folder);
        }
    }

    private static void compare(Findings findings, PrintStream out, List<String> wrong) {
        Optional<Section> barrier = findings.section("barrier");
        int compared = 0;
        for (Known known : ANSWERS) {
            Node model =
                    barrier.map(section -> model(section.body(), known.model())).orElse(null);
            if (model == null) {
                out.println(known.model() + " " + known.symbol() + ": not installed");
                continue;
            }
            compared++;
            Object found = Nodes.members(model, "parameters").get(known.symbol());
            if (!(found instanceof Node.Quantity quantity)
                    || quantity.value().isEmpty()
                    || quantity.standardUncertainty().isEmpty()) {
                wrong.add(known.model() + " gives no " + known.symbol() + ".");
                continue;
            }
            double value = quantity.value().getAsDouble();
            double u = quantity.standardUncertainty().getAsDouble();
            boolean right =
                    near(value, known.value(), VALUE_TOLERANCE) && near(u, known.uncertainty(), UNCERTAINTY_TOLERANCE);
            out.println(known.model() + " " + known.symbol() + ": found " + Rounding.significant(value, 8) + " ± "
                    + Rounding.significant(u, 5) + ", known " + Rounding.significant(known.value(), 8) + " ± "
                    + Rounding.significant(known.uncertainty(), 5) + " " + quantity.unit());
            if (!right) {
                wrong.add(known.model() + " " + known.symbol() + " differs from the known answer.");
            }
        }
        if (compared == 0) {
            wrong.add("no installed rate model could be compared.");
        }
    }

    private static boolean near(double found, double known, double tolerance) {
        return Math.abs(found - known) <= tolerance * Math.abs(known);
    }

    private static Node model(Node body, String id) {
        for (Node model : Nodes.items(body, "models")) {
            if (Nodes.text(model, "id").equals(id)) {
                return model;
            }
        }
        return null;
    }
}
