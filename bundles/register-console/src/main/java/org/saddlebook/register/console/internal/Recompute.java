package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;

/** Evaluates a stored entry again with what is installed, and compares. */
final class Recompute {
    private static final int SHOWN = 20;

    private final Services services;
    private final Invocation invocation;

    Recompute(Services services, Invocation invocation) {
        this.services = services;
        this.invocation = invocation;
    }

    /** Whether nothing is wrong but models that are not installed. */
    static boolean onlyAbsentModels(InputException e) {
        for (Problem problem : e.problems()) {
            if (!problem.code().equals("model-not-installed")) {
                return false;
            }
        }
        return true;
    }

    int run(Register register, Entry entry) throws InputException, Cancelled, IOException {
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        Evaluation evaluation = services.need(Evaluation.class, "base");
        byte[] campaignBytes = read(register, entry, PartNames.CAMPAIGN);
        byte[] before = read(register, entry, PartNames.FINDINGS);
        String name = "entry " + entry.number() + ", ";
        Campaign campaign = format.readCampaign(name + PartNames.CAMPAIGN, campaignBytes);
        Campaign effective;
        try {
            effective = evaluation.effective(campaign);
        } catch (InputException e) {
            if (onlyAbsentModels(e)) {
                invocation
                        .err()
                        .println("saddlebook: entry " + entry.number() + " cannot be recomputed: it was"
                                + " evaluated with " + absent(e)
                                + ", not installed here. Install the bundle and try again.");
                return ExitCode.REFUSED;
            }
            throw e;
        }
        byte[] after = format.findings(evaluation.evaluate(effective, invocation.progress()));
        return report(
                entry, before, after, object(name + PartNames.FINDINGS, before), object("the new findings", after));
    }

    private static String absent(InputException e) {
        TreeSet<String> models = new TreeSet<>();
        for (Problem problem : e.problems()) {
            models.add(problem.found());
        }
        return (models.size() == 1 ? "the model " : "the models ") + String.join(", ", models);
    }

    private static byte[] read(Register register, Entry entry, String name) throws IOException {
        PartEntry part = register.part(entry, name)
                .orElseThrow(() -> new RegisterException(
                        "Entry " + entry.number() + " has no part " + name + ", so it cannot be recomputed."));
        return register.read(part);
    }

    private static JsonObject object(String name, byte[] json) throws InputException, RegisterException {
        if (JsonReader.read(name, json) instanceof JsonObject object) {
            return object;
        }
        throw new RegisterException("The findings of " + name + " are no JSON object.");
    }

    private int report(Entry entry, byte[] before, byte[] after, JsonObject then, JsonObject now) {
        PrintStream out = invocation.out();
        String which = "Entry " + entry.number();
        Map<String, String> bundlesThen = Comparison.bundles(then);
        Map<String, String> bundlesNow = Comparison.bundles(now);
        boolean sameBundles = bundlesThen.equals(bundlesNow);
        if (sameBundles && Arrays.equals(before, after)) {
            out.println(which + " gives the same findings, bit for bit, with the same bundles.");
            return ExitCode.DONE;
        }
        if (!sameBundles) {
            out.println(which + " was evaluated with other bundles:");
            TreeSet<String> names = new TreeSet<>(bundlesThen.keySet());
            names.addAll(bundlesNow.keySet());
            for (String name : names) {
                String a = bundlesThen.getOrDefault(name, "none");
                String b = bundlesNow.getOrDefault(name, "none");
                if (!a.equals(b)) {
                    out.println("  " + Text.line(name) + ": then " + Text.line(a) + ", now " + Text.line(b));
                }
            }
        }
        List<Comparison.Moved> moved =
                Comparison.of(then, now, sameBundles, sameBundles ? Set.of() : Set.of("software"));
        if (!sameBundles && moved.isEmpty()) {
            out.println(
                    "The findings agree: every number within the larger of 1e-9 of its value and 1e-6 of its standard"
                            + " uncertainty, everything else equal.");
            return ExitCode.DONE;
        }
        if (moved.isEmpty()) {
            out.println(which + " gives findings whose values are all equal, in other bytes: the file is written"
                    + " differently.");
            return ExitCode.DIFFERENCE;
        }
        out.println("These values differ (" + moved.size() + "):");
        for (Comparison.Moved value : moved.subList(0, Math.min(SHOWN, moved.size()))) {
            out.println("  " + Text.line(value.path()) + ": then " + Text.line(value.before()) + ", now "
                    + Text.line(value.after()));
        }
        if (moved.size() > SHOWN) {
            out.println("  and " + (moved.size() - SHOWN) + " more");
        }
        return ExitCode.DIFFERENCE;
    }
}
